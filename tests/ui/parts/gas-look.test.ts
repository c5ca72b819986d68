import { describe, expect, it } from 'vitest';
import { gasLabel, knownGases } from '../../../src/blending/index.ts';
import { gasLook, OTHERS_LOOK, patternId } from '../../../src/ui/parts/gas-look.ts';

describe('looks of the gases', () => {
  it('are all different, and different from that of the rest', () => {
    const looks = [...knownGases().map(({ id }) => gasLook(id)), OTHERS_LOOK].map(({ colour, hatch }) => `${colour} ${hatch}`);
    expect(new Set(looks).size).toBe(looks.length);
    expect(looks).toHaveLength(59);
  });

  it('have a pattern id each', () => {
    expect(new Set(knownGases().map(({ id }) => patternId('ladder', id))).size).toBe(58);
  });
});

describe('labels of the gases', () => {
  it('tell isomers apart', () => {
    const formulas = knownGases().map(({ formula }) => formula);
    expect(new Set(formulas).size).toBe(formulas.length);
    expect([gasLabel('isobutene').formula, gasLabel('1-butene').formula, gasLabel('neopentane').formula]).toEqual(['i-C₄H₈', '1-C₄H₈', 'neo-C₅H₁₂']);
  });
});

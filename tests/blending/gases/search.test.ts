import { describe, expect, it } from 'vitest';
import { gasFromText, gasText, knownGases, searchGases } from '../../../src/blending/index.ts';

const found = (text: string): string[] => searchGases(text).map(({ gas }) => gas.id);

describe('searchGases', () => {
  it.each([
    'CO2', 'CO₂', 'co2', ' C O 2 ', 'carbon dioxide', 'Carbon-Dioxide', 'CARBONDIOXIDE', 'carbonic', 'carbonic gas', '124-38-9', '124389', '124‑38‑9', 'R744', 'dioxide',
  ])('finds carbon dioxide by “%s”', (text) => {
    expect(found(text)).toContain('carbon dioxide');
  });

  it.each([
    ['CO2', 'carbon dioxide'], ['124-38-9', 'carbon dioxide'], ['nitrogen', 'nitrogen'], ['n butane', 'n-butane'], ['iso-butane', 'isobutane'],
    ['sulphide', 'hydrogen sulfide'], ['hydrogen sulphide', 'hydrogen sulfide'], ['H', 'hydrogen'],
  ])('puts first what “%s” means', (text, gas) => {
    expect(found(text)[0]).toBe(gas);
  });

  it('ranks exact before prefix before word before substring', () => {
    const order = ['exact', 'prefix', 'word', 'substring'];
    for (const text of ['CO', 'oxide', 'methane', 'pent', 'C2', 'ane', 'hydrogen']) {
      const ranks = searchGases(text).map(({ kind }) => order.indexOf(kind));
      expect(ranks, text).toEqual([...ranks].sort((a, b) => a - b));
    }
    expect(searchGases('CO')[0]).toMatchObject({ gas: { id: 'carbon monoxide' }, kind: 'exact' });
    expect(searchGases('CO').find(({ gas }) => gas.id === 'carbon dioxide')?.kind).toBe('prefix');
    expect(searchGases('dioxide').find(({ gas }) => gas.id === 'carbon dioxide')?.kind).toBe('word');
    expect(searchGases('ioxid').find(({ gas }) => gas.id === 'carbon dioxide')?.kind).toBe('substring');
  });

  it('says which name fitted', () => {
    expect(searchGases('carbonic')[0]?.matched).toBe('carbonic gas');
    expect(searchGases('124-3')[0]?.matched).toBe('124-38-9');
  });

  it('lists both isomers of a shared formula, and every gas for an empty text', () => {
    expect(found('C4H10').slice(0, 2).sort()).toEqual(['isobutane', 'n-butane']);
    expect(found('')).toEqual(knownGases().map(({ id }) => id));
    expect(found('  ')).toHaveLength(knownGases().length);
  });

  it('finds nothing for what is no gas', () => {
    expect(found('unobtainium')).toEqual([]);
    expect(found('???')).toEqual([]);
    expect(found('12 blorks')).toEqual([]);
  });

  it('finds every gas by each of its own names, and puts an unshared one first', () => {
    for (const gas of knownGases()) {
      expect(found(gas.name)[0], gas.name).toBe(gas.id);
      expect(found(gas.formula), gas.formula).toContain(gas.id);
    }
  });
});

describe('gasText', () => {
  it('is a text that means the gas and no other', () => {
    for (const gas of knownGases()) expect(gasFromText(gasText(gas))?.id, gas.name).toBe(gas.id);
  });
});

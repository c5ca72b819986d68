import { describe, expect, it } from 'vitest';
import { knownGases } from '../../../src/blending/index.ts';
import { gasCard } from '../../../src/blending/gases/card.ts';
import { gasFacts } from '../../../src/blending/gases/facts.ts';
import type { GasId } from '../../../src/blending/index.ts';

const figureOf = (gas: GasId, begin: string) => gasFacts(gas).figures.find(({ name }) => name.startsWith(begin));

describe('gasFacts', () => {
  // IEC 60079-20-1:2010 and NFPA 497, lowest and highest of the two lists.
  it('gives the limits of methane with their lists', () => {
    expect(figureOf('methane', 'lower flammable limit')).toMatchObject({ value: 4.4, unit: '%', trust: 'seen', source: expect.stringContaining('IEC 60079-20-1') as string });
    expect(figureOf('methane', 'upper flammable limit')).toMatchObject({ value: 17 });
    expect(gasFacts('methane').roles).toEqual(['flammable']);
  });

  it('says what is from memory', () => {
    expect(figureOf('carbon monoxide', 'Tci')).toMatchObject({ value: 15.2, trust: 'from memory' });
    expect(figureOf('methane', 'Tci')).toMatchObject({ value: 8.7, trust: 'seen' });
    expect(figureOf('hydrogen sulfide', 'LC50')).toMatchObject({ value: 712, unit: 'µmol/mol', trust: 'from memory' });
  });

  it('does not credit the two lists with limits that they do not have', () => {
    for (const gas of ['deuterium', 'phosphine', 'arsine', 'silane'] as const) {
      expect(figureOf(gas, 'lower flammable limit')?.source, gas).not.toContain('IEC');
    }
  });

  it('gives oxygen and nitrogen equivalencies', () => {
    expect(figureOf('oxygen', 'Ci')).toMatchObject({ value: 1 });
    expect(figureOf('carbon dioxide', 'Kk')).toMatchObject({ value: 1.5 });
    expect(figureOf('water', 'Kk')).toBeUndefined();
  });

  it('has a role for every gas', () => {
    for (const { id } of knownGases()) expect(gasFacts(id).roles, id).not.toContain('unclassified');
  });

  it('says of benzene that it harms though no LC50 is known', () => {
    expect(gasFacts('benzene')).toMatchObject({ lacksLc50: true, roles: ['flammable', 'toxic'] });
    expect(figureOf('benzene', 'LC50')).toBeUndefined();
  });
});

describe('gasCard', () => {
  it.each([['nitrogen', 'GERG-2008'], ['neon', 'Helmholtz'], ['nitric oxide', 'Peng–Robinson']] as const)('names the equation of %s', (gas, kind) => {
    expect(gasCard(gas).equation.kind).toBe(kind);
  });

  it('has the range that the authors of an equation state, and none for the cubic one', () => {
    // W. Guder, W. Wagner 2009: 223.555 to 625 K, 150 MPa.
    expect(gasCard('sulfur hexafluoride').equation.range).toEqual({ lowest: 223.555, highest: 625, highestPressure: 150e6, fromMemory: false });
    expect(gasCard('nitric oxide').equation.range).toBeNull();
    expect(gasCard('nitrogen').equation.range).toMatchObject({ fromMemory: true });
  });
});

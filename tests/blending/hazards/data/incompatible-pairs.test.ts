import { describe, expect, it } from 'vitest';
import { gasesThatReact, reactionOf } from '../../../../src/blending/hazards/data/incompatible-pairs.ts';
import { findGas, gasIds } from '../../../../src/thermo/index.ts';

// Common practice, no source: the levels are the table's own, written from trade knowledge.
describe('reacting pairs', () => {
  it('answers the same whichever gas is named first', () => {
    for (const a of gasIds) {
      for (const b of gasIds) expect(reactionOf(a, b), `${a}, ${b}`).toEqual(reactionOf(b, a));
    }
  });

  it('names only gases that the program knows', () => {
    for (const gas of gasesThatReact()) expect(findGas(gas), gas).toBe(gas);
  });

  it('lets a row that names both gases overrule the groups', () => {
    // Ammonia is among the flammables, nitrous oxide has a row for those; hydrogen has one of its own.
    expect(reactionOf('ammonia', 'oxygen')).toMatchObject({ level: 'restrict', flame: true });
    expect(reactionOf('nitric oxide', '1,3-butadiene')).toMatchObject({ level: 'forbid', flame: false });
    // Hydrides with acids are restricted; so is silane by name, with its own reason.
    expect(reactionOf('silane', 'hydrogen chloride')).toMatchObject({ level: 'restrict', reason: 'chlorosilanes on catalytic surfaces' });
  });

  it('takes the stricter level of two groups, and of equal ones the reaction that is more than a flame', () => {
    expect(reactionOf('acetylene', 'oxygen')).toMatchObject({ level: 'forbid', flame: false });
    expect(reactionOf('silane', 'nitrous oxide')).toMatchObject({ level: 'forbid', flame: false });
    expect(reactionOf('nitric oxide', 'phosphine')).toMatchObject({ level: 'restrict', flame: false });
  });

  it('leaves fuel with oxidiser to the rules that have figures for it', () => {
    for (const fuel of ['methane', 'hydrogen', 'carbon monoxide'] as const) {
      expect(reactionOf(fuel, 'oxygen')?.flame, fuel).toBe(true);
      expect(reactionOf(fuel, 'nitric oxide')?.flame, fuel).toBe(true);
      expect(reactionOf(fuel, 'chlorine'), fuel).toMatchObject({ level: 'forbid', flame: false });
    }
    expect(reactionOf('phosphine', 'oxygen')).toMatchObject({ level: 'forbid', flame: false });
  });

  it('ignores a gas with itself and has nothing on inert gases', () => {
    expect(reactionOf('nitric oxide', 'nitric oxide')).toBeNull();
    expect(reactionOf('chlorine', 'chlorine')).toBeNull();
    for (const gas of gasIds) expect(reactionOf('nitrogen', gas) ?? reactionOf(gas, 'argon'), gas).toBeNull();
  });

  it('counts 2 NO for one O₂ (2 NO + O₂ → 2 NO₂) whichever is named first', () => {
    expect(reactionOf('oxygen', 'nitric oxide')).toMatchObject({ first: 'nitric oxide', second: 'oxygen', takes: 2 });
  });
});

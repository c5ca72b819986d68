/** Nitrogen dioxide is ordered, weighed and reported in NO₂ units; the pressures follow the molecules. */
import { describe, expect, it } from 'vitest';
import { planned } from '../lab.ts';

describe('a plan with nitrogen dioxide', () => {
  // 2 % in nitrogen from a 2 % premix of its own, so that no parent would condense.
  const plan = planned({
    order: [['NO2', '1 %'], ['N2', 'balance']], to: '60 bar',
    parents: [{ key: 'premix', lines: [['NO2', '2 %'], ['N2', '98 %']] }, { key: 'N2', lines: [['N2', '100 %']] }],
  });

  it('reaches the fill pressure with more units than an unpaired gas would need', () => {
    expect(plan.finished.pressure / 6e6).toBeCloseTo(1, 9);
    expect(plan.finished.fractions[plan.job.gases.indexOf('nitrogen dioxide')]).toBeCloseTo(0.01, 9);
    // 0.6 bar of units against Kp = 0.1 bar at 20 °C: 75 % are bound, 0.37 % of the molecules are missing.
    expect(plan.pairedNitrogenDioxide).toBeCloseTo(0.75, 2);
    const unpaired = plan.finished.total * 8.314462618 * 293.15 / (plan.finished.volume * 6e6);
    const nitrogen = planned({ order: [['N2', 'balance']], to: '60 bar' });
    expect(unpaired / (nitrogen.finished.total * 8.314462618 * 293.15 / (nitrogen.finished.volume * 6e6))).toBeGreaterThan(1.003);
  });

  it('says so, and says that the equation is cubic', () => {
    const titles = plan.findings.map(({ title }) => title).join('\n');
    expect(titles).toContain('paired as N₂O₄');
    expect(titles).toContain('Cubic equation for nitrogen dioxide');
    expect(plan.modelClass).toBe('cubic');
    expect(plan.modelUncertainty).toBeGreaterThan(5e-4);
    expect(plan.modelUncertainty).toBeLessThan(0.02);
  });

  it('costs nothing where there is none', () => {
    const other = planned({ order: [['NO', '1 %'], ['N2', 'balance']], to: '60 bar' });
    expect(other.pairedNitrogenDioxide).toBeNull();
  });
});

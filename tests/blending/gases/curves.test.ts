import { describe, expect, it } from 'vitest';
import { knownGases } from '../../../src/blending/index.ts';
import { compressibilityCurve, correlatedVapourPressure, vapourPressureAt, vapourPressureCurve } from '../../../src/blending/gases/curves.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { valueOf } from '../lab.ts';

describe('compressibilityCurve', () => {
  it('ends at the vapour pressure', () => {
    const { points, table, condensesAt } = valueOf(compressibilityCurve('carbon dioxide', kelvin(293.15), pascal(300e5)));
    // Computed, GERG-2008: 57.28 bar at 20 °C.
    expect(condensesAt! / 1e5).toBeCloseTo(57.28, 2);
    expect(points.at(-1)!.pressure).toBeCloseTo(condensesAt!, 3);
    expect(table.map(({ pressure }) => Math.round(pressure / 1e5))).toEqual([10, 20, 30, 40, 50]);
  });

  it('goes to the highest pressure where nothing condenses', () => {
    const { points, table, condensesAt } = valueOf(compressibilityCurve('nitrogen', kelvin(293.15), pascal(300e5)));
    expect(condensesAt).toBeNull();
    expect(points).toHaveLength(60);
    expect(table.map(({ pressure }) => Math.round(pressure / 1e5))).toEqual([50, 100, 150, 200, 250, 300]);
    // Published: long equation of nitrogen, Span et al. 2000: 1.051795 at 200 bar.
    expect(table[3]!.compressibilityFactor).toBeCloseTo(1.0518, 3);
  });

  it('has an answer or a reason for every gas at any temperature, and Z above zero', () => {
    for (const { id } of knownGases()) {
      for (const temperature of [1, 150, 293.15, 2000]) {
        const curve = compressibilityCurve(id, kelvin(temperature), pascal(300e5), 6);
        if (curve.ok) for (const { compressibilityFactor } of curve.value.points) expect(compressibilityFactor, `${id}, ${temperature} K`).toBeGreaterThan(0);
        else expect(curve.reason.code.length).toBeGreaterThan(0);
      }
    }
  });
});

describe('vapour pressures', () => {
  it('by the equation lie near the correlation', () => {
    // The correlations were fitted to the long equations; 0.2 % is the short one of propane against its long one.
    const byEquation = vapourPressureAt('propane', kelvin(273.15))!.pressure;
    expect(Math.abs(byEquation / correlatedVapourPressure('propane', kelvin(273.15))! - 1)).toBeLessThan(2e-3);
  });

  it('are absent above the critical and below the triple point', () => {
    expect(vapourPressureAt('nitrogen', kelvin(293.15))).toBeNull();
    expect(vapourPressureAt('carbon dioxide', kelvin(200))).toBeNull();
    expect(correlatedVapourPressure('nitrogen', kelvin(293.15))).toBeNull();
  });

  it('rise along the curve of every gas, up to the critical point', () => {
    for (const { id } of knownGases()) {
      const curve = vapourPressureCurve(id, 8);
      expect(curve.length, id).toBeGreaterThan(3);
      for (const [index, point] of curve.slice(1).entries()) expect(point.pressure, id).toBeGreaterThan(curve[index]!.pressure);
    }
  });
});

import { describe, expect, it } from 'vitest';
import { realModel } from '../../../src/thermo/index.ts';
import type { GasId, ThermoModel } from '../../../src/thermo/index.ts';
import { unitDensity } from '../../../src/blending/steps/unit-density.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../../src/units/index.ts';

function modelOf(gases: readonly GasId[]): ThermoModel {
  const model = realModel(gases);
  if (!model.ok) throw new Error(model.reason.code);
  return model.value;
}

describe('unitDensity', () => {
  const T = kelvin(293.15);

  it('is the density of the model where nothing pairs up', () => {
    const model = modelOf(['nitrogen', 'nitric oxide']);
    const x = Float64Array.of(0.99, 0.01);
    const density = model.density(T, pascal(15e6), x);
    expect(unitDensity(model, T, pascal(15e6), x)).toEqual({ ok: true, value: density.ok ? density.value.density : 0 });
  });

  it.each([1e-3, 0.01, 0.1])('with %s of nitrogen dioxide: the molecules it leaves have the pressure asked for', (content) => {
    const model = modelOf(['nitrogen', 'nitrogen dioxide']);
    const units = Float64Array.of(1 - content, content);
    const density = unitDensity(model, T, pascal(8e6), units);
    expect(density.ok).toBe(true);
    if (!density.ok) return;
    const molecules = model.molecules(units.map((x) => x * density.value), T, 1);
    const sum = molecules[0]! + molecules[1]!;
    const pressure = model.pressure(T, molePerCubicMetre(sum), molecules.map((amount) => amount / sum));
    expect(pressure.ok && pressure.value / 8e6).toBeCloseTo(1, 10);
    expect(density.value).toBeGreaterThan(sum);
  });

  it('passes a reason on', () => {
    expect(unitDensity(modelOf(['nitrogen', 'nitrogen dioxide']), T, pascal(-1), Float64Array.of(0.5, 0.5))).toMatchObject({ ok: false, reason: { code: 'pressure-invalid' } });
  });
});

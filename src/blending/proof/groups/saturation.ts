import { kelvin, ok, pascal } from '../../../units/index.ts';
import { dewPressure, dewTemperature, saturationPressure } from '../../../thermo/index.ts';
import type { ProofCase, ProofGroup } from '../case.ts';
import { dewRows, saturationRows } from '../data/saturation.ts';
import { absolute, asPublished, figure, formulaOf, gasOf, modelOf, relative } from '../making.ts';

/** Vapour pressures of pure gases by equal Gibbs energy. */
export function vapourPressures(): ProofGroup {
  return {
    id: 'vapour-pressures', title: 'Vapour pressures of pure gases',
    why: 'The same equation solved by another program: 1e-8 relative, for water 1e-6 because its gas phase is so thin. Water below 0 °C is supercooled liquid, not ice.',
    cases: saturationRows.filter(({ gas }) => gasOf(gas) !== null).flatMap(({ gas, gasConstant, code, points }) => points.map(([T_K, p_kPa]): ProofCase => ({
      id: `vapour-pressures:${gas}:${T_K}`, group: 'vapour-pressures', title: `${formulaOf(gas)}, ${T_K} K: vapour pressure`,
      source: code === 'GERG-2008' ? 'GERG-2008 solved with 50 digits' : 'CoolProp 8.0, reference equation of the gas',
      trust: 'computed with reference code', published: p_kPa, unit: 'kPa absolute', tolerance: relative(gas === 'water' ? 1e-6 : 1e-8), remark: '',
      compute: () => {
        const made = modelOf({ [gas]: 1 }, asPublished);
        if (!made.ok) return made;
        const { model } = made.value;
        // Pressure is proportional to R where both phases have the same reduced energy.
        return figure(saturationPressure(model, kelvin(T_K)), ({ pressure }) => (pressure / 1e3) * (gasConstant / model.gasConstant));
      },
    }))),
  };
}

/** Dew points of mixtures. */
export function dewPoints(): ProofGroup {
  return {
    id: 'dew-points', title: 'Dew points of mixtures',
    why: 'GERG-2008 solved for equal fugacities by another program: 1e-6 relative in pressure, 1e-6 K in temperature. No liquid was measured: the values test the calculation, not nature.',
    cases: dewRows.map(({ name, composition, given, at, published }): ProofCase => {
      const byTemperature = given === 'T_K';
      return {
        id: `dew-points:${name}:${byTemperature ? 'T' : 'p'}:${at}`, group: 'dew-points',
        title: byTemperature ? `${name}, ${at} K: dew pressure` : `${name}, ${at} kPa absolute: dew temperature`,
        source: 'GERG-2008 solved with 50 digits', trust: 'computed with reference code', published,
        unit: byTemperature ? 'kPa absolute' : 'K', tolerance: byTemperature ? relative(1e-6) : absolute(1e-6), remark: '',
        compute: () => {
          const made = modelOf(composition, asPublished);
          if (!made.ok) return made;
          const { model, x } = made.value;
          const point = byTemperature ? dewPressure(model, kelvin(at), x) : dewTemperature(model, pascal(at * 1e3), x);
          return point.ok ? ok(byTemperature ? point.value.pressure / 1e3 : point.value.temperature) : point;
        },
      };
    }),
  };
}

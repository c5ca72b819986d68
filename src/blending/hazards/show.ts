import { formatPressureInFull, toPascal } from '../../units/index.ts';
import type { Pascal, PressureReference, PressureScale, PressureUnit } from '../../units/index.ts';
import type { UncheckedPlan } from '../plan/plan.ts';
import { exceeds } from './pressure-limits.ts';

export { showFigure, showFraction, showPercent, showShare, showStated } from '../figures.ts';

/** Step to which a pressure is shown when the gauge is not finer. */
const ordinaryStep: Partial<Record<PressureUnit, number>> = {
  psi: 1, kPa: 10, MPa: 0.01, Pa: 10_000, hPa: 100, mbar: 100, Torr: 100, mmHg: 100,
};

/** Gauge on which the finished cylinder is read. */
export function gaugeOfFinish(plan: UncheckedPlan): string | null {
  return plan.steps.at(-1)?.gauge ?? null;
}

/** How a pressure departs from the way its gauge shows it. */
interface PressureDisplay {
  /** Overrules the gauge's own, for partial pressures, which have no gauge form. */
  readonly reference?: PressureReference | undefined;
  /** Shows steps finer by this factor. */
  readonly divide?: number;
}

/**
 * An absolute pressure with number, unit and reference, in the terms of a gauge
 * of the recipe or in bar gauge.
 */
export function showPressure(
  plan: UncheckedPlan, pressure: Pascal, gaugeKey: string | null, { reference, divide = 1 }: PressureDisplay = {},
): string {
  const gauge = plan.job.gauges.find((each) => each.key === gaugeKey);
  const unit = gauge?.unit ?? 'bar';
  const scale: PressureScale = {
    unit,
    reference: reference ?? gauge?.reference ?? 'gauge',
    barometer: plan.job.conditions.barometer,
  };
  const shown = Math.abs(scale.reference === 'gauge' ? pressure - scale.barometer : pressure);
  let ordinary: number = toPascal(ordinaryStep[unit] ?? 0.1, unit);
  // Small pressures keep about three digits.
  for (let finer = 0; finer < 4 && shown < 100 * ordinary; finer += 1) ordinary /= 10;
  const resolution = gauge && gauge.resolution > 0 && gauge.resolution < ordinary ? gauge.resolution : ordinary;
  return formatPressureInFull(pressure, { ...scale, resolution: resolution / divide });
}

/**
 * A pressure and its limit. Where both would read the same although the
 * pressure is above, digits are added until the difference shows.
 */
export function showAgainst(
  plan: UncheckedPlan, pressure: Pascal, limit: Pascal, gaugeKey: string | null,
): { readonly figure: string; readonly limit: string } {
  let divide = 1;
  for (;;) {
    const figure = showPressure(plan, pressure, gaugeKey, { divide });
    const shownLimit = showPressure(plan, limit, gaugeKey, { divide });
    if (figure !== shownLimit || !exceeds(pressure, limit) || divide >= 1e4) return { figure, limit: shownLimit };
    divide *= 10;
  }
}

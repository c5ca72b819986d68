import { formatAmountFraction, formatPressure, formatSignificant, fraction, pressureLabel } from '../../units/index.ts';
import type { Pascal, PressureReference, PressureUnit } from '../../units/index.ts';
import type { Job, PlanStep } from '../../blending/index.ts';

/** The scale that a stop is shown on: its gauge's, or bar gauge when no gauge holds it. */
export interface Scale {
  readonly unit: PressureUnit;
  readonly reference: PressureReference;
  readonly resolution: number;
  readonly barometer: Pascal;
}

/** Below this a stop without a gauge is shown in mbar absolute: as bar gauge it would be little more than its sign. */
const SMALL_STOP = 2e5;

/** Scale of the gauge a pressure is read on; without one, a scale that shows it to four digits or so. */
export function scaleOf(job: Job, gaugeKey: string | null, pressure: Pascal): Scale {
  const gauge = job.gauges.find((candidate) => candidate.key === gaugeKey);
  const { barometer } = job.conditions;
  if (gauge === undefined && pressure < SMALL_STOP) return { unit: 'mbar', reference: 'absolute', resolution: 10, barometer };
  if (gauge === undefined) return { unit: 'bar', reference: 'gauge', resolution: 1000, barometer };
  return { unit: gauge.unit, reference: gauge.reference, resolution: gauge.resolution, barometer };
}

/** Number of a pressure on a scale, without unit. */
export function pressureNumber(pressure: Pascal, scale: Scale): string {
  return formatPressure(pressure, scale);
}

/** `bar gauge`. */
export function scaleLabel({ unit, reference }: Scale): string {
  return pressureLabel(unit, reference);
}

/** Amount fraction with its unit, to so many digits; nearly pure gases to two more, or all would read 100 %. */
export function amountText(x: number, digits: number): string {
  const { number, unit } = formatAmountFraction(fraction(x), x > 0.995 ? digits + 2 : digits);
  return `${number} ${unit}`;
}

/** A ratio in percent, as a number without the sign: for columns whose heading says %. */
export function percentNumber(ratio: number, digits: number): string {
  return formatSignificant(100 * ratio, digits);
}

/** Relative difference in percent with its sign: `+4.2 %`. */
export function relativePercent(value: number, reference: number): string {
  const percent = 100 * (value / reference - 1);
  const size = formatSignificant(Math.abs(percent), 2);
  if (Math.abs(percent) < 0.005) return '0 %';
  return `${percent < 0 ? '−' : '+'}${size} %`;
}

/** Name of the parent of a step as the technician wrote it; of a split one, how much of it this is. */
export function parentName(job: Job, step: PlanStep): string {
  const name = job.parents.find((parent) => parent.key === step.parent)?.name ?? step.parent;
  return step.share < 1 ? `${name}, ${formatSignificant(100 * step.share, 3)} % of it` : name;
}

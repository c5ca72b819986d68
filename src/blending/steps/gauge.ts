import type { Pascal } from '../../units/index.ts';
import type { JobGauge } from '../recipe/job.ts';

/**
 * The gauge to read a stop on: the one asked for, else the one with the finest
 * accuracy whose scale holds the stop; null when no scale does. A gauge asked
 * for that is too small is refused too: it would be over-ranged.
 */
export function chooseGauge(gauges: readonly JobGauge[], asked: string | null, stop: Pascal): JobGauge | null {
  const fitting = gauges.filter((gauge) => gauge.fullScale >= stop && (asked === null || gauge.key === asked));
  return fitting.reduce<JobGauge | null>(
    (best, gauge) => (best === null || accuracyAt(gauge, stop) < accuracyAt(best, stop) ? gauge : best),
    null,
  );
}

/** Half-width of a gauge's accuracy at a reading (absolute pressure), Pa. */
export function accuracyAt(gauge: JobGauge, pressure: Pascal): number {
  return gauge.accuracy + gauge.accuracyOfReading * Math.max(0, pressure - (gauge.fullScale - gauge.span));
}

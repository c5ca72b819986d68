import type { Pascal } from '../../units/index.ts';
import type { Job, JobGauge } from '../recipe/job.ts';
import { balanceUncertainty, gaugeUncertainty, judgeResolution } from './step-resolution.ts';

/** An addition as far as its measurement goes. */
export interface MeasuredAddition {
  /** `JobParent.key`. */
  readonly parent: string;
  /** Absolute. */
  readonly stop: Pascal;
  /** Pa, over the stop before. */
  readonly rise: number;
  /** kg. */
  readonly mass: number;
}

/** How well a gauge tells one addition. */
export interface GaugeJudgement {
  readonly verdict: 'note' | 'caution' | 'hold';
  readonly code: 'fine' | 'coarse' | 'coarse-but-weighed' | 'cannot-meet';
  /** Relative standard uncertainty of the rise. */
  readonly relative: number;
  /** What it is held against. */
  readonly limit: number;
}

/**
 * The decision of `gauge-too-coarse` without its words. Where the addition is weighed as
 * well and the balance resolves it, a gauge too coarse is a caution only.
 */
export function judgeGauge(job: Job, gauge: JobGauge, { parent, stop, rise, mass }: MeasuredAddition): GaugeJudgement {
  const relative = gaugeUncertainty(gauge, stop) / Math.abs(rise);
  const { verdict, limit } = judgeResolution({ job }, { parent }, relative);
  if (verdict === 'note') return { verdict, code: 'fine', relative, limit };
  const weighed = job.by === 'pressure and mass' && judgeResolution({ job }, { parent }, balanceUncertainty({ job }) / mass).verdict === 'note';
  if (weighed) return { verdict: 'caution', code: 'coarse-but-weighed', relative, limit };
  return { verdict, code: verdict === 'hold' ? 'cannot-meet' : 'coarse', relative, limit };
}

import { instrumentWords as words } from '../../messages/hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { JobGauge } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { judgeGauge } from '../gauge-judgement.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent, showPressure } from '../show.ts';

const coarseCard: RuleCard = {
  id: 'gauge-too-coarse',
  title: 'Gauge against the pressure rise of each step',
  source: 'JCGM 100 rectangular distribution of the stated accuracy; limit is the ordered tolerance',
  edition: 'JCGM 100:2008, from memory',
  trust: 'computed',
};

const isolateCard: RuleCard = {
  id: 'gauge-over-range',
  title: 'A gauge used before must be shut off before it is over-ranged',
  source: 'Bench practice',
  edition: 'no document',
  trust: 'common practice, no source',
};

/** Whether the gauge can tell the rise of each step well enough; not for a fill by mass. */
export const gaugeTooCoarse: HazardRule = { ...coarseCard, judge: judgeCoarse };

/** Names the step before which a low-range gauge has to be isolated. */
export const gaugeOverRange: HazardRule = { ...isolateCard, judge: judgeOverRange };

function judgeCoarse({ plan }: HazardContext): readonly Finding[] {
  if (plan.job.by === 'mass') return [];
  return plan.steps.flatMap((step) => {
    const place = { kind: 'step', step: step.number } as const;
    const gauge = gaugeOf(plan, step.gauge);
    if (!gauge) {
      const text = words.noGauge(step.number, showPressure(plan, step.state.pressure, null));
      return [finding(coarseCard, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: 'no gauge' })];
    }
    const { verdict, code, relative, limit } = judgeGauge(
      plan.job, gauge, { parent: step.parent, stop: step.state.pressure, rise: step.rise, mass: step.mass },
    );
    if (verdict === 'note') return [];
    const figure = showPercent(relative);
    const shownLimit = showPercent(limit);
    const text = code === 'coarse-but-weighed'
      ? words.gaugeCoarseButWeighed(step.number, gauge.name, figure)
      : (code === 'cannot-meet' ? words.gaugeCannotMeet : words.gaugeCoarse)(step.number, gauge.name, figure, shownLimit);
    return [finding(coarseCard, { verdict, place, words: text, figure, limit: shownLimit })];
  });
}

function judgeOverRange({ plan }: HazardContext): readonly Finding[] {
  const used = [...new Set(plan.steps.map((step) => step.gauge))];
  return used.flatMap((key) => {
    const gauge = gaugeOf(plan, key);
    const firstUse = plan.steps.findIndex((step) => step.gauge === key);
    const over = plan.steps.find((step, i) => i > firstUse && gauge && exceeds(step.state.pressure, gauge.fullScale));
    if (!gauge || !over) return [];
    const scale = showPressure(plan, gauge.fullScale, key);
    const figure = showPressure(plan, over.state.pressure, over.gauge);
    return [finding(isolateCard, {
      verdict: 'caution',
      place: { kind: 'step', step: over.number },
      about: gauge.key,
      words: words.isolateGauge(over.number, gauge.name, scale, figure),
      figure,
      limit: scale,
    })];
  });
}

function gaugeOf(plan: UncheckedPlan, key: string | null): JobGauge | undefined {
  return plan.job.gauges.find((gauge) => gauge.key === key);
}

import { ok } from '../../../units/index.ts';
import type { Outcome } from '../../../units/index.ts';
import { oxygenWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import type { GasRatio } from '../gas-ratio.ts';
import type { RoleReason } from '../gas-roles.ts';
import { oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent, showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { LaboratoryValues } from '../../values/value.ts';
import { worstCase } from '../worst-case.ts';

const card: RuleCard = {
  id: 'oxygen-enriched',
  title: 'Oxygen-enriched gas: finished gas, each state, each parent',
  source: '29 CFR 1910.146; ISO 10156 clause 5.3',
  edition: 'CFR as read in a public copy; ISO 10156:2017',
  trust: 'seen',
};

/** Says where oxygen-service precautions begin. */
export const oxygenEnriched: HazardRule = { ...card, judge };

/** Oxygen content and oxidising power, two ratios of which the larger one counts, and where oxygen service begins. */
interface Enrichment {
  readonly content: GasRatio;
  readonly power: GasRatio;
  /** As a fraction. */
  readonly above: number;
  readonly limit: string;
}

/** Fraction above which oxygen service is asked for. */
function enrichedAbove(values: LaboratoryValues): number {
  return valueIn(values, oxidisingAbovePercent) / 100;
}

function enrichmentOf(gases: readonly string[], values: LaboratoryValues): Outcome<Enrichment, RoleReason> {
  const power = oxidisingPowerRatio(gases, 'cautious', values);
  if (!power.ok) return power;
  return ok({
    content: { over: gases.map((gas) => (gas === 'oxygen' ? 1 : 0)), under: gases.map(() => 1) },
    power: power.value,
    above: enrichedAbove(values),
    limit: showShare(enrichedAbove(values)),
  });
}

/** The larger of oxygen content and oxidising power of amount fractions. */
function enrichmentLevel({ content, power }: Enrichment, fractions: ArrayLike<number>): number {
  return Math.max(evaluateRatio(content, fractions), evaluateRatio(power, fractions));
}

function judge({ plan }: HazardContext): readonly Finding[] {
  const enrichment = enrichmentOf(plan.job.gases, plan.job.values);
  if (!enrichment.ok) {
    return [finding(card, {
      verdict: 'caution',
      place: { kind: 'finished gas' },
      words: words.enrichmentNotComputed(enrichment.reason.gas),
      figure: NOT_COMPUTED,
      limit: showShare(enrichedAbove(plan.job.values)),
    })];
  }
  return [
    ...judgeStates(plan, enrichment.value),
    ...judgeFinished(plan, enrichment.value),
    ...usedParents(plan).flatMap((parent) => {
      const level = enrichmentLevel(enrichment.value, parent.fractions);
      if (!(level > enrichment.value.above)) return [];
      const figure = showPercent(level);
      return [finding(card, {
        verdict: 'caution',
        place: { kind: 'parent', parent: parent.key },
        words: words.enrichedParent(parent.name, figure),
        figure,
        limit: enrichment.value.limit,
      })];
    }),
  ];
}

/** One finding for each unbroken run of enriched states, at its first step. */
function judgeStates(plan: UncheckedPlan, enrichment: Enrichment): readonly Finding[] {
  const findings: Finding[] = [];
  const startLevel = plan.start ? enrichmentLevel(enrichment, plan.start.fractions) : 0;
  if (startLevel > enrichment.above) {
    const figure = showPercent(startLevel);
    findings.push(finding(card, { verdict: 'caution', place: { kind: 'cylinder' }, words: words.enrichedStart(figure), figure, limit: enrichment.limit }));
  }
  let run: { first: number; last: number; highest: number } | null = null;
  const close = (): void => {
    if (run === null) return;
    const figure = showPercent(run.highest);
    const place = { kind: 'step', step: run.first } as const;
    findings.push(finding(card, { verdict: 'caution', place, words: words.enrichedStep(run.first, run.last, figure), figure, limit: enrichment.limit }));
    run = null;
  };
  for (const step of plan.steps) {
    const level = enrichmentLevel(enrichment, step.state.fractions);
    if (level > enrichment.above) {
      const before: { first: number; highest: number } = run ?? { first: step.number, highest: 0 };
      run = { first: before.first, last: step.number, highest: Math.max(before.highest, level) };
    } else close();
  }
  close();
  return findings;
}

function judgeFinished(plan: UncheckedPlan, enrichment: Enrichment): readonly Finding[] {
  const planned = enrichmentLevel(enrichment, plan.finished.fractions);
  const worst = Math.max(worstCase(plan, enrichment.content).value, worstCase(plan, enrichment.power).value);
  if (!(worst > enrichment.above)) return [];
  const figure = showPercent(planned);
  const shownWorst = showPercent(worst);
  return [finding(card, {
    verdict: 'caution',
    place: { kind: 'finished gas' },
    words: planned > enrichment.above ? words.enrichedFinished(figure, shownWorst) : words.enrichedWithinTolerance(figure, shownWorst),
    figure: shownWorst,
    limit: enrichment.limit,
  })];
}

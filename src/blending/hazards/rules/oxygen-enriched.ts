import { ok } from '../../../units/index.ts';
import type { Outcome } from '../../../units/index.ts';
import { oxygenWords as words } from '../../messages/hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import type { GasRatio } from '../gas-ratio.ts';
import type { RoleReason } from '../gas-roles.ts';
import { oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent } from '../show.ts';
import { worstCase } from '../worst-case.ts';

const card: RuleCard = {
  id: 'oxygen-enriched',
  title: 'Oxygen-enriched gas: finished gas, each state, each parent',
  source: '29 CFR 1910.146; ISO 10156 clause 5.3',
  edition: 'CFR as read in a public copy; ISO 10156:2017',
  trust: 'seen',
};

/** Oxygen content or oxidising power above which oxygen service is asked for, as a fraction. */
export const enrichedAbove = oxidisingAbovePercent / 100;

const limit = showPercent(enrichedAbove);

/** Says where oxygen-service precautions begin. */
export const oxygenEnriched: HazardRule = { ...card, judge };

/** Oxygen content and oxidising power, two ratios of which the larger one counts. */
interface Enrichment {
  readonly content: GasRatio;
  readonly power: GasRatio;
}

function enrichmentOf(gases: readonly string[]): Outcome<Enrichment, RoleReason> {
  const power = oxidisingPowerRatio(gases, 'cautious');
  if (!power.ok) return power;
  return ok({
    content: { over: gases.map((gas) => (gas === 'oxygen' ? 1 : 0)), under: gases.map(() => 1) },
    power: power.value,
  });
}

/** The larger of oxygen content and oxidising power of amount fractions. */
function enrichmentLevel({ content, power }: Enrichment, fractions: ArrayLike<number>): number {
  return Math.max(evaluateRatio(content, fractions), evaluateRatio(power, fractions));
}

function judge({ plan }: HazardContext): readonly Finding[] {
  const enrichment = enrichmentOf(plan.job.gases);
  if (!enrichment.ok) {
    return [finding(card, {
      verdict: 'caution',
      place: { kind: 'finished gas' },
      words: words.enrichmentNotComputed(enrichment.reason.gas),
      figure: NOT_COMPUTED,
      limit,
    })];
  }
  return [
    ...judgeStates(plan, enrichment.value),
    ...judgeFinished(plan, enrichment.value),
    ...usedParents(plan).flatMap((parent) => {
      const level = enrichmentLevel(enrichment.value, parent.fractions);
      if (!(level > enrichedAbove)) return [];
      const figure = showPercent(level);
      return [finding(card, {
        verdict: 'caution',
        place: { kind: 'parent', parent: parent.key },
        words: words.enrichedParent(parent.name, figure),
        figure,
        limit,
      })];
    }),
  ];
}

/** One finding for each unbroken run of enriched states, at its first step. */
function judgeStates(plan: UncheckedPlan, enrichment: Enrichment): readonly Finding[] {
  const findings: Finding[] = [];
  const startLevel = plan.start ? enrichmentLevel(enrichment, plan.start.fractions) : 0;
  if (startLevel > enrichedAbove) {
    const figure = showPercent(startLevel);
    findings.push(finding(card, { verdict: 'caution', place: { kind: 'cylinder' }, words: words.enrichedStart(figure), figure, limit }));
  }
  let run: { first: number; last: number; highest: number } | null = null;
  const close = (): void => {
    if (run === null) return;
    const figure = showPercent(run.highest);
    const place = { kind: 'step', step: run.first } as const;
    findings.push(finding(card, { verdict: 'caution', place, words: words.enrichedStep(run.first, run.last, figure), figure, limit }));
    run = null;
  };
  for (const step of plan.steps) {
    const level = enrichmentLevel(enrichment, step.state.fractions);
    if (level > enrichedAbove) {
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
  if (!(worst > enrichedAbove)) return [];
  const figure = showPercent(planned);
  const shownWorst = showPercent(worst);
  return [finding(card, {
    verdict: 'caution',
    place: { kind: 'finished gas' },
    words: planned > enrichedAbove ? words.enrichedFinished(figure, shownWorst) : words.enrichedWithinTolerance(figure, shownWorst),
    figure: shownWorst,
    limit,
  })];
}

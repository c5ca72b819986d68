import { oxygenLineWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale, pointOf, together } from '../fuel-and-oxidiser.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import { oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { parentOf } from '../plan-parts.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent, showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'oxygen-line',
  title: 'Filling line in oxygen service from the first enriched parent on',
  source: '29 CFR 1910.146 (enriched above 23.5 %); ASTM G93 and EIGA 33 (clean lines)',
  edition: 'CFR as read in a public copy; G93 scope seen; EIGA from memory',
  trust: 'seen',
};

/**
 * The common line, hose, gauge and filling valve see what every parent brings.
 * `oxygen-enriched` speaks of cylinder and parents; this one of the line, from
 * the first step that lets enriched gas into it, and of fuel in the same line.
 */
export const oxygenLine: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { gases, values } = plan.job;
  const limit = valueIn(values, oxidisingAbovePercent) / 100;
  const first = plan.steps.find((step) => enrichment(plan, step.parent) > limit);
  if (!first) return [];
  const figure = showPercent(enrichment(plan, first.parent));
  const scale = fuelOxidiserScale(gases, values);
  // The same share as for fuel and oxidiser in the cylinder: less fuel leaves nothing worth purging.
  const fuels = plan.steps.flatMap((step) => {
    const parent = parentOf(plan, step.parent);
    if (!parent || !scale.ok || step.parent === first.parent) return [];
    return pointOf(scale.value, parent.fractions).fuelOfLfl >= valueIn(values, together.fuelShare) ? [`${parent.name} (step ${step.number})`] : [];
  });
  const name = parentOf(plan, first.parent)?.name ?? first.parent;
  const last = plan.steps.at(-1)?.number ?? first.number;
  return [finding(card, {
    verdict: fuels.length > 0 ? 'caution' : 'note',
    place: { kind: 'step', step: first.number },
    words: fuels.length > 0
      ? words.lineWithFuel(first.number, name, figure, fuels.join(', '))
      : words.line(first.number, last, name, figure),
    figure,
    limit: showShare(limit),
  })];
}

/** Oxygen content or oxidising power of a parent, whichever is higher; a gas without data is `oxygen-enriched`’s to tell. */
function enrichment({ job }: UncheckedPlan, key: string): number {
  const fractions = job.parents.find((parent) => parent.key === key)?.fractions ?? [];
  const power = oxidisingPowerRatio(job.gases, 'cautious', job.values);
  return Math.max(fractions[job.gases.indexOf('oxygen')] ?? 0, power.ok ? evaluateRatio(power.value, fractions) : 0);
}

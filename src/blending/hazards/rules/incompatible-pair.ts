import { reactionWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { reactionOf, reactiveImpurity, reactiveResidual, reactiveShare } from '../data/incompatible-pairs.ts';
import type { PairLevel, Reaction } from '../data/incompatible-pairs.ts';
import type { Finding, FindingPlace, Verdict } from '../finding.ts';
import { parentOf, stateBefore, usedParents } from '../plan-parts.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction, showPercent, showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import { isOrdered } from './largest-content.ts';

const card: RuleCard = {
  id: 'incompatible-pair',
  title: 'Gases that react with each other in the cylinder',
  source: 'Trade knowledge of reacting pairs; check supplier data',
  edition: 'no document read',
  trust: 'common practice, no source',
};

/**
 * Gases that react with each other: what is left in the cylinder, each parent,
 * the boundary where a parent streams into the contents, and so every state
 * after it and the finished gas. One finding a pair, where the two first meet.
 *
 * A gas that nobody ordered and that comes only as an impurity does not hold
 * the plan; it is compared with the gas that it can consume.
 */
export const incompatiblePair: HazardRule = { ...card, judge };

/** Fractions below this are rounding, not gas. */
const nothing = 1e-9;

const verdicts: Readonly<Record<PairLevel, Verdict>> = { forbid: 'hold', restrict: 'caution', caution: 'note' };

const limits: Readonly<Record<PairLevel, string>> = {
  forbid: 'not in one cylinder', restrict: 'only after review', caution: 'with care',
};

/** `meant`: ordered, or a main part of a parent or of the residual. */
type Part = 'absent' | 'impurity' | 'meant';

function judge({ plan }: HazardContext): readonly Finding[] {
  const { gases } = plan.job;
  const parts = gases.map((_, i) => partOf(plan, i));
  const findings: Finding[] = [];
  gases.forEach((a, i) => {
    for (let j = i + 1; j < gases.length; j += 1) {
      const [one, other] = [parts[i], parts[j]];
      if (one === 'absent' || other === 'absent' || (one === 'impurity' && other === 'impurity')) continue;
      const reaction = reactionOf(a, gases[j]!);
      if (!reaction || reaction.flame) continue;
      findings.push(...(one === 'meant' && other === 'meant'
        ? [judgePair(plan, reaction)]
        : judgeImpurity(plan, reaction, one === 'impurity' ? i : j)));
    }
  });
  return findings;
}

/** What a gas is to the plan; of a limit of detection, of which half is counted elsewhere, the whole counts here. */
function partOf(plan: UncheckedPlan, gas: number): Part {
  if ((plan.finished.fractions[gas] ?? 0) <= nothing) return 'absent';
  const impurity = valueIn(plan.job.values, reactiveImpurity) * 1e-6;
  const inParents = Math.max(0, ...usedParents(plan).map(({ fractions, belowLimit }) => (fractions[gas] ?? 0) * (belowLimit.includes(gas) ? 2 : 1)));
  const left = plan.start?.fractions[gas] ?? 0;
  const leftPressure = left * (plan.start?.pressure ?? 0);
  const muchLeft = left > impurity && leftPressure > valueIn(plan.job.values, reactiveResidual) * 100;
  return isOrdered(plan, gas) || inParents > impurity || muchLeft ? 'meant' : 'impurity';
}

function judgePair(plan: UncheckedPlan, reaction: Reaction): Finding {
  const { level, first, second, reason, condition } = reaction;
  const place = meetingPlace(plan, first, second);
  const name = place.kind === 'parent' ? parentOf(plan, place.parent)?.name ?? place.parent : '';
  const figure = `${first} ${showFraction(content(plan, first))} with ${second} ${showFraction(content(plan, second))} in the finished gas`;
  return finding(card, {
    verdict: verdicts[level],
    place,
    about: `${first}-${second}`,
    words: words.pair(level, first, second, where(place, name), reason, condition, figure),
    figure,
    limit: condition ?? limits[level],
  });
}

/** Where the two come together first: in what was left, in a parent, or where a parent streams into the contents. */
function meetingPlace(plan: UncheckedPlan, first: string, second: string): FindingPlace {
  const pair = [first, second].map((gas) => ({
    at: (plan.job.gases as readonly string[]).indexOf(gas),
    // Traces that a later step drowns do not make the meeting.
    enough: Math.min(1e-6, 0.1 * content(plan, gas)),
  }));
  const meet = (...mixtures: readonly (ArrayLike<number> | undefined)[]): boolean =>
    pair.every(({ at, enough }) => mixtures.some((fractions) => (fractions?.[at] ?? 0) >= enough));
  if (plan.start && meet(plan.start.fractions)) return { kind: 'cylinder' };
  for (const step of plan.steps) {
    const parent = parentOf(plan, step.parent);
    if (parent && meet(parent.fractions)) return { kind: 'parent', parent: parent.key };
    if (meet(parent?.fractions, stateBefore(plan, step.number)?.fractions)) return { kind: 'step', step: step.number };
  }
  return { kind: 'finished gas' };
}

function where(place: FindingPlace, parentName: string): string {
  switch (place.kind) {
    case 'cylinder':
      return 'are together in what is left in the cylinder';
    case 'parent':
      return `are together in parent ${parentName}`;
    case 'step':
      return `meet at step ${place.step}`;
    case 'finished gas':
    case 'room':
      return 'are together in the finished gas';
  }
}

/** A gas that nobody ordered beside one that was meant to be there: how much of the latter it can consume. */
function judgeImpurity(plan: UncheckedPlan, reaction: Reaction, impurity: number): readonly Finding[] {
  const { level, first, second, reason, takes } = reaction;
  if (level === 'caution') return [];
  const gas = plan.job.gases[impurity]!;
  const [partner, perMolecule] = gas === second ? [first, takes] : [second, 1 / takes];
  const { most, belowLimit } = largestImpurity(plan, impurity);
  const share = Math.min(1, (most * perMolecule) / content(plan, partner));
  const limit = valueIn(plan.job.values, reactiveShare) / 100;
  const much = share > limit;
  if (level === 'restrict' && !much) return [];
  const shown = share >= 1 ? 'all' : showPercent(share);
  return [finding(card, {
    verdict: level === 'forbid' && much ? 'caution' : 'note',
    place: { kind: 'finished gas' },
    about: `${first}-${second}`,
    words: words.impurity(gas, showFraction(most), partner, showFraction(content(plan, partner)), shown, reason, belowLimit),
    figure: `up to ${shown} of the ${partner}`,
    limit: `${showShare(limit)} of the ${partner}`,
  })];
}

/** Content of an impurity in the finished gas with every `<` line at its full limit; the plan counts half of it. */
function largestImpurity(plan: UncheckedPlan, gas: number): { readonly most: number; readonly belowLimit: boolean } {
  let extra = 0;
  for (const step of plan.steps) {
    const parent = parentOf(plan, step.parent);
    if (parent?.belowLimit.includes(gas)) extra += step.amount * (parent.fractions[gas] ?? 0);
  }
  const { amounts, total } = plan.finished;
  return { most: ((amounts[gas] ?? 0) + extra) / total, belowLimit: extra > 0 };
}

function content(plan: UncheckedPlan, gas: string): number {
  return plan.finished.fractions[(plan.job.gases as readonly string[]).indexOf(gas)] ?? 0;
}

import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { UncheckedPlan } from '../plan/plan.ts';
import type { Finding, FindingPlace, Trust, Verdict } from './finding.ts';

/**
 * What rules need of the thermodynamic model, handed in so that no rule knows
 * which model made the plan. Pressures are absolute, of the closed cylinder.
 */
export interface HazardTools {
  /** Pressure of the finished cylinder at another temperature. */
  pressureAt(temperature: Kelvin): Outcome<Pascal, { readonly code: string }>;
  /** Pressure after step `step` (from 1) at another temperature. */
  stepPressureAt(step: number, temperature: Kelvin): Outcome<Pascal, { readonly code: string }>;
}

/** The plan to judge, and the means to. */
export interface HazardContext {
  readonly plan: UncheckedPlan;
  readonly tools: HazardTools;
}

/**
 * One rule. `source` and `edition` are printed with every finding; `trust` says
 * how far they were checked. A rule that has nothing to say answers an empty
 * list; one that cannot be computed says so in a finding that counts against
 * the plan.
 */
export interface HazardRule {
  readonly id: string;
  readonly title: string;
  readonly source: string;
  readonly edition: string;
  readonly trust: Trust;
  readonly judge: (context: HazardContext) => readonly Finding[];
}

/** What a rule is without its judging part, to build its findings with. */
export type RuleCard = Omit<HazardRule, 'judge'>;

/** The three texts of a finding, from `messages/hazards`. */
export interface FindingWords {
  readonly title: string;
  readonly detail: string;
  readonly remedy: string;
}

export interface FindingParts {
  readonly verdict: Verdict;
  readonly place: FindingPlace;
  readonly words: FindingWords;
  readonly figure: string;
  readonly limit: string;
  /** When the figures behind this one finding are worth less than the rule itself. */
  readonly trust?: Trust;
  /** Tells findings of one rule at one place apart, for example a gas. */
  readonly about?: string;
}

/** Shown as figure when a check could not be made. */
export const NOT_COMPUTED = 'not computed';

const none: readonly string[] = [];

/** Builds a finding of a rule; its id is rule, place and, where needed, what it is about. */
export function finding(card: RuleCard, parts: FindingParts): Finding {
  const { verdict, place, words, figure, limit, trust, about } = parts;
  const id = `${card.id}:${placeKey(place)}`;
  return {
    id: about === undefined ? id : `${id}:${about.replaceAll(' ', '-')}`,
    rule: card.id,
    verdict,
    place,
    ...words,
    figure,
    limit,
    source: `${card.source} (${card.edition})`,
    trust: trust ?? card.trust,
    replaced: none,
  };
}

function placeKey(place: FindingPlace): string {
  switch (place.kind) {
    case 'step':
      return `step-${place.step}`;
    case 'parent':
      return `parent-${place.parent}`;
    case 'finished gas':
      return 'finished-gas';
    case 'cylinder':
    case 'room':
      return place.kind;
  }
}

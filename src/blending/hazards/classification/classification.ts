import type { Pascal } from '../../../units/index.ts';
import { suggestedClassWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { acuteCategories } from '../data/acute-toxicity.ts';
import type { Trust } from '../finding.ts';
import { valueIn } from '../../values/value.ts';
import { criteriaOf } from './criteria.ts';
import type { Basis, Criteria, UndecidedReason } from './criteria.ts';
import { category1BAbove, ignitableUpTo, underPressureFrom, unitedStatesFrom } from './limits.ts';
import { chooseEntry } from './transport.ts';
import type { TransportChoice } from './transport.ts';

/** One line of a suggested label, with where it comes from. */
export interface ClassLine {
  /** `H280`, `2.3`, `UN 1956`; empty for a remark. */
  readonly code: string;
  readonly text: string;
  /** With its edition. */
  readonly source: string;
  readonly trust: Trust;
}

/** The class of a gas in transport. */
export interface TransportClass {
  /** `2.1`, `2.2` or `2.3`. */
  readonly division: string;
  readonly subsidiary: readonly string[];
  readonly un: number;
  /** Class, number and name as lines to print. */
  readonly lines: readonly ClassLine[];
}

/**
 * A class as far as it could be judged. `transport` is null where the gas is
 * not subject (no gas under pressure and no other hazard), or where something
 * could not be judged: then `notJudged` says what.
 */
export interface SuggestedClass {
  readonly basis: Basis;
  readonly transport: TransportClass | null;
  readonly signalWord: 'Danger' | 'Warning' | null;
  /** Statements of the Globally Harmonized System. */
  readonly statements: readonly ClassLine[];
  readonly precautions: readonly ClassLine[];
  readonly remarks: readonly ClassLine[];
  /** Why no class is suggested; empty when one is. */
  readonly notJudged: readonly string[];
}

/** What the label might say, as planned and at worst within the tolerances. */
export interface Classification {
  readonly planned: SuggestedClass;
  readonly worst: SuggestedClass;
  /** The two differ in class, number or statements: both have to be shown. */
  readonly differs: boolean;
  /** To be printed beside either: it is a suggestion. */
  readonly caveat: string;
}

/**
 * Suggests hazard class, UN number and label lines for the finished gas. The
 * one who hands the cylinder over decides; nothing here is an approval.
 */
export function suggestClassification(plan: UncheckedPlan): Classification {
  const planned = suggest(plan, 'planned');
  const worst = suggest(plan, 'worst');
  return { planned, worst, differs: fingerprint(planned) !== fingerprint(worst), caveat: words.caveat };
}

function fingerprint({ transport, statements, notJudged }: SuggestedClass): string {
  return JSON.stringify([transport?.un, transport?.division, transport?.subsidiary, statements.map((line) => line.code), notJudged.length > 0]);
}

function suggest(plan: UncheckedPlan, basis: Basis): SuggestedClass {
  const criteria = criteriaOf(plan, basis);
  const notJudged = reasonsOf(criteria);
  const pressure = pressureAt20(plan);
  const underPressure = pressure === null || (pressure - plan.job.conditions.barometer) >= valueIn(plan.job.values, underPressureFrom) * 1e3 * (1 - 1e-9);
  const choice = notJudged.length > 0 ? null : chooseEntry(plan, criteria);
  const harmless = choice !== null && choice.entry.division === '2.2' && choice.entry.subsidiary.length === 0;
  const free = harmless && !underPressure && !criteria.liquefied;
  const statements = statementsOf(plan, criteria, underPressure);
  if (notJudged.length === 0 && choice === null) notJudged.push(words.noEntry);
  return {
    basis,
    transport: choice === null || free ? null : transportClass(choice),
    signalWord: signalWord(statements),
    statements,
    precautions: precautionsOf(criteria, underPressure),
    remarks: remarksOf(plan, criteria, { pressure, free, underPressure }),
    notJudged,
  };
}

/** Absolute pressure of the finished cylinder at 20 °C; null when it was not computed. */
function pressureAt20(plan: UncheckedPlan): Pascal | null {
  return plan.final.developedPressures.find((point) => Math.abs(point.temperature - 293.15) < 0.005)?.pressure ?? null;
}

function reasonsOf({ flammable, oxidising, toxic, ammoniaOnly }: Criteria): string[] {
  const reasons = [flammable, oxidising, toxic].filter((judged): judged is UndecidedReason => typeof judged === 'object');
  // A toxic mixture follows ammonia's own entry, 2.3 without 2.1; below that no list says which of 2.1 and 2.2 it is.
  const apart = flammable === 'yes' && ammoniaOnly && toxic !== 'yes';
  return [...new Set([...reasons.map(words.undecided), ...(apart ? [words.ammoniaApart] : [])])];
}

function transportClass({ entry, kind, liquefied, technicalNames }: TransportChoice): TransportClass {
  const { un, division, subsidiary, trust } = entry;
  const source = words.transportSource;
  return {
    division, subsidiary, un,
    lines: [
      { code: subsidiary.length > 0 ? `${division} (${subsidiary.join(', ')})` : division, text: words.divisionName(division, subsidiary), source, trust },
      { code: `UN ${un}`, text: words.shippingName(kind, { division, subsidiary, liquefied }, technicalNames), source, trust },
    ],
  };
}

function statementsOf(plan: UncheckedPlan, criteria: Criteria, underPressure: boolean): readonly ClassLine[] {
  const { values } = plan.job;
  const codes: [code: string, trust: Trust][] = [];
  if (criteria.oxidising === 'yes') codes.push(['H270', 'seen']);
  if (criteria.flammable === 'yes') {
    const { lowerLimit, ammoniaOnly, pyrophoric } = criteria;
    // Without a computed limit the worse category stands.
    const milder = !pyrophoric && (ammoniaOnly || (lowerLimit !== null && lowerLimit > valueIn(values, category1BAbove)));
    codes.push([milder ? 'H221' : 'H220', 'seen']);
    if (pyrophoric) codes.push(['H232', 'seen']);
  }
  if (underPressure) codes.push(['H280', 'seen']);
  const { acuteEstimate } = criteria;
  const acute = acuteEstimate === null ? undefined : acuteCategories.find((each) => acuteEstimate <= valueIn(values, each.upTo) * (1 + 1e-9));
  if (acute) codes.push([acute.statement, 'from memory']);
  return codes.map(([code, trust]) => ({ code, text: words.statement(code), source: words.ghsSource, trust }));
}

const warningOnly: ReadonlySet<string> = new Set(['H221', 'H280', 'H332']);

function signalWord(statements: readonly ClassLine[]): SuggestedClass['signalWord'] {
  if (statements.length === 0) return null;
  return statements.every((line) => warningOnly.has(line.code)) ? 'Warning' : 'Danger';
}

function precautionsOf({ flammable, oxidising, toxic }: Criteria, underPressure: boolean): readonly ClassLine[] {
  const codes: [code: string, trust: Trust][] = [];
  if (oxidising === 'yes') codes.push(['P220', 'seen'], ['P244', 'seen']);
  if (flammable === 'yes') codes.push(['P210', 'from memory'], ['P377', 'from memory']);
  if (toxic === 'yes') codes.push(['P260', 'from memory']);
  if (underPressure) codes.push(['P410 + P403', 'from memory']);
  return codes.map(([code, trust]) => ({ code, text: words.precaution(code), source: words.ghsSource, trust }));
}

interface PressureRemarks {
  readonly pressure: Pascal | null;
  readonly free: boolean;
  readonly underPressure: boolean;
}

function remarksOf(plan: UncheckedPlan, criteria: Criteria, { pressure, free, underPressure }: PressureRemarks): readonly ClassLine[] {
  const { values } = plan.job;
  const remarks: ClassLine[] = [];
  const say = (text: string, source: string, trust: Trust): void => {
    remarks.push({ code: '', text, source, trust });
  };
  if (!underPressure) say(words.notUnderPressure(valueIn(values, underPressureFrom)), underPressureFrom.source, underPressureFrom.trust);
  if (free && pressure !== null && pressure >= valueIn(values, unitedStatesFrom) * 1e3) {
    say(words.unitedStates(valueIn(values, unitedStatesFrom)), unitedStatesFrom.source, unitedStatesFrom.trust);
  }
  if (pressure === null) say(words.pressureNotComputed, words.ghsSource, 'computed');
  if (criteria.flammable === 'yes') {
    const { lowerLimit } = criteria;
    if (lowerLimit === null) say(words.limitNotComputed, words.isoSource, 'computed');
    else if (lowerLimit > valueIn(values, ignitableUpTo)) say(words.rangeNotKnown(lowerLimit, valueIn(values, ignitableUpTo)), words.isoSource, 'seen');
    if (criteria.ammoniaOnly) say(words.ammoniaOnly, words.transportSource, 'from memory');
  }
  if (criteria.unstable.length > 0) say(words.unstable(criteria.unstable), words.ghsSource, 'from memory');
  if (criteria.withoutEstimate.length > 0) say(words.withoutEstimate(criteria.withoutEstimate), words.ghsSource, 'from memory');
  if (criteria.lc50 !== null) say(words.toxicity(criteria.lc50, criteria.acuteEstimate), words.toxicitySource, 'from memory');
  if (criteria.liquefied) say(words.liquefied, words.transportSource, 'computed');
  say(words.scope, words.ghsSource, 'from memory');
  return remarks;
}

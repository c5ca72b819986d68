import { formatVolume } from '../../../units/index.ts';
import { toxicityWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { idlhOf, idlhShare } from '../data/dangerous-room-air.ts';
import { lacksLc50, toxicRow } from '../data/toxic-gases.ts';
import type { Finding, Trust } from '../finding.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { replacedShare } from '../room-air.ts';
import { showFraction, showStated } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import { isOrdered, largestContent } from './largest-content.ts';

const card: RuleCard = {
  id: 'room-toxic',
  title: 'Toxic gas in the room if the cylinder empties into it',
  source: 'NIOSH concentrations immediately dangerous to life or health; else 1 % of the LC50 (own choice)',
  edition: 'as quoted in public documents, four figures and all LC50 from memory',
  trust: 'seen',
};

/** Each toxic gas in the room’s air after full mixing without ventilation, at its most within the tolerances. */
export const roomToxic: HazardRule = { ...card, judge };

/** Content of a gas that was not ordered up to which it is not looked at (own choice). */
const trace = 1e-6;

const place = { kind: 'room' } as const;

/** A harmful gas in the cylinder with the level in air that it is measured against; null: none known. */
interface Toxic {
  readonly gas: string;
  readonly content: number;
  readonly limit: { readonly fraction: number; readonly words: string; readonly trust: Trust } | null;
}

function judge({ plan }: HazardContext): readonly Finding[] {
  const toxic = toxicGases(plan);
  if (toxic.length === 0) return [];
  const { roomVolume } = plan.job.conditions;
  if (roomVolume === null) {
    const list = toxic.map(({ gas, content }) => `${gas} ${showFraction(content)}`).join(', ');
    return [finding(card, { verdict: 'caution', place, words: words.roomNotStated(list), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  const share = replacedShare(plan.final.releasedVolume, roomVolume);
  const released = formatVolume(plan.final.releasedVolume);
  const below: string[] = [];
  const unknown: string[] = [];
  const findings: Finding[] = [];
  for (const { gas, content, limit } of toxic) {
    const level = content * share;
    const figure = showFraction(level);
    if (limit === null) unknown.push(`${gas} ${figure}`);
    else if (level > limit.fraction) {
      findings.push(finding(card, {
        verdict: 'caution', place, about: gas, words: words.roomAbove(gas, figure, limit.words, released), figure, limit: limit.words, trust: limit.trust,
      }));
    } else below.push(`${gas} ${figure} (${limit.words})`);
  }
  if (unknown.length > 0) {
    const list = unknown.join(', ');
    findings.push(finding(card, {
      verdict: 'caution', place, about: 'unknown', words: words.roomUnknown(list, released), figure: NOT_COMPUTED, limit: 'no limit known here',
    }));
  }
  if (below.length > 0) {
    const list = below.join(', ');
    findings.push(finding(card, { verdict: 'note', place, words: words.roomBelow(list, released), figure: list, limit: 'as listed' }));
  }
  return findings;
}

function toxicGases(plan: UncheckedPlan): readonly Toxic[] {
  const { gases, values } = plan.job;
  return gases.flatMap((gas, i): Toxic[] => {
    const planned = plan.finished.fractions[i] ?? 0;
    if (planned <= (isOrdered(plan, i) ? 0 : trace)) return [];
    const limit = limitOf(gas, plan);
    return limit || lacksLc50(gas, values) ? [{ gas, content: largestContent(plan, i), limit }] : [];
  });
}

function limitOf(gas: string, { job: { values } }: UncheckedPlan): Toxic['limit'] {
  const idlh = idlhOf(gas);
  if (idlh) {
    const stated = valueIn(values, idlh);
    return { fraction: stated * 1e-6, words: `IDLH ${showStated(stated)} µmol/mol`, trust: idlh.trust };
  }
  const row = toxicRow(gas, values);
  if (!row) return null;
  const share = valueIn(values, idlhShare);
  const level = (row.lc50 * share) / 100;
  return { fraction: level * 1e-6, words: `${showStated(share)} % of the LC50, ${showStated(level)} µmol/mol`, trust: 'common practice, no source' };
}

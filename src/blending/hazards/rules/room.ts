import { formatVolume } from '../../../units/index.ts';
import { releaseWords as words } from '../../messages/later-hazards.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale, pointOf } from '../fuel-and-oxidiser.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { replacedShare, roomOxygen } from '../room-air.ts';
import { showPercent, showShare, showStated } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const oxygenCard: RuleCard = {
  id: 'room-oxygen',
  title: 'Oxygen in the room if the cylinder empties into it',
  source: '29 CFR 1910.146 (below 19.5 %, above 23.5 %); EIGA 44; 18 % is used in some countries',
  edition: 'CFR as read in a public copy; EIGA 44/18; 18 % and the full-mixing estimate from memory',
  trust: 'seen',
};

const flammableCard: RuleCard = {
  id: 'room-flammable',
  title: 'Flammable gas in the room if the cylinder empties into it',
  source: '29 CFR 1910.146 (10 % of the lower flammable limit)',
  edition: 'as read in a public copy',
  trust: 'seen',
};

const place = { kind: 'room' } as const;

/** Oxygen contents of air, and a share of the lower flammable limit. */
export const roomLimits = {
  deficientBelow: { id: 'room-oxygen-least', value: 0.195 },
  severeBelow: { id: 'room-oxygen-severe', value: 0.18 },
  enrichedAbove: { id: 'room-oxygen-most', value: 0.235 },
  flammableAbove: { id: 'room-fuel-share', value: 0.1 },
} as const satisfies Record<string, RuleValue>;

/** Oxygen left, or gained, in the room's air after full mixing without ventilation. */
export const roomOxygenRule: HazardRule = { ...oxygenCard, judge: judgeOxygen };

/** Share of the lower flammable limit in the room's air after full mixing. */
export const roomFlammableRule: HazardRule = { ...flammableCard, judge: judgeFlammable };

function judgeOxygen({ plan }: HazardContext): readonly Finding[] {
  const { values, conditions: { roomVolume } } = plan.job;
  if (roomVolume === null) {
    return [finding(oxygenCard, { verdict: 'caution', place, words: words.roomNotStated(), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  const inGas = plan.finished.fractions[plan.job.gases.indexOf('oxygen')] ?? 0;
  const level = roomOxygen(plan.final.releasedVolume, roomVolume, inGas, values);
  const least = valueIn(values, roomLimits.deficientBelow);
  const severe = valueIn(values, roomLimits.severeBelow);
  const most = valueIn(values, roomLimits.enrichedAbove);
  const figure = showPercent(level);
  const volume = formatVolume(plan.final.releasedVolume);
  if (level < least) {
    const text = words.oxygenDeficient(figure, volume, level < severe);
    return [finding(oxygenCard, { verdict: 'caution', place, words: text, figure, limit: `not below ${showShare(least)}${level < severe ? ` (${showShare(severe)} in some countries)` : ''}` })];
  }
  return level > most
    ? [finding(oxygenCard, { verdict: 'caution', place, words: words.oxygenRich(figure, volume), figure, limit: `not above ${showShare(most)}` })]
    : [finding(oxygenCard, { verdict: 'note', place, words: words.oxygenInRoom(figure, volume), figure, limit: `${showStated(100 * least)} to ${showShare(most)}` })];
}

function judgeFlammable({ plan }: HazardContext): readonly Finding[] {
  const { values, conditions: { roomVolume } } = plan.job;
  const scale = fuelOxidiserScale(plan.job.gases, values);
  if (roomVolume === null || !scale.ok) return [];
  const share = replacedShare(plan.final.releasedVolume, roomVolume);
  const level = pointOf(scale.value, plan.finished.fractions).fuelOfLfl * share;
  const most = valueIn(values, roomLimits.flammableAbove);
  if (!(level > most)) return [];
  const figure = showPercent(level);
  return [finding(flammableCard, { verdict: 'caution', place, words: words.flammableRoom(figure), figure: `${figure} of the lower flammable limit`, limit: `${showShare(most)} of the lower flammable limit` })];
}

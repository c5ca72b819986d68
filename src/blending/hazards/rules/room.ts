import { formatVolume } from '../../../units/index.ts';
import { releaseWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale, pointOf } from '../fuel-and-oxidiser.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { replacedShare, roomOxygen } from '../room-air.ts';
import { showPercent } from '../show.ts';

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
const deficientBelow = 0.195;
const severeBelow = 0.18;
const enrichedAbove = 0.235;
const flammableAbove = 0.1;

/** Oxygen left, or gained, in the room's air after full mixing without ventilation. */
export const roomOxygenRule: HazardRule = { ...oxygenCard, judge: judgeOxygen };

/** Share of the lower flammable limit in the room's air after full mixing. */
export const roomFlammableRule: HazardRule = { ...flammableCard, judge: judgeFlammable };

function judgeOxygen({ plan }: HazardContext): readonly Finding[] {
  const { roomVolume } = plan.job.conditions;
  if (roomVolume === null) {
    return [finding(oxygenCard, { verdict: 'caution', place, words: words.roomNotStated(), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  const inGas = plan.finished.fractions[plan.job.gases.indexOf('oxygen')] ?? 0;
  const level = roomOxygen(plan.final.releasedVolume, roomVolume, inGas);
  const figure = showPercent(level);
  const volume = formatVolume(plan.final.releasedVolume);
  if (level < deficientBelow) {
    const text = words.oxygenDeficient(figure, volume, level < severeBelow);
    return [finding(oxygenCard, { verdict: 'caution', place, words: text, figure, limit: level < severeBelow ? 'not below 19.5 % (18 % in some countries)' : 'not below 19.5 %' })];
  }
  return level > enrichedAbove
    ? [finding(oxygenCard, { verdict: 'caution', place, words: words.oxygenRich(figure, volume), figure, limit: 'not above 23.5 %' })]
    : [finding(oxygenCard, { verdict: 'note', place, words: words.oxygenInRoom(figure, volume), figure, limit: '19.5 to 23.5 %' })];
}

function judgeFlammable({ plan }: HazardContext): readonly Finding[] {
  const { roomVolume } = plan.job.conditions;
  const scale = fuelOxidiserScale(plan.job.gases);
  if (roomVolume === null || !scale.ok) return [];
  const share = replacedShare(plan.final.releasedVolume, roomVolume);
  const level = pointOf(scale.value, plan.finished.fractions).fuelOfLfl * share;
  if (!(level > flammableAbove)) return [];
  const figure = showPercent(level);
  return [finding(flammableCard, { verdict: 'caution', place, words: words.flammableRoom(figure), figure: `${figure} of the lower flammable limit`, limit: '10 % of the lower flammable limit' })];
}

import { conditioningWords as words } from '../../messages/later-hazards.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale, pointOf, together } from '../fuel-and-oxidiser.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import { oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { usedParents } from '../plan-parts.ts';
import { purgesOf } from '../purges.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent, showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'conditioning-line',
  title: 'Purge gas in a line that also carries fuel or enriched gas',
  source: '29 CFR 1910.146 (enriched above 23.5 %); ASTM G93 and EIGA 33 (clean lines)',
  edition: 'CFR as read in a public copy; G93 scope seen; EIGA from memory',
  trust: 'seen',
};

/** What `oxygen-line` asks of the parents that are added, asked of a purge gas and every other parent of the plan. */
export const conditioningLine: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { gases, values } = plan.job;
  const limit = valueIn(values, oxidisingAbovePercent) / 100;
  const power = oxidisingPowerRatio(gases, 'cautious', values);
  const scale = fuelOxidiserScale(gases, values);
  const enrichment = ({ fractions }: JobParent): number =>
    Math.max(fractions[gases.indexOf('oxygen')] ?? 0, power.ok ? evaluateRatio(power.value, fractions) : 0);
  const isFuel = ({ fractions }: JobParent): boolean =>
    scale.ok && pointOf(scale.value, fractions).fuelOfLfl >= valueIn(values, together.fuelShare);
  const purging = [...new Set(purgesOf(plan).map(({ parent }) => parent))];
  return purging.flatMap((parent) => {
    const others = usedParents(plan).filter((each) => each !== parent);
    const level = enrichment(parent);
    const enriched = isFuel(parent) ? others.filter((each) => enrichment(each) > limit) : [];
    const fuels = level > limit ? others.filter(isFuel) : [];
    const met = [...new Set([...fuels, ...enriched])];
    if (met.length === 0 && !(level > limit)) return [];
    const figure = showPercent(Math.max(level, ...enriched.map(enrichment)));
    const names = met.map(({ name }) => name).join(', ');
    return [finding(card, {
      verdict: met.length > 0 ? 'caution' : 'note',
      place: { kind: 'parent', parent: parent.key },
      words: met.length > 0 ? words.lineWithBoth(parent.name, figure, names) : words.line(parent.name, figure),
      figure,
      limit: showShare(limit),
    })];
  });
}

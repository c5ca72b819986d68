import { pascal } from '../../../units/index.ts';
import { materialWords as words } from '../../messages/later-hazards.ts';
import type { Finding } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showFraction, showPressure } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const card: RuleCard = {
  id: 'cylinder-material',
  title: 'Carbon monoxide, hydrogen sulfide and hydrogen in steel',
  source: 'Trade knowledge; check ISO 11114-1 and ISO 11114-4',
  edition: 'no document read',
  trust: 'common practice, no source',
};

/** Hydrogen partial pressure (bar absolute) from which the strength of the steel matters. */
export const hydrogenPartial: RuleValue = { id: 'hydrogen-in-steel', value: 50 };
/** Contents up to this are impurities, too little to be worth a finding (own choice). */
export const steelImpurity: RuleValue = { id: 'steel-impurity', value: 1e-6 };

/** Gases that attack steel. A cylinder of unknown material is judged as steel. */
export const cylinderMaterial: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { values, cylinder: { material } } = plan.job;
  if (material === 'aluminium') return [];
  const stated = material === 'steel';
  const place = { kind: 'cylinder' } as const;
  const content = (gas: string): number => plan.finished.fractions[(plan.job.gases as readonly string[]).indexOf(gas)] ?? 0;
  const impurity = valueIn(values, steelImpurity);
  const findings: Finding[] = [];
  for (const [gas, text] of [
    ['carbon monoxide', words.carbonMonoxideInSteel],
    ['hydrogen sulfide', words.hydrogenSulfideInSteel],
  ] as const) {
    if (content(gas) <= impurity) continue;
    const figure = showFraction(content(gas));
    findings.push(finding(card, { verdict: 'caution', place, about: gas, words: text(figure, stated), figure, limit: 'dry gas; aluminium preferred' }));
  }
  if (content('hydrogen') > impurity) {
    const partial = pascal(content('hydrogen') * plan.finished.pressure);
    const from = pascal(valueIn(values, hydrogenPartial) * 1e5);
    const much = partial > from;
    const gauge = gaugeOfFinish(plan);
    const figure = showPressure(plan, partial, gauge, { reference: 'absolute' });
    const limit = showPressure(plan, from, gauge, { reference: 'absolute' });
    findings.push(finding(card, {
      verdict: much ? 'caution' : 'note',
      place,
      about: 'hydrogen',
      words: much ? words.hydrogenInSteel(figure, limit, stated) : words.littleHydrogenInSteel(figure, stated),
      figure,
      limit,
    }));
  }
  return findings;
}

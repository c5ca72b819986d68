import { pascal } from '../../../units/index.ts';
import { materialWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showFraction, showPressure } from '../show.ts';

const card: RuleCard = {
  id: 'cylinder-material',
  title: 'Carbon monoxide, hydrogen sulfide and hydrogen in steel',
  source: 'Trade knowledge; check ISO 11114-1 and ISO 11114-4',
  edition: 'no document read',
  trust: 'common practice, no source',
};

/** Hydrogen partial pressure (absolute, Pa) from which the strength of the steel matters. */
const hydrogenPartial = 50e5;
/** Contents up to this are impurities, too little to be worth a finding (own choice). */
const impurity = 1e-6;

/** Gases that attack steel. A cylinder of unknown material is judged as steel. */
export const cylinderMaterial: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { material } = plan.job.cylinder;
  if (material === 'aluminium') return [];
  const stated = material === 'steel';
  const place = { kind: 'cylinder' } as const;
  const content = (gas: string): number => plan.finished.fractions[(plan.job.gases as readonly string[]).indexOf(gas)] ?? 0;
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
    const much = partial > hydrogenPartial;
    const gauge = gaugeOfFinish(plan);
    const figure = showPressure(plan, partial, gauge, { reference: 'absolute' });
    findings.push(finding(card, {
      verdict: much ? 'caution' : 'note',
      place,
      about: 'hydrogen',
      words: (much ? words.hydrogenInSteel : words.littleHydrogenInSteel)(figure, stated),
      figure,
      limit: showPressure(plan, pascal(hydrogenPartial), gauge, { reference: 'absolute' }),
    }));
  }
  return findings;
}

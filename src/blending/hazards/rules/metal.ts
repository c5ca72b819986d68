import { pascal, toPascal } from '../../../units/index.ts';
import { metalWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { deuteriumInSteel, metalImpurity, metalRow } from '../data/metals.ts';
import type { Metal, MetalLevel } from '../data/metals.ts';
import type { Finding } from '../finding.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showFraction, showPressure } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import { isOrdered } from './largest-content.ts';

const origin = {
  source: 'Trade knowledge; check ISO 11114-1',
  edition: 'no document read',
  trust: 'common practice, no source',
} as const;

const cylinderCard: RuleCard = { ...origin, id: 'material', title: 'Cylinder material against every gas in it' };
const fittingsCard: RuleCard = { ...origin, id: 'valve-and-fittings', title: 'Brass, copper and stainless steel in valve and fittings' };

/** Every gas against steel or aluminium; a material that is not stated is judged as the worse of the two. */
export const material: HazardRule = { ...cylinderCard, judge: judgeCylinder };

/** Every gas against the metals of valve, line and gauge, whose material the recipe does not know. */
export const valveAndFittings: HazardRule = { ...fittingsCard, judge: judgeFittings };

/** Gases in steel that `cylinder-material` judges with figures of their own. */
const judgedElsewhere: ReadonlySet<string> = new Set(['carbon monoxide', 'hydrogen sulfide', 'hydrogen']);

const severity: Readonly<Record<MetalLevel, number>> = { kind: 0, dry: 1, care: 2, limit: 3, never: 4 };

/** A gas of the finished cylinder that is worth judging. */
interface Present {
  readonly gas: string;
  readonly content: number;
  readonly shown: string;
}

function presentGases(plan: UncheckedPlan): readonly Present[] {
  const impurity = valueIn(plan.job.values, metalImpurity) * 1e-6;
  return plan.job.gases.flatMap((gas, i) => {
    const content = plan.finished.fractions[i] ?? 0;
    return content > impurity || (content > 0 && isOrdered(plan, i)) ? [{ gas, content, shown: `${gas} ${showFraction(content)}` }] : [];
  });
}

function judgeCylinder({ plan }: HazardContext): readonly Finding[] {
  const stated = plan.job.cylinder.material;
  const metals: readonly ('steel' | 'aluminium')[] = stated === 'rigid' ? ['steel', 'aluminium'] : [stated];
  const dry: string[] = [];
  const findings = presentGases(plan).flatMap((present) => {
    const row = metalRow(present.gas);
    if (!row) return [unknown(present)];
    const judged = metals
      .filter((metal) => metal === 'aluminium' || !judgedElsewhere.has(present.gas))
      .map((metal) => ({ metal, level: row.levels[metal] }))
      .sort((a, b) => severity[b.level] - severity[a.level])[0];
    if (!judged || judged.level === 'kind') return [];
    if (judged.level === 'dry') {
      dry.push(present.shown);
      return [];
    }
    return [judgeMetal(plan, present, judged.metal, judged.level, row.note, stated !== 'rigid')];
  });
  if (dry.length > 0) {
    const list = dry.join(', ');
    findings.push(finding(cylinderCard, {
      verdict: 'note', place: { kind: 'cylinder' }, about: 'dry', words: words.dryOnly(list), figure: list, limit: 'dry gas in a dry cylinder',
    }));
  }
  return findings;
}

function judgeMetal(
  plan: UncheckedPlan, { gas, content, shown }: Present, metal: Metal, level: MetalLevel, note: string, stated: boolean,
): Finding {
  const place = { kind: 'cylinder' } as const;
  if (gas === 'deuterium') {
    const gauge = gaugeOfFinish(plan);
    const partial = content * plan.finished.pressure;
    const limit = toPascal(valueIn(plan.job.values, deuteriumInSteel), 'bar');
    const show = (pressure: number): string => showPressure(plan, pascal(pressure), gauge, { reference: 'absolute' });
    const much = partial > limit;
    return finding(cylinderCard, {
      verdict: much ? 'caution' : 'note', place, about: gas, words: words.deuteriumInSteel(show(partial), much, stated), figure: show(partial), limit: show(limit),
    });
  }
  const never = level === 'never';
  return finding(cylinderCard, {
    verdict: never ? 'hold' : 'caution',
    place,
    about: gas,
    words: (never ? words.never : words.attacks)(shown, metal, note, stated),
    figure: shown,
    limit: never ? `not in ${metal}` : level === 'limit' ? 'only under the condition stated' : 'with care',
  });
}

function unknown({ gas, shown }: Present): Finding {
  return finding(cylinderCard, {
    verdict: 'caution', place: { kind: 'cylinder' }, about: gas, words: words.unknownGas(shown), figure: NOT_COMPUTED, limit: NOT_COMPUTED,
  });
}

/** One caution for what must not touch brass or copper, one note for what is to be watched. */
function judgeFittings({ plan }: HazardContext): readonly Finding[] {
  const never: string[] = [];
  const care: string[] = [];
  for (const { gas, shown } of presentGases(plan)) {
    const row = metalRow(gas);
    if (!row) continue;
    if (row.levels.brass === 'never') never.push(`${shown} (${row.note})`);
    else if (row.levels.brass !== 'kind') care.push(`${shown} (brass and copper: ${row.note})`);
    if (row.levels.stainless !== 'kind') care.push(`${shown} (stainless steel: corrosion)`);
  }
  const place = { kind: 'cylinder' } as const;
  return [
    ...(never.length > 0
      ? [finding(fittingsCard, { verdict: 'caution', place, about: 'brass', words: words.noBrass(never.join('; ')), figure: never.join('; '), limit: 'no brass or copper' })]
      : []),
    ...(care.length > 0
      ? [finding(fittingsCard, { verdict: 'note', place, about: 'care', words: words.careFittings(care.join('; ')), figure: care.join('; '), limit: 'with care' })]
      : []),
  ];
}

import { classWords as words } from '../../messages/later-hazards.ts';
import { assumptions } from '../../messages/hazards/classification.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale, pointOf, together } from '../fuel-and-oxidiser.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import { oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { FindingWords, HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent, showShare } from '../show.ts';
import { standInsOf } from '../stand-ins.ts';
import { valueIn } from '../../values/value.ts';
import { assumedTolerance, worstCase } from '../worst-case.ts';
import { oxidiserTrace } from './flammable-gas.ts';

const card: RuleCard = {
  id: 'oxidising-gas',
  title: 'Oxidising power of the finished gas',
  source: 'ISO 10156 clause 5.3',
  edition: 'ISO 10156:2017, read second hand',
  trust: 'seen',
};

/** Whether the finished gas is more oxidising than air, at its worst within the tolerances. */
export const oxidisingGas: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { gases, values } = plan.job;
  const x = plan.finished.fractions;
  const threshold = valueIn(values, oxidisingAbovePercent) / 100;
  const limit = showShare(threshold);
  const tabulated = oxidisingPowerRatio(gases, 'tabulated', values);
  const cautious = oxidisingPowerRatio(gases, 'cautious', values);
  const scale = fuelOxidiserScale(gases, values);
  const answer = (verdict: Finding['verdict'], text: FindingWords, figure: string, remembered = false): readonly Finding[] =>
    [finding(card, { verdict, place: { kind: 'finished gas' }, words: text, figure, limit, ...(remembered ? { trust: 'from memory' as const } : {}) })];
  if (!tabulated.ok) return answer('caution', words.classNotComputed('Oxidising power', tabulated.reason.code), NOT_COMPUTED);
  if (!cautious.ok || !scale.ok || pointOf(scale.value, x).oxygen <= valueIn(values, oxidiserTrace)) return [];
  const nominal = evaluateRatio(tabulated.value, x);
  const worst = worstCase(plan, cautious.value);
  const standIns = standInsOf(gases, x, ['oxidiser', 'inert'], values);
  const assumed = assumptions(standIns, worst.toleranceAssumed ? showShare(valueIn(values, assumedTolerance)) : null);
  const [shownNominal, shownWorst] = [showPercent(nominal), showPercent(worst.value)];
  const figure = `${shownNominal} as planned, ${shownWorst} at worst`;
  if (worstCase(plan, scale.value.fuel).value >= valueIn(values, together.fuelShare)) {
    return answer('caution', words.outsideOxidisingTest(shownNominal), NOT_COMPUTED);
  }
  return worst.value > threshold * (1 + 1e-9)
    ? answer('caution', words.oxidising(shownNominal, shownWorst, limit, assumed), figure, standIns.length > 0)
    : answer('note', words.notOxidising(shownNominal, shownWorst, limit, assumed), figure, standIns.length > 0);
}

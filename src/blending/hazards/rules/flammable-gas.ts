import { formatNumber } from '../../../units/index.ts';
import { classWords as words } from '../../messages/later-hazards.ts';
import { assumptions } from '../../messages/hazards/classification.ts';
import type { Finding } from '../finding.ts';
import { fuelOxidiserScale, pointOf, together } from '../fuel-and-oxidiser.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import { flammabilityRatio, flammableAbove, lowerFlammableLimit } from '../iso10156.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { FindingWords, HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFigure, showPercent, showShare, showStated } from '../show.ts';
import { standInsOf } from '../stand-ins.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';
import { assumedTolerance, worstCase } from '../worst-case.ts';

const card: RuleCard = {
  id: 'flammable-gas',
  title: 'Flammability of the finished gas in air',
  source: 'ISO 10156 clauses 4.3 and 4.5',
  edition: 'ISO 10156:2017, read second hand',
  trust: 'seen',
};

/** Oxidiser content up to which it counts as an impurity here and in `oxidising-gas` (own choice). */
export const oxidiserTrace: RuleValue = { id: 'oxidiser-trace', value: 1e-3 };

/** Whether the finished gas is flammable in air at atmospheric pressure, at its worst within the tolerances. */
export const flammableGas: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { gases, values } = plan.job;
  const x = plan.finished.fractions;
  const sumLimit = valueIn(values, flammableAbove);
  const limit = `sum ${showStated(sumLimit)}`;
  const tabulated = flammabilityRatio(gases, 'tabulated', values);
  const cautious = flammabilityRatio(gases, 'cautious', values);
  const scale = fuelOxidiserScale(gases, values);
  const answer = (verdict: Finding['verdict'], text: FindingWords, figure: string, remembered = false): readonly Finding[] =>
    [finding(card, { verdict, place: { kind: 'finished gas' }, words: text, figure, limit, ...(remembered ? { trust: 'from memory' as const } : {}) })];
  if (!tabulated.ok) return answer('caution', words.classNotComputed('Flammability', tabulated.reason.code), NOT_COMPUTED);
  if (!cautious.ok || !scale.ok) return [];
  const point = pointOf(scale.value, x);
  if (point.fuelOfLfl < valueIn(values, together.impurityShare)) return [];
  if (point.oxygen > valueIn(values, oxidiserTrace)) {
    const share = worstCase(plan, scale.value.fuel).value;
    const shown = showPercent(share);
    return share < valueIn(values, together.fuelShare)
      ? answer('note', words.leanInOxidiser(shown), `${shown} of the lower flammable limit`)
      : answer('caution', words.outsideFlammabilityTest(shown), NOT_COMPUTED);
  }
  const nominal = evaluateRatio(tabulated.value, x);
  const worst = worstCase(plan, cautious.value);
  const standIns = standInsOf(gases, x, ['fuel', 'inert'], values);
  const assumed = assumptions(standIns, worst.toleranceAssumed ? showShare(valueIn(values, assumedTolerance)) : null);
  const [shownNominal, shownWorst] = [showFigure(nominal), showFigure(worst.value)];
  const figure = `${shownNominal} as planned, ${shownWorst} at worst`;
  // Equal within rounding counts as not above.
  const above = (sum: number): boolean => sum > sumLimit * (1 + 1e-9);
  const remembered = standIns.length > 0;
  if (above(nominal)) {
    const lower = lowerFlammableLimit(gases, x, values);
    const shownLower = lower.ok ? `${formatNumber(lower.value, 1)} %` : null;
    return answer('caution', words.flammable(shownNominal, shownWorst, shownLower, assumed), figure, remembered);
  }
  return above(worst.value)
    ? answer('caution', words.perhapsFlammable(shownNominal, shownWorst, assumed), figure, remembered)
    : answer('note', words.notFlammable(shownNominal, shownWorst, assumed), figure, remembered);
}

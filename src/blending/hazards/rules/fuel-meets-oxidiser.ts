import { pascal } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { togetherWords as words } from '../../messages/hazards.ts';
import type { CylinderState, PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { boundaryReach, fuelOxidiserScale, limitingOxygen, pointOf, pressureAllowance, together } from '../fuel-and-oxidiser.ts';
import type { FuelOxidiserPoint, FuelOxidiserScale } from '../fuel-and-oxidiser.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import { flammabilityRatio, flammableAbove } from '../iso10156.ts';
import { parentOf, stateBefore } from '../plan-parts.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction, showPercent, showPressure } from '../show.ts';

const card: RuleCard = {
  id: 'fuel-meets-oxidiser',
  title: 'Oxidiser let into fuel, or fuel into oxidiser',
  source: 'Principle of EIGA 39 and EIGA 139 (judge every intermediate state); limits of IEC 60079-20-1, NFPA 497, ASTM E2079',
  edition: 'principle from memory; IEC 2010, NFPA 2008, ASTM E2079-19',
  trust: 'common practice, no source',
};

/**
 * Judges the boundary between the gas in the cylinder and the gas streaming
 * in. While they mix, every ratio of the two exists somewhere, so a harmless
 * mixed state does not excuse a flammable one on the way.
 *
 * Held when some ratio has the fuel at its lower flammable limit and the oxygen
 * at its limiting concentration together. The flammability test of ISO 10156 is
 * a second reason to hold, never an excuse: it asks about air, and fuel too
 * dilute for air (methane 8 % in nitrogen) burns with pure oxygen.
 */
export const fuelMeetsOxidiser: HazardRule = { ...card, judge };

/**
 * When what was in first suffices only for this absolute pressure of flammable
 * mixture in the whole cylinder, it is a note: burnt completely, even a tenfold
 * rise stays near atmospheric pressure (own choice).
 */
const harmlessPressure = 5000;

function judge({ plan }: HazardContext): readonly Finding[] {
  const scale = fuelOxidiserScale(plan.job.gases);
  // A gas without data is already held by `fuel-with-oxidiser`.
  if (!scale.ok) return [];
  return plan.steps.flatMap((step) => {
    const parent = parentOf(plan, step.parent);
    const before = stateBefore(plan, step.number);
    return parent && before ? judgeStep(plan, scale.value, step, parent, before) : [];
  });
}

function judgeStep(
  plan: UncheckedPlan, scale: FuelOxidiserScale, step: PlanStep, parent: JobParent, before: CylinderState,
): readonly Finding[] {
  const inside = pointOf(scale, before.fractions);
  const entering = pointOf(scale, parent.fractions);
  const oxidiserEnters = entering.oxygen > inside.oxygen && inside.fuelOfLfl > entering.fuelOfLfl;
  const fuelEnters = entering.fuelOfLfl > inside.fuelOfLfl && inside.oxygen > entering.oxygen;
  if (!oxidiserEnters && !fuelEnters) return [];
  const [fuelSide, oxygenSide] = oxidiserEnters ? [inside, entering] : [entering, inside];
  const pressure = pascal(Math.max(before.pressure, step.state.pressure));
  const limit = limitingOxygen(scale, [oxidiserEnters ? before.fractions : parent.fractions]);
  const oxygenLimit = limit.fraction * pressureAllowance(pressure);
  const burnsInAir = isoSum(plan, oxidiserEnters ? before.fractions : parent.fractions) > flammableAbove;
  const beyond = boundaryReach(fuelSide, oxygenSide, 1, oxygenLimit) >= 1 || (burnsInAir && oxygenSide.oxygen >= oxygenLimit);
  const near = boundaryReach(fuelSide, oxygenSide, together.fuelShare, together.oxygenShare * oxygenLimit) >= 1;
  if (!beyond && !near) return [];
  const trace = traceBurden(inside, before.pressure, oxidiserEnters, oxygenLimit) <= harmlessPressure;
  const inCylinder = `${oxidiserEnters ? `fuel at ${showPercent(inside.fuelOfLfl)} of its lower flammable limit` : `oxygen ${showFraction(inside.oxygen)}`}, ${showPressure(plan, before.pressure, step.gauge)}`;
  const text = trace ? words.boundaryTrace : beyond ? words.boundaryHold : words.boundaryLean;
  return [finding(card, {
    verdict: trace ? 'note' : beyond ? 'hold' : 'caution',
    place: { kind: 'step', step: step.number },
    words: text(step.number, parent.name, oxidiserEnters, inCylinder),
    figure: `fuel side ${showPercent(fuelSide.fuelOfLfl)} of the lower flammable limit, oxidiser side ${showFraction(oxygenSide.oxygen)} oxygen`,
    limit: `fuel 100 % of its lower flammable limit with oxygen ${showFraction(oxygenLimit)}`,
  })];
}

/** Pressure (Pa) up to which what was in first, evenly mixed, keeps the whole cylinder in the flammable range. */
function traceBurden(inside: FuelOxidiserPoint, pressure: Pascal, oxidiserEnters: boolean, oxygenLimit: number): number {
  return pressure * (oxidiserEnters ? inside.fuelOfLfl : inside.oxygen / oxygenLimit);
}

function isoSum(plan: UncheckedPlan, fractions: ArrayLike<number>): number {
  const ratio = flammabilityRatio(plan.job.gases, 'cautious');
  return ratio.ok ? evaluateRatio(ratio.value, fractions) : 0;
}

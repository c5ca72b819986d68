import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import { isSupercritical } from '../../thermo/index.ts';
import type { Arrangement } from '../plan/arrangement.ts';
import { CAUTIONS, HOLDS, WIDTH, costFrom } from './criteria.ts';
import type { JudgedOrder, OrderProblem, RouteFault, RouteStep } from './data.ts';
import { addCost, addPhaseCost, beyondRule, judgeAddition } from './judge.ts';
import type { JudgedAddition, Part } from './judge.ts';
import type { RouteProblem } from './problem.ts';
import type { FillState } from './states.ts';

/** Shares that sum to one within this are whole. */
const WHOLE = 1e-9;

/** Judges one order from the first addition to the last, every state tested; the same costs as in the lattice. */
export function judgeOrder(
  problem: RouteProblem, arrangement: Arrangement,
): Outcome<JudgedOrder, Extract<OrderProblem, { code: 'no-state' | 'arrangement-invalid' }>> {
  const parts = partsOf(problem, arrangement);
  if (!parts.ok) return parts;
  const { book } = problem;
  const units = new Float64Array(WIDTH);
  units[HOLDS] = problem.base.holds;
  units[CAUTIONS] = problem.base.cautions;
  const steps: RouteStep[] = [];
  const inPart = new Map<number, number>();
  let whole = 0;
  let before: FillState | null = null;
  for (const [i, { position, part }] of parts.value.entries()) {
    if (part.isLast) {
      whole |= 1 << position;
      inPart.delete(position);
    } else inPart.set(position, (inPart.get(position) ?? 0) + part.share);
    const after = book.state({ whole, parts: book.partsCode(inPart) }, part.parent.reading);
    if (after === null) return fail({ code: 'no-state', where: 'this order', reason: book.failure! });
    const isFinal = i === parts.value.length - 1;
    book.phaseOf(after);
    const judged = judgeAddition(problem, before, after, part, isFinal);
    addCost(problem, after, part, judged, units, 0);
    addPhaseCost(problem, after, isFinal, units, 0);
    steps.push(stepOf(problem, after, part, judged, isFinal));
    before = after;
  }
  return ok({ arrangement, cost: costFrom(units), steps });
}

/** The additions with the position of their parent in the problem; fails unless every parent needed goes in once as a whole. */
function partsOf(
  { parents }: RouteProblem, arrangement: Arrangement,
): Outcome<readonly { readonly position: number; readonly part: Part }[], Extract<OrderProblem, { code: 'arrangement-invalid' }>> {
  const given = new Map<number, number>();
  const parts: { position: number; part: Part }[] = [];
  for (const { parent: index, share } of arrangement) {
    const position = parents.findIndex((parent) => parent.index === index);
    const sum = (given.get(index) ?? 0) + share;
    if (position < 0 || !(share > 0) || !(sum <= 1 + WHOLE)) return fail({ code: 'arrangement-invalid', parent: index });
    given.set(index, sum);
    parts.push({ position, part: { parent: parents[position]!, share, isLast: sum >= 1 - WHOLE } });
  }
  const missing = parents.find(({ index }) => !((given.get(index) ?? 0) >= 1 - WHOLE));
  return missing === undefined ? ok(parts) : fail({ code: 'arrangement-invalid', parent: missing.index });
}

function stepOf(problem: RouteProblem, after: FillState, { parent, share }: Part, judged: JudgedAddition, isFinal: boolean): RouteStep {
  const { phase: tested } = problem.book.phaseOf(after).tested;
  return {
    parent: parent.index, share,
    pressure: after.pressure, temperature: after.temperature, rise: judged.rise,
    mixture: after.meeting === null || judged.together === null ? null : { ...after.meeting.point, class: judged.together },
    boundary: judged.boundary?.verdict ?? 'none',
    phase: tested === 'gas' && isSupercritical(problem.book.model, after.temperature, after.fractions) ? 'supercritical' : tested,
    supplyLeft: parent.left,
    gauge: after.gauge?.key ?? null,
    relativeUncertainty: judged.relative,
    faults: faultsOf(problem, after, parent.left, judged, isFinal),
  };
}

const gravity: Readonly<Record<RouteFault['verdict'], number>> = { hold: 0, caution: 1, none: 2 };

function faultsOf(
  { job, finished, book }: RouteProblem, after: FillState, left: RouteStep['supplyLeft'], judged: JudgedAddition, isFinal: boolean,
): readonly RouteFault[] {
  const faults: RouteFault[] = [];
  const { together, boundary, supply, gauge } = judged;
  const { tested, condensation } = book.phaseOf(after);
  const point = isFinal && finished.mixture !== null ? finished.mixture.point : after.meeting?.point;
  if (point !== undefined && (together === 'hold' || together === 'lean')) {
    faults.push({ code: 'together', verdict: together === 'hold' ? 'hold' : 'caution', finished: isFinal, fuelOfLfl: point.fuelOfLfl, oxygen: point.oxygen });
  }
  if (boundary !== null && boundary.verdict !== 'note') {
    const { verdict, oxidiserEnters, fuelSide, oxygenSide } = boundary;
    faults.push({ code: 'boundary', verdict, oxidiserEnters, fuelOfLfl: fuelSide.fuelOfLfl, oxygen: oxygenSide.oxygen });
  }
  const limit = job.cylinder.workingPressure;
  if (after.stop !== null && limit !== null) faults.push({ code: 'stop', verdict: after.stop.verdict, limit });
  if (condensation !== null) faults.push({ code: 'condensation', verdict: condensation.verdict, by: condensation.code });
  if (isFinal && finished.isUnstable && tested.phase !== 'unstable') faults.push({ code: 'condensation', verdict: 'hold', by: 'separates' });
  if (supply !== null) faults.push({ code: 'supply', verdict: supply.verdict, by: supply.code, pressure: supply.pressure });
  if (gauge?.verdict === 'hold') faults.push({ code: 'unmeasured', verdict: 'hold', relative: gauge.relative, limit: gauge.limit });
  if (tested.phase === 'unstable' || tested.phase === 'not tested') faults.push({ code: 'not-gas', verdict: 'none', phase: tested.phase });
  const grade = judged.falls;
  if (beyondRule(judged) > 0 && grade !== 0 && left !== null) faults.push({ code: 'falls', verdict: grade === 2 && supply?.verdict !== 'hold' ? 'hold' : 'none', grade, left });
  return faults.sort((a, b) => gravity[a.verdict] - gravity[b.verdict]);
}

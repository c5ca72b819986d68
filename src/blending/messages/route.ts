import { formatNumber, formatPressureInFull } from '../../units/index.ts';
import type { Pascal } from '../../units/index.ts';
import { showFraction, showPercent } from '../figures.ts';
import type { Arrangement } from '../plan/arrangement.ts';
import type { Job } from '../recipe/job.ts';
import type { Criterion, OrderCost } from '../route/criteria.ts';
import type { OrderName, OrderProblem, RejectedOrder, RouteFault, WhyChosen } from '../route/data.ts';
import { thermoSentence } from './recipe.ts';

/** Sentences about the order of addition. */

/** A criterion by name. */
export const criterionText: Readonly<Record<Criterion, string>> = {
  holds: 'holds of gas and pressure',
  unmeasured: 'additions that the gauge cannot tell',
  cautions: 'cautions of gas and pressure',
  phase: 'states that are not one gas',
  supply: 'supply pressure',
  gauge: 'gauge accuracy',
  time: 'time',
  gas: 'gas lost in the lines',
};

/** The cost by one criterion, as shown. */
export function costText(criterion: Criterion, { [criterion]: value }: OrderCost, finer = 0): string {
  switch (criterion) {
    case 'gauge':
      return `${formatNumber(Math.sqrt(value), 2 + finer)} tolerances`;
    case 'time':
      return `${formatNumber(value, finer)} min`;
    case 'gas':
      return `${formatNumber(value, 2 + finer)} mol`;
    default:
      return formatNumber(value, finer);
  }
}

/** Two costs that differ, with so many digits that one sees it: `48 min against 51 min`. */
export function costAgainst(criterion: Criterion, own: OrderCost, other: OrderCost): string {
  for (let finer = 0; ; finer++) {
    const text = costText(criterion, own, finer);
    const against = costText(criterion, other, finer);
    if (text !== against || finer === 6) return `${text} against ${against}`;
  }
}

/** An order in one line, by the names of its parents. */
export function orderText(job: Job, arrangement: Arrangement): string {
  return arrangement.map(({ parent, share }) => {
    const name = job.parents[parent]?.name ?? '';
    return share < 1 ? `${name} (${showPercent(share, 0)} of it)` : name;
  }).join(', then ');
}

const namesOfOrders: Readonly<Record<OrderName, string>> = {
  'smallest first': 'The smallest amount first, the balance gas last',
  'as listed': 'The order of the list',
  'balance first': 'The balance gas first',
  'fuel, then oxidiser': 'Fuel, then oxidiser, then the rest',
  'oxidiser, then fuel': 'Oxidiser, then fuel, then the rest',
  'next best': 'Another order',
};

/** Why an order was not chosen. */
export function rejectedSentence(
  job: Job, { name, criterion, first, cost, arrangement, steps }: Omit<RejectedOrder, 'sentence'>, best: OrderCost,
): string {
  const order = namesOfOrders[name];
  if (first === null) return `${order}: ${criterionText[criterion]} ${costAgainst(criterion, cost, best)}.`;
  const { step, fault } = first;
  const { parent, pressure } = steps[step - 1]!;
  const words = faultText(job, fault, job.parents[parent]!.name, pressure);
  return `${order}: at step ${String(step)} of ${String(arrangement.length)} ${words}.`;
}

/** What is wrong at a step, to follow "at step 2"; `pressure` absolute, after it. */
export function faultText(job: Job, fault: RouteFault, parent: string, pressure: Pascal): string {
  const stop = shownPressure(job, pressure);
  switch (fault.code) {
    case 'together':
      return `${fault.finished ? 'at worst within the tolerances (assumed where none is ordered) ' : ''}fuel at ${showPercent(fault.fuelOfLfl)} of its lower flammable limit stands with ${showFraction(fault.oxygen)} oxygen at ${stop}${weight(fault)}`;
    case 'boundary':
      return `${fault.oxidiserEnters ? `oxidiser (${parent}) meets fuel` : `fuel (${parent}) meets oxidiser`}: fuel at ${showPercent(fault.fuelOfLfl)} of its lower flammable limit against ${showFraction(fault.oxygen)} oxygen${weight(fault)}`;
    case 'stop':
      return `the stop of ${stop} stands above the working pressure of ${shownPressure(job, fault.limit)}${weight(fault)}`;
    case 'condensation':
      return fault.by === 'separates' ? `the gas separates at ${stop}${weight(fault)}`
        : fault.by === 'not-computed' ? `condensation at ${stop} could not be judged${weight(fault)}`
          : `a gas stands near or above its vapour pressure at ${stop}${weight(fault)}`;
    case 'supply':
      return fault.pressure === null ? `the supply pressure of ${parent} is not stated${weight(fault)}`
        : fault.by === 'not-stated' ? `how much ${parent} still holds is not stated${weight(fault)}`
          : `${parent} stands at ${shownPressure(job, fault.pressure)} for a stop of ${stop}${weight(fault)}`;
    case 'unmeasured':
      return `the gauge knows the rise to ${showPercent(fault.relative)} only, with a tolerance of ${showPercent(fault.limit)}: a hold`;
    case 'not-gas':
      return fault.phase === 'unstable' ? `the state at ${stop} is not one gas` : `the state at ${stop} could not be shown to be one gas`;
    case 'falls':
      return `${parent} falls to ${shownPressure(job, fault.left)} as it is drawn, ${fault.grade === 2 ? 'below' : 'close to'} the stop of ${stop}${weight(fault)}`;
  }
}

function weight({ verdict }: RouteFault): string {
  return verdict === 'none' ? '' : `: a ${verdict}`;
}

/** What decided for the chosen order. */
export function whySentence(job: Job, { code, criterion, runnerUp }: WhyChosen, chosen: OrderCost): string {
  if (code === 'only order' || runnerUp === null) return 'There is only one order.';
  const next = orderText(job, runnerUp.arrangement);
  if (criterion === null) return `The order ${next} costs the same.`;
  return `Chosen over ${next} by ${criterionText[criterion]}: ${costAgainst(criterion, chosen, runnerUp.cost)}.`;
}

/** Why there is no order to propose. */
export function orderProblemSentence(job: Job, problem: OrderProblem): string {
  switch (problem.code) {
    case 'too-many-parents':
      return `${String(problem.parents)} parents are used; the order is searched for up to ${String(problem.most)}. List them in the order wanted.`;
    case 'nothing-to-add':
      return 'Nothing has to be added.';
    case 'no-state':
      return `${noState[problem.where]} has no answer: ${thermoSentence(problem.reason)}`;
    case 'arrangement-invalid':
      return `The order does not bring ${job.parents[problem.parent]?.name ?? 'every parent'} exactly once as a whole.`;
  }
}

const noState: Readonly<Record<Extract<OrderProblem, { code: 'no-state' }>['where'], string>> = {
  residual: 'What was left in the cylinder',
  'finished gas': 'The finished gas',
  'every order': 'A state of every order',
  'this order': 'A state of this order',
};

function shownPressure({ conditions: { barometer } }: Job, pressure: Pascal): string {
  return formatPressureInFull(pressure, { unit: 'bar', reference: 'absolute', barometer, resolution: pressure < 10e5 ? 1e3 : 1e4 });
}

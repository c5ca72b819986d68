import { fail, kelvin, ok, pascal } from '../../../units/index.ts';
import type { Outcome } from '../../../units/index.ts';
import type { ThermoModel } from '../../../thermo/index.ts';
import { amountToReach, settle } from '../../steps/cylinder.ts';
import type { Vessel } from '../../steps/cylinder.ts';
import type { Plan } from '../../plan/plan.ts';
import type { ProofCase, ProofGroup, ProofTolerance } from '../case.ts';
import { planOfExample } from '../fill-recipe.ts';
import type { FillExample } from '../fill-recipe.ts';
import { asPublished, figure, modelOf, once, printed } from '../making.ts';

const carbonDioxide = ['CO2', '5 %'] as const;
const nitrogen = ['N2', 'balance'] as const;

const stop = (step: number) => (plan: Plan) => (plan.steps[step]?.state.pressure ?? NaN) / 1e5;
const idealStop = (step: number) => (plan: Plan) => (plan.steps[step]?.idealStop ?? NaN) / 1e5;

/** [what is asked, published, unit, decimals printed, how it is read off the plan]. */
type Line = readonly [asked: string, published: number, unit: string, decimals: number, value: (plan: Plan) => number];
const BAR = 'bar absolute';

const m1: FillExample = { order: [carbonDioxide, nitrogen], to: '150 bar' };

const examples: readonly (readonly [id: string, title: string, example: FillExample, lines: readonly Line[]])[] = [
  ['M1', '5 % CO₂ in N₂ to 150 bar absolute', m1, [
    ['Z when filled', 1.00069, '', 5, (plan) => plan.finished.compressibilityFactor],
    ['amount in 10 L', 61.4986, 'mol', 4, (plan) => plan.finished.total],
    ['first stop', 7.2033, BAR, 4, stop(0)],
    ['first stop, ideal gas', 7.5, BAR, 4, idealStop(0)],
    ['mass of CO₂', 135.326, 'g', 3, (plan) => (plan.steps[0]?.mass ?? NaN) * 1e3],
    // The example has 28.0134 g/mol for nitrogen; the atomic weights of 2021 make it 28.01371.
    ['mass of N₂, with the example’s 28.0134 g/mol', 1636.65, 'g', 2, (plan) => (plan.steps[1]?.amount ?? NaN) * 28.0134],
  ]],
  ['M1 reversed', 'as M1, N₂ first', { order: [nitrogen, carbonDioxide], to: '150 bar' }, [
    ['first stop', 144.957, BAR, 3, stop(0)], ['first stop, ideal gas', 142.5, BAR, 3, idealStop(0)],
  ]],
  ['M3', 'as M1 onto 1.000 bar of N₂', {
    ...m1, left: { pressure: { typed: '1.000 bar', reference: 'absolute' }, temperature: '20 °C', composition: [{ gas: 'N2', amount: '100 %' }] },
  }, [['first stop', 8.1723, BAR, 4, stop(0)]]],
  ['M4 warm', 'as M1, read at 24 and 27 °C', { ...m1, at: { CO2: '24 °C', N2: '27 °C' } }, [
    ['first stop', 7.3107, BAR, 4, stop(0)], ['last stop', 154.928, BAR, 3, stop(1)],
  ]],
  ['M4 cold', 'as M1, last stop read at 15 °C', { ...m1, at: { N2: '15 °C' } }, [['last stop', 146.475, BAR, 3, stop(1)]]],
  ...([
    ['CO2', '10 %', 'N2', 14.115, 140], ['CH4', '2.5 %', 'N2', 3.662, 146.47], ['O2', '20.9 %', 'N2', 30.628, 119.14],
    ['He', '10 %', 'N2', 14.525, 131.31], ['H2', '4 %', 'N2', 5.867, 142.7], ['CO', '1 %', 'N2', 1.469, 148.39],
    ['CH4', '10 %', 'Ar', 15.637, 136.41], ['CO2', '20 %', 'Ar', 28.829, 131.38], ['C3H8', '1 %', 'N2', 1.442, 149.21],
  ] as const).flatMap(([gas, amount, balance, minorFirst, balanceFirst]) => {
    const minor = [gas, amount] as const;
    const rest = [balance, 'balance'] as const;
    const title = `${amount} ${gas} in ${balance} to 150 bar absolute`;
    return [
      [`M6 ${gas} in ${balance}`, title, { order: [minor, rest], to: '150 bar' }, [['first stop', minorFirst, BAR, 3, stop(0)]]],
      [`M6 ${gas} in ${balance} reversed`, `${title}, balance first`, { order: [rest, minor], to: '150 bar' }, [['first stop', balanceFirst, BAR, 2, stop(0)]]],
    ] as const;
  }),
  ['M7', '2.5 % CH₄, 18 % O₂, 79.5 % N₂ to 100 bar absolute, in the order CH₄, N₂, O₂', {
    order: [['CH4', '2.5 %'], ['N2', '79.5 %'], ['O2', '18 %']], to: '100 bar',
  }, [['first stop', 2.5179, BAR, 4, stop(0)], ['second stop', 82.498, BAR, 3, stop(1)]]],
];

/** Stops and amounts of the worked examples, by the pipeline that plans every recipe. */
export function workedPlans(): ProofGroup {
  const cases = examples.flatMap(([id, title, example, lines]) => {
    const plan = once(() => planOfExample(example));
    return lines.map(([asked, published, unit, decimals, value]) => (
      caseOf(`${id}:${asked}`, `${id}: ${title}: ${asked}`, published, unit, printed(decimals), () => figure(plan(), value))));
  });
  return {
    id: 'worked-plans', title: 'Worked plans',
    why: 'Half a unit of the last printed digit. The examples were constructed for the purpose and computed with the NIST code of GERG-2008; no filled cylinder was analysed.',
    cases: [...cases, ...deviations()],
  };
}

/** M2 and M5: what an unplanned reading or a growing cylinder makes of M1. */
function deviations(): readonly ProofCase[] {
  const plan = once(() => planOfExample(m1));
  const made = once(() => modelOf({ 'carbon dioxide': 0.05, nitrogen: 0.95 }, asPublished));
  const inCylinder = (work: (model: ThermoModel, vessel: Vessel, plan: Plan) => Outcome<number, { readonly code: string }>) => () => {
    const answer = plan();
    const model = made();
    if (!answer.ok) return fail(answer.reason);
    if (!model.ok) return model;
    return work(model.value.model, { cylinder: answer.value.job.cylinder, barometer: answer.value.job.conditions.barometer }, answer.value);
  };
  const temperature = kelvin(293.15);
  const nitrogenOnly = Float64Array.of(0, 1);
  const overfilled = (model: ThermoModel, vessel: Vessel) =>
    amountToReach(model, vessel, new Float64Array(2), Float64Array.of(1, 0), pascal(7.4e5), temperature);
  return [
    caseOf('M2:a', 'M2: as M1, the CO₂ reading came at 7.400 bar absolute, last stop kept: CO₂', 5.1394, '%', printed(4), inCylinder((model, vessel) => {
      const first = overfilled(model, vessel);
      if (!first.ok) return first;
      const rest = amountToReach(model, vessel, Float64Array.of(first.value, 0), nitrogenOnly, pascal(150e5), temperature);
      return figure(rest, (amount) => (100 * first.value) / (first.value + amount));
    })),
    caseOf('M2:b', 'M2: the same, for exactly 5 %: last stop', 154.585, BAR, printed(3), inCylinder((model, vessel) => {
      const first = overfilled(model, vessel);
      return first.ok ? figure(settle(model, vessel, Float64Array.of(first.value, 19 * first.value), temperature), (state) => state.pressure / 1e5) : first;
    })),
    caseOf('M5', 'M5: as M1 in a cylinder that grows 0.32 % unnoticed: CO₂', 4.984, '%', printed(3), inCylinder((model, vessel, { steps }) => {
      const growing = { ...vessel, cylinder: { ...vessel.cylinder, pressureExpansion: 0.0032 / (150e5 - vessel.barometer) } };
      const first = steps[0]?.amount;
      if (first === undefined) return fail({ code: 'figure-missing' });
      const rest = amountToReach(model, growing, Float64Array.of(first, 0), nitrogenOnly, pascal(150e5), temperature);
      return rest.ok ? ok((100 * first) / (first + rest.value)) : rest;
    })),
  ];
}

function caseOf(id: string, title: string, published: number, unit: string, tolerance: ProofTolerance, compute: ProofCase['compute']): ProofCase {
  return {
    id: `worked-plans:${id}`, group: 'worked-plans', title, source: 'worked examples M1 to M7, computed with the NIST code of GERG-2008', trust: 'constructed',
    published, unit, tolerance, remark: '', compute,
  };
}

import { ok, pascal, toPascal } from '../../../../src/units/index.ts';
import type { GasId } from '../../../../src/thermo/index.ts';
import { fillingDensities, fillingRatios } from '../../../../src/blending/hazards/data/filling-limits.ts';
import { toxicGases } from '../../../../src/blending/hazards/data/toxic-gases.ts';
import { bar, celsius, gaugeFixture, planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';
import type { ColdestPhase, PlanPhase } from '../../../../src/blending/phase/plan-phase.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const pure = (...gases: (keyof Mix)[]): Record<string, { mix: Mix }> => Object.fromEntries(gases.map((gas) => [gas, { mix: { [gas]: 1 } }]));

/** One gas, or one premix, in the whole cylinder. */
const filledWith = (mix: Mix, total: number, more: Partial<Parameters<typeof planFixture>[0]> = {}): UncheckedPlan =>
  planFixture({ parents: { gas: { mix } }, additions: [['gas', total]], ...more });

function withPhase(plan: UncheckedPlan, phase: Partial<PlanPhase>, coldest: Partial<ColdestPhase> | null = null): UncheckedPlan {
  const tested: ColdestPhase = { temperature: celsius(0), largestFill: ok(null), searchedTo: bar(300), slightlyColder: { phase: 'gas' }, ...coldest };
  return { ...plan, phase: { ...plan.phase, ...phase, coldest: coldest === null ? null : tested } };
}

const inSteel = { cylinder: { material: 'steel' } } as const;
const butaneTo = (total: number): UncheckedPlan => planFixture({ parents: pure('n-butane', 'nitrogen'), additions: [['n-butane', 0.01 * total], ['nitrogen', 0.99 * total]] });

/** A cylinder that holds one liquefied gas up to a filling ratio, with the marks of a row of the filling limits. */
function liquefied(gas: GasId, { service, test }: { readonly service?: number; readonly test?: number }): UncheckedPlan {
  const plan = filledWith({ [gas]: 1 }, 5, {
    cylinder: {
      workingPressure: service === undefined ? null : pascal(toPascal(service, 'psi') + 1e5), testPressure: test === undefined ? null : bar(test + 1),
    },
  });
  return { ...plan, final: { ...plan.final, fillingRatio: 0.6 } };
}

const mixtures: readonly UncheckedPlan[] = [
  planFixture({ parents: pure('methane', 'oxygen', 'nitrogen'), additions: [['methane', 2], ['nitrogen', 40], ['oxygen', 10], ['nitrogen', 100]] }),
  planFixture({ parents: pure('methane', 'oxygen', 'nitrogen'), additions: [['nitrogen', 1], ['methane', 0.1], ['oxygen', 0.4], ['nitrogen', 100]] }),
  planFixture({ parents: pure('methane', 'propane', 'n-octane', 'oxygen', 'nitrogen'), additions: [['methane', 1], ['propane', 0.002], ['n-octane', 0.001], ['nitrogen', 80], ['oxygen', 4]] }),
  planFixture({ parents: pure('n-octane', 'oxygen', 'nitrogen'), additions: [['n-octane', 0.2], ['nitrogen', 80], ['oxygen', 4]] }),
  planFixture({ parents: { ...pure('methane', 'nitrogen'), mixed: { mix: { methane: 0.02, oxygen: 0.06, nitrogen: 0.92 }, pressure: null } }, additions: [['mixed', 20], ['nitrogen', 80]] }),
  planFixture({ parents: pure('methane'), additions: [['methane', 50]], start: { mix: { nitrogen: 0.79, oxygen: 0.21 }, bar: 0.01 } }),
  planFixture({ parents: pure('methane', 'water', 'nitrogen'), additions: [['water', 0.01], ['methane', 8], ['nitrogen', 92]], ...inSteel }),
  planFixture({ parents: pure('methane', 'carbon monoxide', 'nitrogen'), additions: [['methane', 0.01], ['carbon monoxide', 0.02], ['nitrogen', 100]], tolerance: { methane: 0.02 }, ...inSteel }),
  planFixture({ parents: pure('oxygen', 'argon', 'water'), additions: [['water', 0.02], ['argon', 80], ['oxygen', 16]] }),
  planFixture({ parents: pure('oxygen', 'nitrogen'), additions: [['nitrogen', 70], ['oxygen', 30]], conditions: { roomVolume: 3 as never } }),
  planFixture({ parents: pure('nitrogen', 'methane'), additions: [['methane', 60], ['nitrogen', 60]], conditions: { roomVolume: 8 as never } }),
  planFixture({ parents: { ...pure('nitrogen'), oxygen: { mix: { oxygen: 1 }, pressure: 8 } }, additions: [['oxygen', 5], ['nitrogen', 100]] }),
  filledWith({ 'carbon monoxide': 1 }, 100, inSteel),
  filledWith({ 'carbon monoxide': 0.6, nitrogen: 0.4 }, 100),
  filledWith({ nitrogen: 1 }, 195),
  filledWith({ 'hydrogen sulfide': 0.1, nitrogen: 0.9 }, 170, { ...inSteel, conditions: { roomVolume: 50 as never } }),
  filledWith({ 'nitrogen dioxide': 0.02, nitrogen: 0.98 }, 100),
  filledWith({ phosphine: 0.15, nitrogen: 0.85 }, 100, { cylinder: { waterCapacity: 0.05 as never } }),
  filledWith({ hydrogen: 1 }, 45, inSteel),
  filledWith({ methanol: 1e-5, nitrogen: 1 - 1e-5 }, 100),
  withPhase(butaneTo(150), { steps: [{ phase: 'gas' }, { phase: 'gas' }], guessedPairs: [['nitrogen', 'n-butane']] }, {}),
  withPhase(butaneTo(60), { steps: [{ phase: 'gas' }, { phase: 'gas' }] }, { slightlyColder: { phase: 'unstable', forming: null } }),
  planFixture({ parents: pure('n-butane', 'nitrogen'), additions: [['nitrogen', 59.4], ['n-butane', 2]], stepState: (state) => ({ ...state, compressibilityFactor: 0.3 }) }),
  planFixture({
    parents: pure('methane', 'nitrogen', 'helium'), additions: [['methane', 2], ['helium', 0.1], ['nitrogen', 100]], gauges: [gaugeFixture()], unordered: ['helium'],
    tolerance: { methane: 0.3 },
    plan: { cubicGases: ['helium'], estimatedPairs: [['methane', 'nitrogen'], ['helium', 'nitrogen']], modelUncertainty: 1e-3 },
  }),
  planFixture({ parents: { methane: { mix: { methane: 1 }, pressure: 4 }, nitrogen: { mix: { nitrogen: 1 }, pressure: 106 } }, additions: [['methane', 2], ['nitrogen', 100]] }),
  filledWith({ acetylene: 0.02, nitrogen: 0.98 }, 60),
  filledWith({ 'nitric oxide': 1 }, 40),
  filledWith({ 'nitric oxide': 0.4, nitrogen: 0.6 }, 60),
  planFixture({ parents: { ...pure('oxygen', 'nitrogen'), nitric: { mix: { 'nitric oxide': 1e-3, nitrogen: 0.999 } }, dirty: { mix: { nitrogen: 1 - 3e-6, oxygen: 3e-6 } } }, additions: [['nitric', 10], ['dirty', 90]], unordered: ['oxygen'] }),
  planFixture({ parents: pure('ammonia', 'nitrogen'), additions: [['ammonia', 0.001], ['nitrogen', 90]], start: { mix: { 'hydrogen chloride': 0.01, nitrogen: 0.99 }, bar: 0.5 }, unordered: ['hydrogen chloride'] }),
  filledWith({ deuterium: 1 }, 60, inSteel),
  filledWith({ 'hydrogen chloride': 1e-4, nitrogen: 1 - 1e-4 }, 60, { conditions: { roomVolume: 20 as never } }),
];

/** Plans that between them make every value of every rule and of the suggested class matter. */
export const scenarios: readonly UncheckedPlan[] = [
  ...mixtures,
  filledWith({ silane: 0.02, nitrogen: 0.98 }, 20),
  filledWith({ oxygen: 0.21, nitrogen: 0.79 }, 100),
  filledWith({ nitrogen: 1 }, 2.9),
  ...[0.015, 0.3].map((vacuum) => filledWith({ nitrogen: 1 }, 100, {
    cylinder: { contents: { state: 'evacuated', pressure: bar(vacuum), temperature: celsius(20), fractions: Float64Array.of(1) } },
  })),
  ...toxicGases.map((gas) => filledWith({ [gas]: 0.01, nitrogen: 0.99 }, 100, { conditions: { roomVolume: 20 as never } })),
  ...fillingDensities.map(({ gas, from }) => liquefied(gas as GasId, { service: from })),
  ...fillingRatios.map(({ gas, from }) => liquefied(gas as GasId, { test: from })),
];

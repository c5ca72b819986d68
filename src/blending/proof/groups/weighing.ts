import { cubicMetre, kelvin, kilogram, kilogramPerCubicMetre, ok } from '../../../units/index.ts';
import { vapourPressureRule } from '../../../thermo/index.ts';
import type { GasId } from '../../../thermo/index.ts';
import { compositionFromMasses } from '../../steps/mass-composition.ts';
import { weighedMass } from '../../steps/weighing.ts';
import type { ProofCase, ProofGroup, ProofTolerance } from '../case.ts';
import { planOfExample } from '../fill-recipe.ts';
import { absolute, figure, formulaOf, once, printed, relative } from '../making.ts';

/** G3: gas, content, mass of 60 mol in g, mass fraction in %. */
const naturalGas = [
  ['nitrogen', '1.4 %', 23.5313, 2.0209], ['carbon dioxide', '1.8 %', 47.5303, 4.082], ['ethane', '9.4 %', 169.5892, 14.5646],
  ['propane', '3.4 %', 89.955, 7.7255], ['n-butane', '1 %', 34.8733, 2.995], ['methane', '83 %', 798.9165, 68.6121],
] as const;

/** Masses, mass fractions, weighing and the vapour-pressure rule. */
export function weighing(): ProofGroup {
  return {
    id: 'weighing', title: 'Masses, buoyancy, mass fractions, vapour-pressure rule',
    why: 'Half a unit of the last printed digit. Masses of G3: 2e-5 relative, because the example has older atomic weights than the program weighs with. K1: 0.1 bar, its vapour pressures were rounded to three digits.',
    cases: [...dilution(), ...natural(), ...buoyancy(), massFraction(), ...condensation()],
  };
}

function dilution(): readonly ProofCase[] {
  const molarMasses = [28.0101, 28.0134, 31.9988];
  const monoxide = [1 - 50e-6, 50e-6, 0];
  const nitrogen = [0.5e-6, 1 - 1.5e-6, 1e-6];
  const premix = () => compositionFromMasses([monoxide, nitrogen], [17.256, 1691.4], molarMasses);
  return [
    caseOf('G1', 'G1: 17.256 g CO and 1691.40 g N₂ with their impurities: CO', 0.0101003348, 'mol/mol', printed(10), () => figure(premix(), (x) => x[0])),
    caseOf('G2', 'G2: 17.312 g of G1 and 1694.20 g of the same N₂: CO', 102.66028, 'µmol/mol', printed(6), () => {
      const first = premix();
      return first.ok ? figure(compositionFromMasses([first.value, nitrogen], [17.312, 1694.2], molarMasses), (x) => x[0]! * 1e6) : first;
    }),
  ];
}

function natural(): readonly ProofCase[] {
  // Filled to 60 bar at 40 °C, where nothing condenses; masses are scaled to the 60 mol of the example.
  const plan = once(() => planOfExample({ order: naturalGas.map(([gas, amount]) => [gas, amount] as const), to: '60 bar', temperature: '40 °C' }));
  return [
    caseOf('G3:mean', 'G3: synthetic natural gas of ISO 6142: mean molar mass', 19.406592, 'g/mol', relative(2e-5), () => figure(plan(), ({ final }) => final.meanMolarMass * 1e3)),
    ...naturalGas.flatMap(([gas, , mass, percent], index) => [
      caseOf(`G3:${gas}:mass`, `G3: ${formulaOf(gas)} in 60 mol`, mass, 'g', relative(2e-5), () => figure(plan(), ({ steps, finished }) => {
        const step = steps[index];
        return step === undefined ? null : (step.mass * 1e3 * 60) / finished.total;
      })),
      caseOf(`G3:${gas}:fraction`, `G3: mass fraction of ${formulaOf(gas)}`, percent, '%', relative(2e-5), () => (
        figure(plan(), ({ final }) => 100 * (final.components[index]?.massFraction ?? NaN)))),
    ]),
  ];
}

function buoyancy(): readonly ProofCase[] {
  const before = () => weighedMass(kilogram(15), cubicMetre(0.012), kilogramPerCubicMetre(1.1993)) * 1e3;
  const after = () => weighedMass(kilogram(16.69), cubicMetre(0.012022), kilogramPerCubicMetre(1.1788)) * 1e3;
  return [
    caseOf('G4:before', 'G4: cylinder before, 15000.00 g read in air of 1.1993 kg/m³', 15012.1429, 'g', printed(4), () => ok(before())),
    caseOf('G4:after', 'G4: cylinder after, 16690.00 g read in air of 1.1788 kg/m³', 16701.7123, 'g', printed(4), () => ok(after())),
    caseOf('G4:added', 'G4: mass added', 1689.5693, 'g', printed(4), () => ok(after() - before())),
  ];
}

function massFraction(): ProofCase {
  return caseOf('C2', 'C2: 5 % CO₂ in N₂: mass fraction of CO₂', 0.07637, 'kg/kg', absolute(1e-6), () => (
    figure(planOfExample({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar' }), ({ final }) => final.components[0]?.massFraction)));
}

function condensation(): readonly ProofCase[] {
  const gases = naturalGas.map(([gas]) => gas);
  const x = naturalGas.map(([, amount]) => parseFloat(amount) / 100);
  const limit = (of: readonly GasId[], fractions: readonly number[], celsius: number) =>
    figure(vapourPressureRule(of, fractions, kelvin(273.15 + celsius)), (rule) => rule.limit / 1e5);
  return [
    ...([[-10, 33.4], [0, 46.9], [20, 85.6]] as const).map(([celsius, published]) => (
      caseOf(`K1:${celsius}`, `K1: gas of G3 at ${String(celsius).replace('-', '−')} °C: 1/Σ(x/p_sat)`, published, 'bar absolute', absolute(0.1), () => limit(gases, x, celsius)))),
    caseOf('K2', 'K2: 1 % n-butane in N₂ at 0 °C: 1/Σ(x/p_sat)', 103, 'bar absolute', printed(0), () => limit(['n-butane', 'nitrogen'], [0.01, 0.99], 0)),
  ];
}

function caseOf(id: string, title: string, published: number, unit: string, tolerance: ProofTolerance, compute: ProofCase['compute']): ProofCase {
  return {
    id: `weighing:${id}`, group: 'weighing', title, source: 'worked examples G1 to G4, C2, K1, K2; the composition of G3 is published in ISO 6142', trust: 'constructed',
    published, unit, tolerance, remark: '', compute,
  };
}

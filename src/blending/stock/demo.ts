import { purityTable, unstatedPressure } from '../recipe/defaults.ts';
import {
  benchGauges, carbonDioxide48, methane45, nitrogen50, oxygen50,
} from '../recipe/demo/laboratory.ts';
import type { CompositionLine, Parent, PurityLine } from '../recipe/document.ts';
import type { Stock, StockCylinder, StockParent } from './document.ts';

/**
 * What the invented Quay Street Laboratory has on its rack. Lots, dates, places
 * and figures are made up.
 */

type Said = Partial<Omit<StockParent, 'key' | 'name' | 'composition' | 'pressure'>>;

const gas = (name: string, amount: string): CompositionLine => ({ gas: name, amount });
const certified = (name: string, amount: string, uncertainty: string): PurityLine => ({ gas: name, amount, uncertainty, basis: 'certified' });
const typical = (name: string, amount: string): PurityLine => ({ gas: name, amount, uncertainty: '', basis: 'typical' });
const gauge = (typed: string) => ({ typed, reference: 'gauge' }) as const;

function parent(key: string, name: string, pressure: string, composition: readonly PurityLine[], said: Said): StockParent {
  return {
    key, name, composition, pressure: gauge(pressure), temperature: '', waterCapacity: '50 L', filling: 'gas', contentMass: '', lot: '',
    expiry: '', location: '', ...said,
  };
}

/** A parent of the demo recipes as it stands on the rack. */
function onTheRack({ key, name, composition, pressure }: Parent, said: Said): StockParent {
  return parent(key, name, pressure.typed, composition, said);
}

const parents: readonly StockParent[] = [
  onTheRack(nitrogen50, { lot: 'QS-N-2231', expiry: '2030-06-30', location: 'Rack 1' }),
  parent('n2-60', 'N₂ 6.0', '142 bar', purityTable([
    gas('N₂', 'balance'), gas('O₂', '< 0.5 µmol/mol'), gas('H₂O', '< 0.5 µmol/mol'), gas('CO', '< 0.1 µmol/mol'), gas('CO₂', '< 0.1 µmol/mol'),
  ]), { lot: 'QS-N-2305', expiry: '2029-11-30', location: 'Rack 1' }),
  onTheRack(carbonDioxide48, { filling: 'liquefied', contentMass: '22 kg', lot: 'QS-C-0874', expiry: '2031-01-31', location: 'Rack 1' }),
  onTheRack(oxygen50, { lot: 'QS-O-1190', expiry: '2030-03-31', location: 'Rack 2, oxygen' }),
  parent('ar', 'Ar 5.0', '165 bar', purityTable([gas('Ar', 'balance'), gas('N₂', '< 5 µmol/mol'), gas('O₂', '< 2 µmol/mol'), gas('H₂O', '< 3 µmol/mol')]),
    { lot: 'QS-A-0412', expiry: '2030-09-30', location: 'Rack 1' }),
  parent('he', 'He 5.0', '150 bar', purityTable([gas('He', 'balance'), gas('N₂', '< 3 µmol/mol'), gas('O₂', '< 1 µmol/mol'), gas('Ne', '< 2 µmol/mol')]),
    { lot: 'QS-H-0077', expiry: '2031-05-31', location: 'Rack 1' }),
  onTheRack(methane45, { lot: 'QS-M-0319', expiry: '2029-08-31', location: 'Rack 3, flammable' }),
  parent('h2', 'H₂ 5.0', '180 bar', purityTable([gas('H₂', 'balance'), gas('N₂', '< 3 µmol/mol'), gas('O₂', '< 2 µmol/mol'), gas('H₂O', '< 3 µmol/mol')]),
    { lot: 'QS-W-0208', expiry: '2030-02-28', location: 'Rack 3, flammable' }),
  parent('co', 'CO 0.5 % in N₂', '120 bar', [
    certified('CO', '0.5 %', '1 %'), typical('O₂', '< 3 µmol/mol'), certified('N₂', 'balance', ''),
  ], { waterCapacity: '10 L', lot: 'QS-P-0561', expiry: '2027-01-15', location: 'Cabinet A' }),
  parent('co-pure', 'CO 3.7', '95 bar', purityTable([gas('CO', 'balance'), gas('N₂', '< 150 µmol/mol'), gas('O₂', '< 20 µmol/mol'), gas('Ar', '< 30 µmol/mol')]),
    { waterCapacity: '10 L', lot: 'QS-K-0033', expiry: '2029-04-30', location: 'Cabinet A' }),
  parent('no', 'NO 1 % in N₂', '110 bar', [
    certified('NO', '1 %', '1.5 %'), certified('NO₂', '40 µmol/mol', '10 µmol/mol'), certified('N₂', 'balance', ''),
  ], { waterCapacity: '10 L', lot: 'QS-P-0588', expiry: '2026-12-31', location: 'Cabinet A' }),
  parent('c3h8', 'C₃H₈ 3.5', '7 bar', purityTable([gas('C₃H₈', 'balance'), gas('C₂H₆', '< 100 µmol/mol'), gas('i-C₄H₁₀', '< 200 µmol/mol')]),
    { waterCapacity: '27 L', filling: 'liquefied', contentMass: '8 kg', lot: 'QS-L-0141', expiry: '2031-10-31', location: 'Rack 3, flammable' }),
  parent('air', 'Synthetic air', '190 bar', [certified('O₂', '20.9 %', '1 %'), certified('N₂', 'balance', '')],
    { lot: 'QS-S-0720', expiry: '2030-12-31', location: 'Rack 2, oxygen' }),
  parent('so2', 'SO₂ 500 µmol/mol in N₂', '90 bar', [certified('SO₂', '500 µmol/mol', '2 %'), certified('N₂', 'balance', '')],
    { waterCapacity: '10 L', lot: 'QS-P-0490', expiry: '2027-02-28', location: 'Cabinet A' }),
];

function cylinder(key: string, said: Partial<Omit<StockCylinder, 'key' | 'id'>>): StockCylinder {
  return {
    key, id: key.toUpperCase(), material: 'aluminium', waterCapacity: '10 L', workingPressure: gauge('166 bar'), servicePressure: unstatedPressure,
    testPressure: gauge('250 bar'), testDue: '2031-04-30', tare: '', valveOutlet: '', held: '', conditionedFor: '', location: 'Filling place', ...said,
  };
}

const cylinders: readonly StockCylinder[] = [
  cylinder('b-0417', { tare: '11.86 kg', valveOutlet: 'DIN 477 No. 14', held: 'CO, CO₂, O₂, N₂', conditionedFor: 'carbon monoxide' }),
  cylinder('b-0422', { tare: '11.91 kg', valveOutlet: 'DIN 477 No. 6', held: 'CO₂, N₂' }),
  cylinder('b-0398', { workingPressure: gauge('150 bar'), testPressure: gauge('225 bar'), testDue: '2027-01-31', tare: '12.43 kg', valveOutlet: 'DIN 477 No. 14', held: 'CO, N₂' }),
  cylinder('s-1106', {
    material: 'steel', workingPressure: gauge('200 bar'), testPressure: gauge('300 bar'), testDue: '2033-09-30', tare: '13.70 kg',
    valveOutlet: 'DIN 477 No. 1', held: 'CH₄, C₂H₆, N₂', location: 'Rack 3, flammable',
  }),
  cylinder('ox-012', {
    waterCapacity: '29.5 L', workingPressure: unstatedPressure, servicePressure: gauge('2216 psi'), testPressure: gauge('3693 psi'), testDue: '2029-02-28',
    tare: '32.10 kg', valveOutlet: 'CGA 296', held: 'O₂, N₂', conditionedFor: 'oxygen service', location: 'Rack 2, oxygen',
  }),
];

/** Fills the shelves of a new laboratory so that there is something to try. */
export const demoStock: Stock = {
  parents,
  cylinders,
  gauges: [
    ...benchGauges.map((each) => ({ ...each, location: 'Filling place' })),
    {
      key: 'p1', name: 'P1', unit: 'psi', reference: 'gauge', fullScale: '3000 psi', accuracy: '0.1 %', accuracyOf: 'span', resolution: '1 psi',
      calibrated: '2026-09-14', location: 'Rack 2, oxygen',
    },
  ],
  thermometers: [
    { key: 't1', name: 'T1', lowest: '-20 °C', highest: '60 °C', accuracy: '0.2 K', resolution: '0.1 K', calibrated: '2026-03-02' },
    { key: 't2', name: 'T2, strapped to the cylinder', lowest: '-40 °C', highest: '120 °C', accuracy: '0.5 K', resolution: '0.1 K', calibrated: '2025-12-15' },
  ],
  balances: [
    { key: 'w1', name: 'W1', capacity: '32 kg', accuracy: '0.2 g', accuracyOf: 'span', resolution: '0.1 g', calibrated: '2026-06-22' },
    { key: 'w2', name: 'W2', capacity: '64 kg', accuracy: '0.003 %', accuracyOf: 'span', resolution: '1 g', calibrated: '2026-06-22' },
  ],
  values: [],
};

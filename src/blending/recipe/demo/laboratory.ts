import { defaultConditions, defaultCylinder, parentNamed, purityTable } from '../defaults.ts';
import type { CompositionLine, Conditions, Cylinder, Gauge, Parent } from '../document.ts';

/**
 * The invented Quay Street Laboratory: an air-quality bench of an imaginary
 * harbour. Its cylinders, parents, gauges and numbers are made up.
 */

export const benchGauges: readonly Gauge[] = [
  { key: 'g1', name: 'G1', unit: 'bar', reference: 'gauge', fullScale: '250 bar', accuracy: '0.05 %', accuracyOf: 'span', resolution: '0.01 bar', calibrated: '2026-09-14' },
  { key: 'g2', name: 'G2', unit: 'bar', reference: 'gauge', fullScale: '16 bar', accuracy: '0.1 %', accuracyOf: 'span', resolution: '0.001 bar', calibrated: '2026-09-14' },
  { key: 'g3', name: 'G3', unit: 'mbar', reference: 'absolute', fullScale: '1330 mbar', accuracy: '0.15 %', accuracyOf: 'span', resolution: '0.1 mbar', calibrated: '2026-09-14' },
];

export const benchConditions: Conditions = {
  ...defaultConditions,
  roomVolume: '60 m³',
  coldestStorage: '-10 °C',
};

/** An evacuated aluminium cylinder of the bench. */
export function benchCylinder(id: string, more: Partial<Cylinder> = {}): Cylinder {
  return {
    ...defaultCylinder,
    id,
    material: 'aluminium',
    waterCapacity: '10 L',
    workingPressure: { typed: '166 bar', reference: 'gauge' },
    testPressure: { typed: '250 bar', reference: 'gauge' },
    contents: {
      state: 'evacuated',
      pressure: { typed: '0.01 mbar', reference: 'absolute' },
      temperature: '20 °C',
      composition: [],
    },
    ...more,
  };
}

/** A parent from the laboratory's rack; pressures are gauge. */
export function rackParent(
  key: string, name: string, pressure: string, composition: readonly CompositionLine[], said: Partial<Omit<Parent, 'key' | 'name'>> = {},
): Parent {
  return parentNamed(key, name, {
    composition: purityTable(composition), pressure: { typed: pressure, reference: 'gauge' }, waterCapacity: '50 L', ...said,
  });
}

export const nitrogen50 = rackParent('n2', 'N₂ 5.0', '200 bar', [
  { gas: 'N₂', amount: 'balance' },
  { gas: 'O₂', amount: '< 3 µmol/mol' },
  { gas: 'H₂O', amount: '< 3 µmol/mol' },
  { gas: 'CO', amount: '< 0.5 µmol/mol' },
  { gas: 'CO₂', amount: '< 0.5 µmol/mol' },
]);

export const carbonDioxide48 = rackParent('co2', 'CO₂ 4.8', '50 bar', [
  { gas: 'CO₂', amount: 'balance' },
  { gas: 'N₂', amount: '< 10 µmol/mol' },
  { gas: 'H₂O', amount: '< 5 µmol/mol' },
], { filling: 'liquefied', contentMass: '22 kg' });

export const oxygen50 = rackParent('o2', 'O₂ 5.0', '180 bar', [
  { gas: 'O₂', amount: 'balance' },
  { gas: 'N₂', amount: '< 5 µmol/mol' },
  { gas: 'Ar', amount: '< 3 µmol/mol' },
]);

export const carbonMonoxidePremix = rackParent('co', 'CO 0.5 % in N₂', '120 bar', [
  { gas: 'CO', amount: '0.5 %' },
  { gas: 'N₂', amount: 'balance' },
  { gas: 'O₂', amount: '< 3 µmol/mol' },
], { waterCapacity: '10 L' });

export const methane45 = rackParent('ch4', 'CH₄ 4.5', '150 bar', [
  { gas: 'CH₄', amount: 'balance' },
  { gas: 'N₂', amount: '< 20 µmol/mol' },
  { gas: 'C₂H₆', amount: '< 15 µmol/mol' },
]);

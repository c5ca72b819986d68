import { describe, expect, it } from 'vitest';
import { gasFacts } from '../../../../src/blending/gases/facts.ts';
import { fuelOxidiserScale, limitingOxygen } from '../../../../src/blending/hazards/fuel-and-oxidiser.ts';
import { suggestClassification } from '../../../../src/blending/hazards/classification/index.ts';
import { hazardRules } from '../../../../src/blending/hazards/index.ts';
import { flammabilityRatio, oxidisingPowerRatio } from '../../../../src/blending/hazards/iso10156.ts';
import { mixtureLc50 } from '../../../../src/blending/hazards/toxicity.ts';
import { publishedOnly } from '../../../../src/blending/values/value.ts';
import type { LaboratoryValues, OwnValue } from '../../../../src/blending/values/value.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';
import { publishedValue, publishedValues } from '../../../../src/blending/hazards/published/values.ts';
import { valueSections } from '../../../../src/blending/hazards/published/listed.ts';
import { gasIds } from '../../../../src/thermo/index.ts';
import type { GasId } from '../../../../src/thermo/index.ts';
import { toolsFixture } from '../../../fixtures/unchecked-plan.ts';
import { scenarios } from './scenarios.ts';

const list = publishedValues();
const own = (id: string, value: number): LaboratoryValues => new Map([[id, { value, source: 'own copy', date: '2026-12-01' }]]);

/** What is computed with one row of a table of gases. */
const ofTable: Readonly<Record<string, (gas: GasId, values: LaboratoryValues) => unknown>> = {
  lfl: (gas, values) => fuelOxidiserScale([gas, 'nitrogen'], values),
  ufl: (gas, values) => gasFacts(gas, values).figures,
  tci: (gas, values) => flammabilityRatio([gas, 'nitrogen'], 'cautious', values),
  loc: (gas, values) => {
    const scale = fuelOxidiserScale([gas, 'nitrogen'], values);
    return scale.ok && limitingOxygen(scale.value, [[0.5, 0.5]]).fraction;
  },
  kk: (gas, values) => oxidisingPowerRatio([gas, 'oxygen'], 'cautious', values),
  ci: (gas, values) => oxidisingPowerRatio([gas, 'nitrogen'], 'cautious', values),
  lc50: (gas, values) => mixtureLc50([gas], [1], values),
};

/** `lfl` of `lfl:methane`. */
function tableOf(id: string): string {
  return id.split(':')[0] ?? id;
}

/** The rules, each as what it finds, and the suggested class. */
const judges: readonly ((plan: UncheckedPlan) => unknown)[] = [
  ...hazardRules.filter(({ id }) => id !== 'laboratory-values')
    .map(({ judge }) => (plan: UncheckedPlan) => judge({ plan, tools: toolsFixture(plan) })),
  suggestClassification,
];

/** Values that tell what was asked for. */
class Asked extends Map<string, OwnValue> {
  readonly ids = new Set<string>();
  override get(id: string): OwnValue | undefined {
    this.ids.add(id);
    return super.get(id);
  }
}

function judged(judge: (plan: UncheckedPlan) => unknown, plan: UncheckedPlan, values: LaboratoryValues): string {
  return JSON.stringify(judge({ ...plan, job: { ...plan.job, values } }));
}

/** Every scenario and judge with the ids it asks for; a value that no rule knows keeps the map from being empty. */
const asked = scenarios.flatMap((plan) => judges.map((judge) => {
  const values = new Asked([['no-such-value', { value: 1, source: '', date: '' }]]);
  return { plan, judge, published: judged(judge, plan, publishedOnly), told: judged(judge, plan, values), ids: values.ids };
}));

const factors = [2, 0.5, 1.2, 0.8, 10, 0.1, 1000, 0.001];

function changesAFinding(id: string, value: number): boolean {
  const asking = asked.filter(({ ids }) => ids.has(id));
  return factors.some((factor) => asking.some(({ plan, judge, published }) => judged(judge, plan, own(id, value * factor)) !== published));
}

describe('publishedValues', () => {
  it('names every value once, under a known section, with source and quantity', () => {
    expect(new Set(list.map(({ id }) => id)).size).toBe(list.length);
    for (const { id, section, quantity, source, unit } of list) {
      expect(valueSections, id).toContain(section);
      expect(quantity.trim() === '' || source.trim() === '', id).toBe(false);
      expect(unit, id).not.toMatch(/ppm/u);
      expect(publishedValue(id)?.id).toBe(id);
    }
  });

  it('gives pressures with gauge or absolute, and gases that the program knows', () => {
    for (const { id, unit, gas } of list) {
      if (/\b(?:psi|k?Pa|m?bar)\b/u.test(unit) && id !== 'supply-margin') expect(unit, id).toMatch(/gauge|absolute/u);
      if (gas !== null) expect(gasIds, id).toContain(gas);
    }
  });

  it('keeps the values of one quantity together', () => {
    const quantities = list.map(({ section, quantity }) => `${section}: ${quantity}`).filter((each, i, all) => each !== all[i - 1]);
    expect(new Set(quantities).size).toBe(quantities.length);
  });

  it('judges without own values exactly as with values that nobody asks for', () => {
    for (const { published, told } of asked) expect(told).toBe(published);
  });

  it('knows every id that a rule asks for, and no rule asks in vain', () => {
    const ids = new Set(asked.flatMap((each) => [...each.ids]));
    // A row of a table is asked for by its gas, which need not be in that table.
    expect([...ids].filter((id) => publishedValue(id) === undefined && ofTable[tableOf(id)] === undefined)).toEqual([]);
  });

  it('holds no dead value: replacing any one changes what is computed or found', () => {
    const dead = list.filter(({ id, gas, value }) => {
      const table = ofTable[tableOf(id)];
      if (gas === null || table === undefined) return !changesAFinding(id, value ?? 1);
      const before = JSON.stringify(table(gas as GasId, publishedOnly));
      return JSON.stringify(table(gas as GasId, own(id, 2 * (value ?? 1)))) === before;
    });
    expect(dead.map(({ id }) => id)).toEqual([]);
  });
});

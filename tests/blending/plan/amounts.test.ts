import { describe, expect, it } from 'vitest';
import { finishedAmounts, solveAmounts } from '../../../src/blending/plan/amounts.ts';
import { cylinderVolume, settle, totalAmount } from '../../../src/blending/steps/cylinder.ts';
import type { Vessel } from '../../../src/blending/steps/cylinder.ts';
import { realModel } from '../../../src/thermo/index.ts';
import { fraction, pascal } from '../../../src/units/index.ts';
import { jobOf, pure, residual, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

function solve(fill: Fill) {
  const job = jobOf(fill);
  const model = valueOf(realModel(job.gases));
  const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
  return { job, model, vessel, answer: solveAmounts(job, model, vessel) };
}

const blend: Fill = { order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar' };

describe('solveAmounts', () => {
  it('fills to the ordered pressure, by an independent bisection on the total amount', () => {
    const { model, vessel, answer } = solve({ ...blend, cylinder: { material: 'aluminium' } });
    let low = 1;
    let high = 200;
    for (let k = 0; k < 60; k++) {
      const middle = (low + high) / 2;
      const state = valueOf(settle(model, vessel, Float64Array.of(0.05 * middle, 0.95 * middle), vessel.cylinder.contents.temperature));
      if (state.pressure > 150e5) high = middle;
      else low = middle;
    }
    expect(valueOf(answer).total / low).toBeCloseTo(1, 12);
  });

  it('counts what the parents bring besides, and what was there before', () => {
    const { job, answer } = solve({
      order: [['CO', '50 µmol/mol'], ['CO2', '5 %'], ['N2', 'balance']], to: '100 bar',
      parents: [
        { key: 'a', lines: [['CO', '0.5 %'], ['N2', 'balance'], ['O2', '< 30 µmol/mol']] },
        { key: 'b', lines: [['CO2', 'balance'], ['CO', '< 20 µmol/mol']] },
        { key: 'c', lines: [['N2', 'balance'], ['CO', '< 1 µmol/mol'], ['Ar', '40 µmol/mol']] },
      ],
      contents: residual('2 bar', [['N2', '99 %'], ['CO2', '1 %']]),
    });
    const { additions, finished, residual: left, total } = valueOf(answer);
    const at = (gas: string): number => job.gases.findIndex((id) => id === gas);
    expect(finished[at('carbon monoxide')]! / total / 50e-6).toBeCloseTo(1, 12);
    expect(finished[at('carbon dioxide')]! / total / 0.05).toBeCloseTo(1, 12);
    // Half of each limit: 15 µmol/mol of oxygen in the first parent.
    expect(finished[at('oxygen')]! / (15e-6 * additions[0]!)).toBeCloseTo(1, 12);
    expect(finished[at('argon')]! / (40e-6 * additions[2]!)).toBeCloseTo(1, 12);
    expect(finishedAmounts(job, additions, left)).toEqual(finished);
    expect(totalAmount(finished)).toBeCloseTo(total, 12);
  });

  it('uses nothing of a parent that is not needed', () => {
    const { answer } = solve({ ...blend, parents: [pure('He'), pure('CO2'), pure('N2'), pure('O2')] });
    const { additions } = valueOf(answer);
    expect(additions[0]).toBe(0);
    expect(additions[3]).toBe(0);
    expect(additions[1]! / additions[2]!).toBeCloseTo(5 / 95, 12);
  });

  it('a parent of another gas never stands in for the balance, wherever it is listed', () => {
    for (const parents of [[pure('Ar'), pure('CO2'), pure('N2')], [pure('N2'), pure('CO2'), pure('Ar')]]) {
      const { job, answer } = solve({ ...blend, parents });
      const { finished, total } = valueOf(answer);
      expect(finished[job.gases.indexOf('nitrogen')]! / total).toBeCloseTo(0.95, 12);
      expect(finished[job.gases.indexOf('argon')]).toBe(0);
    }
  });

  it('one gas alone is ordered like any other', () => {
    const { job, answer } = solve({ order: [['N2', '100 %']], to: '150 bar', parents: [pure('Ar'), pure('N2')] });
    expect(valueOf(answer).finished[job.gases.indexOf('argon')]).toBe(0);
  });

  it('volume in N is the volume stretched by the fill pressure', () => {
    const { model, vessel, answer } = solve({ ...blend, cylinder: { material: 'steel' } });
    const density = valueOf(model.density(vessel.cylinder.contents.temperature, pascal(150e5), [0.05, 0.95])).density;
    const volume = cylinderVolume(vessel, pascal(150e5), vessel.cylinder.contents.temperature);
    expect(valueOf(answer).total / (density * volume)).toBeCloseTo(1, 12);
  });
});

describe('solveAmounts refuses', () => {
  it('a component that no parent holds, and says what can be made', () => {
    const { job, answer } = solve({ order: [['He', '10 %'], ['CO2', '5 %'], ['N2', 'balance']], to: '100 bar', parents: [pure('CO2'), pure('N2')] });
    expect(answer).toMatchObject({ ok: false, reason: { code: 'component-without-parent', gases: [job.gases.indexOf('helium')] } });
    if (answer.ok || answer.reason.code !== 'component-without-parent') return;
    expect(answer.reason.nearest.fractions.reduce((sum, x) => sum + x, 0)).toBeCloseTo(1, 12);
    expect(answer.reason.nearest.fractions[job.gases.indexOf('helium')]).toBe(0);
  });

  it('a premix that is too weak', () => {
    const { answer } = solve({ ...blend, parents: [{ key: 'weak', lines: [['CO2', '2 %'], ['N2', 'balance']] }, pure('N2')] });
    expect(answer).toMatchObject({ ok: false, reason: { code: 'cannot-be-made' } });
    if (answer.ok || answer.reason.code !== 'cannot-be-made') return;
    // Nearest to 5 % that a 2 % premix reaches: itself.
    expect(answer.reason.nearest.fractions[0]).toBeCloseTo(0.02, 12);
  });

  it('a balance that would be mostly another gas', () => {
    const { job, answer } = solve({
      order: [['CO', '50 µmol/mol'], ['N2', 'balance']], to: '100 bar', parents: [{ key: 'a', lines: [['CO', '0.5 %'], ['N2', 'balance']] }, pure('Ar')],
    });
    expect(answer).toMatchObject({ ok: false, reason: { code: 'cannot-be-made', gases: [job.gases.indexOf('nitrogen')] } });
  });

  it('a balance short of its own stated tolerance', () => {
    const air: Fill = {
      order: [['O2', '10 %'], ['N2', 'balance', '0.1 %']], to: '100 bar',
      parents: [{ key: 'air', lines: [['O2', '20.96 %'], ['Ar', '0.92 %'], ['N2', 'balance']] }, pure('N2')],
    };
    expect(solve(air).answer).toMatchObject({ ok: false, reason: { code: 'cannot-be-made' } });
    expect(solve({ ...air, order: [['O2', '10 %'], ['N2', 'balance', '1 %']] }).answer.ok).toBe(true);
  });

  it('a residual with too much of a gas: vented to the pressure given, the order can be made, above it not', () => {
    const withCarbonDioxide = (pressure: string): Fill => ({ ...blend, contents: residual(pressure, [['CO2', '100 %']]) });
    const { answer } = solve(withCarbonDioxide('12 bar'));
    expect(answer).toMatchObject({ ok: false, reason: { code: 'residual-in-the-way' } });
    if (answer.ok || answer.reason.code !== 'residual-in-the-way') return;
    // All carbon dioxide of the blend may come from the residual: the stop of a 5 % blend at 150 bar.
    expect(answer.reason.ventTo! / 1e5).toBeCloseTo(7.203, 2);
    expect(solve(withCarbonDioxide('7.20 bar')).answer.ok).toBe(true);
    expect(solve(withCarbonDioxide('7.21 bar')).answer.ok).toBe(false);
  });

  it('a residual of a gas that was not ordered, too much of it for the balance', () => {
    const withHelium = (pressure: string): Fill => ({ ...blend, contents: residual(pressure, [['He', '100 %']]) });
    const { answer } = solve(withHelium('10 bar'));
    expect(answer).toMatchObject({ ok: false, reason: { code: 'residual-in-the-way' } });
    if (answer.ok || answer.reason.code !== 'residual-in-the-way') return;
    expect(solve(withHelium(`${String((answer.reason.ventTo! / 1e5) * 0.999)} bar`)).answer.ok).toBe(true);
    expect(solve(withHelium(`${String((answer.reason.ventTo! / 1e5) * 1.001)} bar`)).answer.ok).toBe(false);
  });

  it('a cylinder that is full already, at the fill temperature', () => {
    const { answer } = solve({ ...blend, to: '20 bar', temperature: '20 °C', contents: residual('21 bar', [['N2', '100 %']], '25 °C') });
    expect(answer).toMatchObject({ ok: false, reason: { code: 'fill-pressure-too-low' } });
    if (answer.ok || answer.reason.code !== 'fill-pressure-too-low') return;
    expect(answer.reason.residualPressure / 1e5).toBeGreaterThan(20);
    expect(answer.reason.residualPressure / 1e5).toBeLessThan(21);
  });

  it('a finished gas that condenses first, with the reason of the model', () => {
    const { answer } = solve({ order: [['C3H8', '100 %']], to: '60 bar' });
    expect(answer).toMatchObject({ ok: false, reason: { code: 'state', where: 'finished gas', reason: { code: 'no-gas-root' } } });
  });

  it('a residual that cannot be a gas at its pressure', () => {
    const { answer } = solve({ ...blend, contents: residual('60 bar', [['C3H8', '100 %']]) });
    expect(answer).toMatchObject({ ok: false, reason: { code: 'state', where: 'residual', reason: { code: 'no-gas-root' } } });
  });

  it('is not misled by a nominal that is a hair off what can be made', () => {
    const { job, model, vessel } = solve({ ...blend, parents: [{ key: 'p', lines: [['CO2', '5 %'], ['N2', 'balance']] }] });
    expect(solveAmounts(job, model, vessel).ok).toBe(true);
    const [minor, major] = job.order.components;
    const off = { ...job, order: { ...job.order, components: [{ ...minor!, nominal: fraction(0.05 + 5e-9) }, { ...major!, nominal: fraction(0.95 - 5e-9) }] } };
    expect(solveAmounts(off, model, vessel)).toMatchObject({ ok: false, reason: { code: 'cannot-be-made' } });
  });
});

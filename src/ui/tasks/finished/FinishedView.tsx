import { lazy, Suspense, useMemo } from 'react';
import { gasLabel } from '../../../blending/index.ts';
import type { Plan, PlanAnswer, PlannedComponent } from '../../../blending/index.ts';
import { formatMass, formatSignificant, formatTemperature, formatVolume, fromPascal, pressureReading } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { useCurves } from '../../parts/curves.ts';
import { WorkingFigure } from '../../parts/WorkingFigure.tsx';
import { amountText, percentNumber, pressureNumber, relativePercent, scaleLabel, scaleOf } from '../../parts/show.ts';
import type { Scale } from '../../parts/show.ts';
import { Condensation } from './Condensation.tsx';
import { SuggestedClassSection } from './SuggestedClass.tsx';
import { NotPlanned } from '../plan/NotPlanned.tsx';

const PressureTemperatureChart = lazy(() => import('../../charts/PressureTemperatureChart.tsx'));

/** What the finished cylinder holds, in every quantity a certificate or a label may ask for. */
export function FinishedView({ answer }: { readonly answer: PlanAnswer }) {
  if (!answer.ok) return <NotPlanned problems={answer.reason.problems} />;
  const plan = answer.value;
  const scale = scaleOf(plan.job, plan.steps.at(-1)?.gauge ?? null, plan.finished.pressure);
  return (
    <>
      <Composition plan={plan} />
      <IdealMistake plan={plan} />
      <Totals plan={plan} />
      <Developed plan={plan} scale={scale} />
      <Condensation plan={plan} scale={scale} />
      <SuggestedClassSection plan={plan} />
    </>
  );
}

function Composition({ plan }: { readonly plan: Plan }) {
  const { concentrationTemperature, concentrationPressure, barometer } = plan.job.conditions;
  const state = `${formatTemperature(concentrationTemperature)}, ${pressureNumber(concentrationPressure, { unit: 'kPa', reference: 'absolute', resolution: 1, barometer })} kPa absolute`;
  return (
    <section aria-labelledby="composition-title">
      <h2 id="composition-title">Finished gas</h2>
      <div className="scroll" tabIndex={0} role="group" aria-label="composition of the finished gas">
        <table className="rows wide-table">
          <thead>
            <tr>
              <th scope="col">component</th>
              <th scope="col" className="number">amount fraction, %</th>
              <th scope="col" className="number">µmol/mol</th>
              <th scope="col" className="number">mass fraction, %</th>
              <th scope="col" className="number">volume fraction, %</th>
              <th scope="col" className="number">mg/m³</th>
              <th scope="col" className="number">partial pressure, bar</th>
            </tr>
          </thead>
          <tbody>{plan.final.components.map((component) => <ComponentRow key={component.gas} plan={plan} component={component} />)}</tbody>
        </table>
      </div>
      <p className="hint">Volume fraction and mg/m³ are stated at {state}; partial pressures in the finished cylinder, absolute. “—”: the pure component is not known to be a gas at that state.</p>
    </section>
  );
}

function ComponentRow({ plan, component }: { readonly plan: Plan; readonly component: PlannedComponent }) {
  const { formula, name } = gasLabel(component.gas);
  const { nominal, planned } = component;
  // What nobody ordered is known from half of a limit at best: three digits are generous.
  const digits = nominal === null ? 3 : 5;
  return (
    <tr>
      <th scope="row">{formula} <small className="unit">{name}{nominal === null && ', not ordered'}</small></th>
      <td className="number"><WorkingFigure explain={(workings) => workings.explainComponent(plan, component)}>{percentNumber(planned, digits)}</WorkingFigure></td>
      <td className="number">{formatSignificant(planned * 1e6, digits)}</td>
      <td className="number">{percentNumber(component.massFraction, digits)}</td>
      <td className="number">{component.volumeFraction === null ? '—' : percentNumber(component.volumeFraction, digits)}</td>
      <td className="number">{component.massConcentration === null ? '—' : formatSignificant(component.massConcentration * 1e6, digits)}</td>
      <td className="number">{formatSignificant(fromPascal(component.partialPressure, 'bar'), 4)}</td>
    </tr>
  );
}

/** What following the ideal-gas stops would have put into this cylinder. */
function IdealMistake({ plan }: { readonly plan: Plan }) {
  const wrong = plan.final.components.flatMap(({ gas, nominal, planned, byIdealStops }) =>
    (nominal === null || byIdealStops === null ? [] : [`${gasLabel(gas).formula} ${amountText(byIdealStops, 4)} (${relativePercent(byIdealStops, planned)})`]));
  if (wrong.length === 0) return null;
  return (
    <section aria-labelledby="ideal-title">
      <h3 id="ideal-title">Had the ideal-gas stops been used</h3>
      <p>The same fill by ideal-gas arithmetic would have made {wrong.join(', ')}.</p>
    </section>
  );
}

function Totals({ plan }: { readonly plan: Plan }) {
  const { final, finished } = plan;
  const rows: readonly (readonly [string, string])[] = [
    ['Total amount', `${formatSignificant(finished.total, 6)} mol`],
    ['Total mass', formatMass(final.totalMass)],
    ['Mean molar mass', `${formatSignificant(final.meanMolarMass * 1000, 6)} g/mol`],
    ['Compressibility factor Z', formatSignificant(finished.compressibilityFactor, 5)],
    ['Density', `${formatSignificant(final.massDensity, 4)} kg/m³`],
    ['Filling ratio', plan.phase.finished.phase === 'unstable'
      ? 'not stated: part of the blend would be liquid'
      : `${formatSignificant(final.fillingRatio, 3)} kg gas per kg water`],
    ['Gas when let out into the room', formatVolume(final.releasedVolume)],
  ];
  return (
    <section aria-labelledby="totals-title">
      <h3 id="totals-title">In the cylinder</h3>
      <table className="rows narrow-table">
        <tbody>{rows.map(([name, value]) => <tr key={name}><th scope="row">{name}</th><td className="number">{value}</td></tr>)}</tbody>
      </table>
    </section>
  );
}

function Developed({ plan, scale }: { readonly plan: Plan; readonly scale: Scale }) {
  const { pressureOverTemperature } = useCurves();
  const points = useMemo(() => pressureOverTemperature(plan, -20, 70, 46), [pressureOverTemperature, plan]);
  const on = (pressure: Pascal) => pressureReading(pressure, scale);
  const { workingPressure, testPressure } = plan.job.cylinder;
  const limits = [
    ...(workingPressure === null ? [] : [{ name: 'working pressure', value: on(workingPressure) }]),
    ...(testPressure === null ? [] : [{ name: 'test pressure', value: on(testPressure) }]),
  ];
  return (
    <section className="chart" aria-labelledby="developed-title">
      <h3 id="developed-title">Pressure of the finished cylinder against temperature</h3>
      <table className="rows narrow-table">
        <thead><tr><th scope="col">temperature</th><th scope="col" className="number">{scaleLabel(scale)}</th></tr></thead>
        <tbody>
          {plan.final.developedPressures.map(({ temperature, pressure }) => (
            <tr key={temperature}>
              <th scope="row">{formatTemperature(temperature)}</th>
              <td className="number">
                <WorkingFigure explain={(workings) => workings.explainDeveloped(plan, pressure, temperature)}>{pressureNumber(pressure, scale)}</WorkingFigure>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <div style={{ minHeight: 230 }}>
        <Suspense fallback={null}>
          <PressureTemperatureChart
            points={points.map(({ celsius, pressure }) => ({ x: celsius, y: pressure === null ? null : on(pressure) }))}
            limits={limits} unit={scaleLabel(scale)}
          />
        </Suspense>
      </div>
    </section>
  );
}

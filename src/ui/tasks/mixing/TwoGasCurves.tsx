import { lazy, Suspense, useState } from 'react';
import { gasLabel, STANDARD_PRESSURE } from '../../../blending/index.ts';
import type { GasId, MixingCurvePoint, Plan } from '../../../blending/index.ts';
import { formatNumber, formatTemperature } from '../../../units/index.ts';
import { useCurves } from '../../parts/curves.ts';
import { pressureNumber } from '../../parts/show.ts';

const MixingChart = lazy(() => import('../../charts/MixingChart.tsx'));

const POINTS = 81;

/** ΔG and ΔS of mixing over composition for two of the blend's gases, this blend marked. */
export function TwoGasCurves({ plan }: { readonly plan: Plan }) {
  const ordered = plan.final.components.filter(({ nominal }) => nominal !== null).sort((a, b) => b.planned - a.planned);
  const [choice, setChoice] = useState<readonly [GasId | null, GasId | null]>([null, null]);
  const [atFill, setAtFill] = useState(false);
  const gases = ordered.map(({ gas }) => gas);
  const first = choice[0] !== null && gases.includes(choice[0]) ? choice[0] : gases[1];
  const second = choice[1] !== null && gases.includes(choice[1]) ? choice[1] : gases[0];
  const { temperature } = plan.finished;
  const pressure = atFill ? plan.finished.pressure : STANDARD_PRESSURE[plan.job.conditions.standardPressure];
  const { mixingCurveOf, mixingPointOf } = useCurves();
  if (first === undefined || second === undefined) return null;
  const fraction = (gas: GasId) => ordered.find((component) => component.gas === gas)?.planned ?? 0;
  const curve = first === second ? [] : mixingCurveOf(first, second, temperature, pressure, POINTS);
  const x = fraction(first) / (fraction(first) + fraction(second));
  return (
    <section className="chart" aria-labelledby="curves-title">
      <h3 id="curves-title">Two gases, mixed at one temperature and pressure</h3>
      <div className="choices">
        <GasChoice label="first gas" gases={gases} value={first} onChange={(gas) => { setChoice([gas, second]); }} />
        <GasChoice label="second gas" gases={gases} value={second} onChange={(gas) => { setChoice([first, gas]); }} />
        <div className="field">
          <label className="label" htmlFor="curve-pressure">at</label>
          <select id="curve-pressure" className="input" value={atFill ? 'fill' : 'standard'} onChange={(event) => { setAtFill(event.currentTarget.value === 'fill'); }}>
            <option value="standard">the standard pressure</option>
            <option value="fill">the fill pressure</option>
          </select>
        </div>
      </div>
      {first === second
        ? <p className="problem">Choose two different gases: a gas mixed with itself does not change.</p>
        : <Curves curve={curve} here={mixingPointOf(first, second, temperature, pressure, x)} x={x} gas={gasLabel(first).formula} />}
      <p className="hint">
        At {formatTemperature(temperature)} and {pressureNumber(pressure, { unit: 'bar', reference: 'absolute', resolution: 100, barometer: plan.job.conditions.barometer })} bar absolute,
        per mole of mixture. <span className="line real" aria-hidden="true" /> real gas <span className="line ideal" aria-hidden="true" /> ideal gas, lowest ΔG and highest ΔS at equal amounts.
        {curve.some(({ gibbsEnergy }) => gibbsEnergy === null) && ' Where the real line is missing, one of the pure gases would condense at this pressure.'}
      </p>
    </section>
  );
}

function Curves(props: { readonly curve: readonly MixingCurvePoint[]; readonly here: MixingCurvePoint | null; readonly x: number; readonly gas: string }) {
  const { curve, here, x, gas } = props;
  if (here === null) return <p className="problem">These two gases cannot be computed together.</p>;
  return (
    <div className="chart-pair">
      <figure>
        <figcaption>ΔG of mixing, J/mol; this blend {formatNumber(here.gibbsEnergy ?? here.idealGibbsEnergy, 0)}</figcaption>
        <Suspense fallback={null}>
          <MixingChart points={curve.map((point) => ({ x: point.x, ideal: point.idealGibbsEnergy, real: point.gibbsEnergy }))} gas={gas} unit="J/mol" mark={{ x, y: here.gibbsEnergy ?? here.idealGibbsEnergy }} />
        </Suspense>
      </figure>
      <figure>
        <figcaption>ΔS of mixing, J/(mol K); this blend {formatNumber(here.entropy ?? here.idealEntropy, 2)}</figcaption>
        <Suspense fallback={null}>
          <MixingChart points={curve.map((point) => ({ x: point.x, ideal: point.idealEntropy, real: point.entropy }))} gas={gas} unit="J/(mol K)" mark={{ x, y: here.entropy ?? here.idealEntropy }} />
        </Suspense>
      </figure>
    </div>
  );
}

function GasChoice(props: { readonly label: string; readonly gases: readonly GasId[]; readonly value: GasId; readonly onChange: (gas: GasId) => void }) {
  const id = `curve-${props.label.replace(' ', '-')}`;
  return (
    <div className="field">
      <label className="label" htmlFor={id}>{props.label}</label>
      <select id={id} className="input" value={props.value} onChange={(event) => { props.onChange(event.currentTarget.value as GasId); }}>
        {props.gases.map((gas) => <option key={gas} value={gas}>{gasLabel(gas).formula}</option>)}
      </select>
    </div>
  );
}

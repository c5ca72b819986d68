import { lazy, Suspense, useId, useMemo, useState } from 'react';
import { entrySentence } from '../../../blending/index.ts';
import type { CompressibilityCurve, GasLabel, GasTools } from '../../../blending/index.ts';
import { formatNumber, formatSignificant, formatTemperature, fromPascal, parseTemperature, pascal } from '../../../units/index.ts';
import { useGasTools } from './tools.ts';
import type { Kelvin } from '../../../units/index.ts';

const GasCurveChart = lazy(() => import('../../charts/GasCurveChart.tsx'));

const HIGHEST = pascal(300e5);

function useCurve(gas: GasLabel['id'], temperature: Kelvin | null): ReturnType<GasTools['compressibilityCurve']> | null {
  const { compressibilityCurve } = useGasTools();
  return useMemo(() => (temperature === null ? null : compressibilityCurve(gas, temperature, HIGHEST)), [compressibilityCurve, gas, temperature]);
}

/** Z against pressure at a temperature that can be chosen. */
export function CompressibilitySection({ gas }: { readonly gas: GasLabel }) {
  const [typed, setTyped] = useState('20 °C');
  const id = useId();
  const entry = parseTemperature(typed);
  const temperature = entry.ok ? entry.value.si : null;
  const curve = useCurve(gas.id, temperature);
  return (
    <section className="chart">
      <h3>Compressibility factor Z against pressure</h3>
      <p className="at-temperature">
        <label htmlFor={id}>gas temperature</label>
        <input id={id} className="input" type="text" autoComplete="off" value={typed} aria-invalid={!entry.ok} onChange={(event) => { setTyped(event.currentTarget.value); }} />
      </p>
      {!entry.ok && <p className="problem">{entrySentence(entry.reason)}</p>}
      {curve !== null && !curve.ok && <p className="problem">The equation has no gas state at this temperature.</p>}
      {curve?.ok === true && temperature !== null && <Curve curve={curve.value} gas={gas} at={formatTemperature(temperature)} />}
    </section>
  );
}

function Curve({ curve: { points, table, condensesAt }, gas, at }: { readonly curve: CompressibilityCurve; readonly gas: GasLabel; readonly at: string }) {
  const outside = points.filter(({ range }) => range !== 'normal').length;
  return (
    <>
      <p className="hint">
        {condensesAt === null ? '' : `${gas.formula} condenses at ${formatSignificant(fromPascal(condensesAt, 'bar'), 4)} bar absolute at ${at}; the curve ends there. `}
        {outside > 0 ? 'Part of the curve lies outside the normal range of the equation. ' : ''}Dashed: ideal gas.
      </p>
      <div role="img" aria-label={`Z of ${gas.name} at ${at}`} style={{ minHeight: 230 }}>
        <Suspense fallback={null}>
          <GasCurveChart
            points={[{ x: 0, y: 1 }, ...points.map(({ pressure, compressibilityFactor }) => ({ x: fromPascal(pressure, 'bar'), y: compressibilityFactor }))]}
            xLabel="bar absolute" yLabel="Z" across={1}
          />
        </Suspense>
      </div>
      <table className="rows narrow-table">
        <thead><tr><th scope="col" className="number">bar absolute</th><th scope="col" className="number">Z</th></tr></thead>
        <tbody>
          {table.map(({ pressure, compressibilityFactor }) => (
            <tr key={pressure}><td className="number">{tickNumber(fromPascal(pressure, 'bar'))}</td><td className="number">{formatNumber(compressibilityFactor, 5)}</td></tr>
          ))}
        </tbody>
      </table>
    </>
  );
}

/** A round number as it is: `50`, `0.2`. */
function tickNumber(value: number): string {
  return formatSignificant(value, 3).replace(/(\.\d*?)0+$/, '$1').replace(/\.$/, '');
}

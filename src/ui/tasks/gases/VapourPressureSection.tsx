import { lazy, Suspense, useMemo } from 'react';
import type { GasLabel } from '../../../blending/index.ts';
import { celsius, formatSignificant, formatTemperature, fromCelsius, fromPascal, NO_NUMBER } from '../../../units/index.ts';
import { useGasTools } from './tools.ts';
import type { Pascal } from '../../../units/index.ts';

const GasCurveChart = lazy(() => import('../../charts/GasCurveChart.tsx'));

/** Temperatures of store and bench, °C. */
const TABLE = [-20, -10, 0, 10, 15, 20, 30, 40, 50];

/** Where the pure gas condenses, over its whole range and at the temperatures of a bench. */
export function VapourPressureSection({ gas }: { readonly gas: GasLabel }) {
  const { correlatedVapourPressure, vapourPressureAt, vapourPressureCurve } = useGasTools();
  const curve = useMemo(() => vapourPressureCurve(gas.id), [vapourPressureCurve, gas.id]);
  const rows = TABLE.map((degrees) => {
    const temperature = fromCelsius(degrees);
    return { temperature, byEquation: vapourPressureAt(gas.id, temperature)?.pressure ?? null, correlated: correlatedVapourPressure(gas.id, temperature) };
  }).filter(({ byEquation, correlated }) => byEquation !== null || correlated !== null);
  const points = curve.map(({ temperature, pressure }) => ({ x: celsius(temperature), y: fromPascal(pressure, 'bar') }));
  const end = points.at(-1);
  return (
    <section className="chart">
      <h3>Vapour pressure</h3>
      <p className="hint">Equal Gibbs energy of gas and liquid, by the equation of the gas; the dot is the critical point. The correlation is what the vapour-pressure rule of a plan uses. Pure gas: what a blend does is in the plan.</p>
      <div role="img" aria-label={`Vapour pressure of ${gas.name}`} style={{ minHeight: 230 }}>
        <Suspense fallback={null}>
          <GasCurveChart points={points} xLabel="temperature, °C" yLabel="bar absolute" logarithmic {...(end === undefined ? {} : { mark: end })} />
        </Suspense>
      </div>
      {rows.length === 0
        ? <p>Between {formatTemperature(fromCelsius(TABLE[0]!), 0)} and {formatTemperature(fromCelsius(TABLE.at(-1)!), 0)} the pure gas does not condense.</p>
        : (
          <table className="rows narrow-table">
            <thead><tr><th scope="col">temperature</th><th scope="col" className="number">by its equation, bar absolute</th><th scope="col" className="number">by correlation, bar absolute</th></tr></thead>
            <tbody>
              {rows.map(({ temperature, byEquation, correlated }) => (
                <tr key={temperature}><th scope="row">{formatTemperature(temperature, 0)}</th><td className="number">{bar(byEquation)}</td><td className="number">{bar(correlated)}</td></tr>
              ))}
            </tbody>
          </table>
        )}
    </section>
  );
}

function bar(pressure: Pascal | null): string {
  return pressure === null ? NO_NUMBER : formatSignificant(fromPascal(pressure, 'bar'), 4);
}

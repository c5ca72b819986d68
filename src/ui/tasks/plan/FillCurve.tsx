import { lazy, Suspense, useMemo } from 'react';
import { useCurves } from '../../parts/curves.ts';
import type { Plan } from '../../../blending/index.ts';
import { fromPascal } from '../../../units/index.ts';

const FillCurveChart = lazy(() => import('../../charts/FillCurveChart.tsx'));

/** Real against ideal pressure through the whole fill, and what the ideal stops would have made. */
export function FillCurve({ plan }: { readonly plan: Plan }) {
  const { pressureAlongFill } = useCurves();
  const curve = useMemo(() => pressureAlongFill(plan), [pressureAlongFill, plan]);
  const bar = (pressure: Parameters<typeof fromPascal>[0] | null) => (pressure === null ? null : fromPascal(pressure, 'bar'));
  const points = curve.map(({ amount, real, ideal }) => ({ amount, real: bar(real), ideal: bar(ideal) }));
  const stops = curve.flatMap(({ amount, stopOf }) => (stopOf === null ? [] : [{ amount, step: stopOf }]));
  return (
    <section className="chart" aria-labelledby="fill-curve-title">
      <h3 id="fill-curve-title">Pressure along the fill</h3>
      <p className="hint"><span className="line real" aria-hidden="true" /> real gas <span className="line ideal" aria-hidden="true" /> ideal gas; the numbers are the steps</p>
      <div style={{ minHeight: 230 }}>
        <Suspense fallback={null}>
          <FillCurveChart points={[{ amount: 0, real: 0, ideal: 0 }, ...points]} stops={stops} />
        </Suspense>
      </div>
    </section>
  );
}

import { lazy, Suspense, useMemo } from 'react';
import type { ColdestPhase, CurveTools, LowestTemperature, Plan } from '../../../blending/index.ts';
import { celsius, formatPressureInFull, formatTemperature, pressureReading } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { useCurves } from '../../parts/curves.ts';
import { scaleLabel } from '../../parts/show.ts';
import type { Scale } from '../../parts/show.ts';

const CondensationChart = lazy(() => import('../../charts/CondensationChart.tsx'));

/** Where the finished gas begins to condense: two figures in words, and the line they lie on. */
export function Condensation({ plan, scale }: { readonly plan: Plan; readonly scale: Scale }) {
  const curves = useCurves();
  const lowest = useMemo(() => curves.lowestGasTemperature(plan), [curves, plan]);
  const value = lowest.ok ? lowest.value : null;
  const points = useMemo(() => curves.condensationCurve(plan), [curves, plan]);
  const on = (pressure: Pascal) => pressureReading(pressure, scale);
  const { coldestStorage } = plan.job.conditions;
  return (
    <section className="chart" aria-labelledby="condensation-title">
      <h3 id="condensation-title">Temperature and fill pressure at which the finished gas begins to condense</h3>
      <p>Lowest temperature at which the filled cylinder stays gas: {lowest.ok ? lowestText(curves, lowest.value, scale) : curves.phaseSentence(lowest.reason)}</p>
      <p>Largest fill pressure for the coldest storage: {plan.phase.coldest === null ? 'not stated, because no coldest storage temperature is.' : largestText(curves, plan.phase.coldest, plan, scale)}</p>
      {points.some(({ temperature }) => temperature !== null) && (
        <div style={{ minHeight: 230 }}>
          <Suspense fallback={null}>
            <CondensationChart
              points={points.flatMap(({ temperature, fillPressure }) => (temperature === null ? [] : [{ x: celsius(temperature), y: on(fillPressure) }]))}
              unit={scaleLabel(scale)} fill={on(plan.finished.pressure)}
              lowest={value === null ? null : celsius(value.temperature)} coldest={coldestStorage === null ? null : celsius(coldestStorage)}
            />
          </Suspense>
        </div>
      )}
      <p className="hint">
        Fill pressures at {formatTemperature(plan.finished.temperature)}. A cylinder so filled and then cooled begins to condense on the line.
        By the dew point of the gas model, of liquid and, for moisture, of ice; other solids are not known to it.
      </p>
    </section>
  );
}

function lowestText({ formingText, moistureCaveat }: CurveTools, lowest: LowestTemperature | null, scale: Scale): string {
  if (lowest === null) return 'below −80 °C.';
  const { temperature, pressure, forming } = lowest;
  return `${formatTemperature(temperature)}, at ${formatPressureInFull(pressure, scale)} in the closed cylinder; there ${formingText(forming)} begins to form.${moistureCaveat(forming)}`;
}

function largestText({ formingText, moistureCaveat, phaseSentence }: CurveTools, { temperature, largestFill, searchedTo }: ColdestPhase, plan: Plan, scale: Scale): string {
  const at = formatTemperature(temperature);
  if (!largestFill.ok) return `${at}, ${phaseSentence(largestFill.reason)}`;
  const largest = largestFill.value;
  if (largest === null) return `none for ${at}, up to ${formatPressureInFull(searchedTo, scale)} in the cylinder there.`;
  return `${formatPressureInFull(largest.pressure, scale)} at ${formatTemperature(plan.finished.temperature)} for ${at}; above it ${formingText(largest.forming)} forms.${moistureCaveat(largest.forming)}`;
}

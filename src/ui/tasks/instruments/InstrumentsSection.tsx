import { lazy, Suspense } from 'react';
import { addGauge, editConditions } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { PressureField, TextField } from '../../parts/Field.tsx';

// Folded until somebody opens one.
const GaugeFields = lazy(() => import('./GaugeFields.tsx'));

/** Gauges, balance and the conditions of the day: entered once, seldom changed. */
export function InstrumentsSection() {
  const gauges = useWorkspaceState((state) => state.recipe.gauges);
  const conditions = useWorkspaceState((state) => state.recipe.conditions);
  const actions = useActions();
  const edit = (patch: Parameters<typeof editConditions>[0]) => { actions.run(editConditions(patch)); };
  return (
    <section aria-labelledby="instruments-title">
      <h2 id="instruments-title">Instruments and room</h2>
      {gauges.map((gauge) => (
        <details key={gauge.key}>
          <summary>{gauge.name === '' ? 'Gauge' : `Gauge ${gauge.name}`}: to {gauge.fullScale} {gauge.reference}, {gauge.accuracy} of {gauge.accuracyOf}</summary>
          <Suspense fallback={null}><GaugeFields gauge={gauge} /></Suspense>
        </details>
      ))}
      <button
        type="button" className="plain"
        onClick={() => { actions.run(addGauge({ name: `G${String(gauges.length + 1)}`, unit: 'bar', reference: 'gauge', fullScale: '250 bar', accuracy: '0.25 %', resolution: '0.1 bar' })); }}
      >
        Add a gauge
      </button>
      <TextField field="conditions.balanceResolution" label="balance step" value={conditions.balanceResolution} onChange={(balanceResolution) => { edit({ balanceResolution }); }} />
      <TextField field="conditions.balance" label="balance" value={conditions.balance} placeholder="name, calibration" onChange={(balance) => { edit({ balance }); }} />
      <TextField field="conditions.thermometer" label="thermometer" value={conditions.thermometer} placeholder="name, calibration" onChange={(thermometer) => { edit({ thermometer }); }} />
      <TextField field="conditions.roomTemperature" label="room temperature" value={conditions.roomTemperature} onChange={(roomTemperature) => { edit({ roomTemperature }); }} />
      <TextField field="conditions.relativeHumidity" label="relative humidity" value={conditions.relativeHumidity} onChange={(relativeHumidity) => { edit({ relativeHumidity }); }} />
      <TextField field="conditions.roomVolume" label="room volume" value={conditions.roomVolume} placeholder="not stated" onChange={(roomVolume) => { edit({ roomVolume }); }} />
      <TextField field="conditions.concentrationTemperature" label="mg/m³ stated at" value={conditions.concentrationTemperature} onChange={(concentrationTemperature) => { edit({ concentrationTemperature }); }} />
      <PressureField field="conditions.concentrationPressure" label="and pressure" value={conditions.concentrationPressure} onChange={(concentrationPressure) => { edit({ concentrationPressure }); }} />
    </section>
  );
}

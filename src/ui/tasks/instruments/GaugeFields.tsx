import type { Gauge } from '../../../blending/index.ts';
import { editGauge, removeGauge } from '../../../state/index.ts';
import { useActions } from '../../bindings/workspace.tsx';
import { ChoiceField, TextField } from '../../parts/Field.tsx';

/** Everything about one gauge. */
export default function GaugeFields({ gauge }: { readonly gauge: Gauge }) {
  const actions = useActions();
  return (
    <>
        <TextField field={`gauges.${gauge.key}.name`} label="name" value={gauge.name} onChange={(name) => { actions.run(editGauge(gauge.key, { name })); }} />
        <TextField field={`gauges.${gauge.key}.unit`} label="unit on its face" value={gauge.unit} onChange={(unit) => { actions.run(editGauge(gauge.key, { unit })); }} />
        <ChoiceField field={`gauges.${gauge.key}.reference`} label="reads" value={gauge.reference} choices={['gauge', 'absolute']} onChange={(reference) => { actions.run(editGauge(gauge.key, { reference })); }} />
        <TextField field={`gauges.${gauge.key}.fullScale`} label="full scale" value={gauge.fullScale} onChange={(fullScale) => { actions.run(editGauge(gauge.key, { fullScale })); }} />
        <TextField field={`gauges.${gauge.key}.accuracy`} label="accuracy" value={gauge.accuracy} onChange={(accuracy) => { actions.run(editGauge(gauge.key, { accuracy })); }} />
        <ChoiceField field={`gauges.${gauge.key}.accuracyOf`} label="of" value={gauge.accuracyOf} choices={['span', 'reading']} onChange={(accuracyOf) => { actions.run(editGauge(gauge.key, { accuracyOf })); }} />
        <TextField field={`gauges.${gauge.key}.resolution`} label="smallest step" value={gauge.resolution} onChange={(resolution) => { actions.run(editGauge(gauge.key, { resolution })); }} />
        <TextField field={`gauges.${gauge.key}.calibrated`} label="calibrated" value={gauge.calibrated} placeholder="not stated" onChange={(calibrated) => { actions.run(editGauge(gauge.key, { calibrated })); }} />
        <button type="button" className="plain remove-long" onClick={() => { actions.run(removeGauge(gauge.key)); }}>Remove this gauge</button>
    </>
  );
}

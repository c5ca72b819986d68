import { editConditions, editContents, editCylinder } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { CompositionEditor } from '../../parts/CompositionEditor.tsx';
import { ChoiceField, PressureField, TextField } from '../../parts/Field.tsx';
import { SectionProblem } from '../../parts/SectionProblem.tsx';

/** The cylinder, its limits and what is in it before the first addition. */
export function CylinderSection() {
  const cylinder = useWorkspaceState((state) => state.recipe.cylinder);
  const coldest = useWorkspaceState((state) => state.recipe.conditions.coldestStorage);
  const actions = useActions();
  const edit = (patch: Parameters<typeof editCylinder>[0]) => { actions.run(editCylinder(patch)); };
  return (
    <section aria-labelledby="cylinder-title">
      <h2 id="cylinder-title">Cylinder</h2>
      <TextField field="cylinder.id" label="number" value={cylinder.id} onChange={(id) => { edit({ id }); }} />
      <ChoiceField
        field="cylinder.material" label="material" value={cylinder.material}
        choices={['aluminium', 'steel', { value: 'rigid', text: 'rigid (no growth)' }]} onChange={(material) => { edit({ material }); }}
      />
      <TextField field="cylinder.waterCapacity" label="water capacity" value={cylinder.waterCapacity} placeholder="10 L" onChange={(waterCapacity) => { edit({ waterCapacity }); }} />
      <PressureField field="cylinder.workingPressure" label="working pressure" value={cylinder.workingPressure} placeholder="as marked" onChange={(workingPressure) => { edit({ workingPressure }); }} />
      <TextField field="cylinder.workingPressureTemperature" label="marked for" value={cylinder.workingPressureTemperature} onChange={(workingPressureTemperature) => { edit({ workingPressureTemperature }); }} />
      <PressureField field="cylinder.testPressure" label="test pressure" value={cylinder.testPressure} placeholder="as marked" onChange={(testPressure) => { edit({ testPressure }); }} />
      <TextField field="conditions.coldestStorage" label="coldest storage" value={coldest} placeholder="not stated" onChange={(coldestStorage) => { actions.run(editConditions({ coldestStorage })); }} />
      <ContentsFields />
      <details>
        <summary>Test date, valve and history</summary>
        <TextField field="cylinder.testDue" label="next test" value={cylinder.testDue} placeholder="2027-03-31" onChange={(testDue) => { edit({ testDue }); }} />
        <TextField field="cylinder.valveOutlet" label="valve outlet" value={cylinder.valveOutlet} onChange={(valveOutlet) => { edit({ valveOutlet }); }} />
        <TextField field="cylinder.held" label="has held" value={cylinder.held} placeholder="CO, CO₂, N₂" onChange={(held) => { edit({ held }); }} />
        <TextField field="cylinder.conditionedFor" label="conditioned for" value={cylinder.conditionedFor} onChange={(conditionedFor) => { edit({ conditionedFor }); }} />
      </details>
      <details>
        <summary>Growth and start reading</summary>
        <TextField field="cylinder.pressureExpansion" label="growth by pressure" value={cylinder.pressureExpansion} placeholder="by material" onChange={(pressureExpansion) => { edit({ pressureExpansion }); }} />
        <TextField field="cylinder.thermalExpansion" label="growth by temperature" value={cylinder.thermalExpansion} placeholder="by material" onChange={(thermalExpansion) => { edit({ thermalExpansion }); }} />
        <TextField field="cylinder.startReading" label="start reading" value={cylinder.startReading} placeholder="gains only" onChange={(startReading) => { edit({ startReading }); }} />
      </details>
    </section>
  );
}

/** Dry air in three parts: as one substance it would be wrong in every mixture. */
const AIR = [{ gas: 'N₂', amount: 'balance' }, { gas: 'O₂', amount: '20.96 %' }, { gas: 'Ar', amount: '0.92 %' }] as const;

function ContentsFields() {
  const contents = useWorkspaceState((state) => state.recipe.cylinder.contents);
  const actions = useActions();
  return (
    <>
      <ChoiceField
        field="cylinder.contents.state" label="before filling" value={contents.state}
        choices={[{ value: 'not stated', text: 'not stated' }, { value: 'evacuated', text: 'evacuated' }, { value: 'residual', text: 'holds a residual' }]}
        onChange={(state) => { actions.run(editContents(state === 'evacuated' && contents.pressure.typed === '' ? { state, pressure: { typed: '', reference: 'absolute' } } : { state })); }}
      />
      {contents.state !== 'not stated' && (
        <PressureField
          field="cylinder.contents.pressure" label={contents.state === 'evacuated' ? 'vacuum' : 'residual'}
          value={contents.pressure} placeholder={contents.state === 'evacuated' ? 'perfect' : '2 bar'}
          onChange={(pressure) => { actions.run(editContents({ pressure })); }}
        />
      )}
      {contents.state === 'residual' && (
        <>
          <TextField field="cylinder.contents.temperature" label="its temperature" value={contents.temperature} onChange={(temperature) => { actions.run(editContents({ temperature })); }} />
          <CompositionEditor
            path="cylinder.contents.composition" legend="composition of the residual" lines={contents.composition} blank={{ gas: '', amount: '' }}
            onChange={(composition) => { actions.run(editContents({ composition })); }}
          />
          <button type="button" className="plain" onClick={() => { actions.run(editContents({ composition: AIR })); }}>It is air</button>
        </>
      )}
      <SectionProblem field="cylinder.contents" />
    </>
  );
}

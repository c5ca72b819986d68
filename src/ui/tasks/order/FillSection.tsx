import { editConditions, editOrder, editRoute } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { ChoiceField, PressureField, TextField } from '../../parts/Field.tsx';
import { SectionProblem } from '../../parts/SectionProblem.tsx';

/** To which pressure, at which temperature, by which method and in which order. */
export function FillSection() {
  const order = useWorkspaceState((state) => state.recipe.order);
  const route = useWorkspaceState((state) => state.recipe.route);
  const barometer = useWorkspaceState((state) => state.recipe.conditions.barometer);
  const actions = useActions();
  return (
    <section aria-labelledby="fill-title">
      <h2 id="fill-title">Fill to</h2>
      <PressureField field="order.fillPressure" label="pressure" value={order.fillPressure} placeholder="150 bar" onChange={(fillPressure) => { actions.run(editOrder({ fillPressure })); }} />
      <TextField field="order.fillTemperature" label="at gas temperature" value={order.fillTemperature} onChange={(fillTemperature) => { actions.run(editOrder({ fillTemperature })); }} />
      <TextField field="conditions.barometer" label="barometer" value={barometer} onChange={(value) => { actions.run(editConditions({ barometer: value })); }} />
      <ChoiceField field="route.by" label="by" value={route.by} choices={['pressure', 'mass', 'pressure and mass']} onChange={(by) => { actions.run(editRoute({ by })); }} />
      <ChoiceField
        field="route.sequence" label="order of addition" value={route.sequence}
        choices={[{ value: 'best', text: 'chosen by the checks' }, { value: 'smallest first', text: 'smallest first' }, { value: 'as listed', text: 'as listed' }]}
        onChange={(sequence) => { actions.run(editRoute({ sequence })); }}
      />
      <SectionProblem field="order" />
      <SectionProblem field="route" />
    </section>
  );
}

import { useState } from 'react';
import { isBalanceText, readOrderText, writeOrderText } from '../../../blending/index.ts';
import type { OrderLine, Plan } from '../../../blending/index.ts';
import { addComponent, editComponent, editCylinder, editOrder, removeComponent, setOrderComponents } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { TextField } from '../../parts/Field.tsx';
import { GasField } from '../../parts/GasField.tsx';
import { SectionProblem } from '../../parts/SectionProblem.tsx';
import { PlannedCell } from './PlannedCell.tsx';

/** The order as a line of text and as a table; both say the same and either can be typed into. */
export function OrderSection({ plan }: { readonly plan: Plan | null }) {
  const components = useWorkspaceState((state) => state.recipe.order.components);
  const actions = useActions();
  return (
    <section aria-labelledby="order-title">
      <h2 id="order-title">Order</h2>
      <OrderText components={components} />
      <table className="components">
        <thead>
          <tr>
            <th scope="col">component</th>
            <th scope="col" className="number">nominal</th>
            <th scope="col" className="number">± tol.</th>
            <th scope="col" className="number">as planned</th>
            <th scope="col"><span className="visually-hidden">remove</span></th>
          </tr>
        </thead>
        <tbody>
          {components.map((line, index) => <ComponentRow key={index} line={line} index={index} plan={plan} />)}
        </tbody>
      </table>
      <SectionProblem field="order.components" />
      <button type="button" className="plain" onClick={() => { actions.run(addComponent({ gas: '', amount: '', tolerance: '' })); }}>
        Add a component
      </button>
    </section>
  );
}

function ComponentRow({ line, index, plan }: { readonly line: OrderLine; readonly index: number; readonly plan: Plan | null }) {
  const actions = useActions();
  const path = `order.components.${String(index)}`;
  const name = line.gas === '' ? `component ${String(index + 1)}` : line.gas;
  const edit = (patch: Partial<OrderLine>) => { actions.run(editComponent(index, patch)); };
  return (
    <tr>
      <td>
        <GasField field={`${path}.gas`} label={`gas of component ${String(index + 1)}`} value={line.gas} onChange={(gas) => { edit({ gas }); }} />
      </td>
      <td>
        <TextField bare align="right" field={`${path}.amount`} label={`nominal amount of ${name}`} value={line.amount} onChange={(amount) => { edit({ amount }); }} />
      </td>
      <td>
        <TextField
          bare align="right" field={`${path}.tolerance`} label={`preparation tolerance of ${name}`} value={line.tolerance}
          placeholder={isBalanceText(line.amount) ? '' : '—'} onChange={(tolerance) => { edit({ tolerance }); }}
        />
      </td>
      <td className="number"><PlannedCell plan={plan} gasText={line.gas} /></td>
      <td>
        <button type="button" className="plain remove" aria-label={`Remove ${name}`} onClick={() => { actions.run(removeComponent(index)); }}>×</button>
      </td>
    </tr>
  );
}

/** While it is being typed in, the box shows the typing; otherwise it shows the table as a line. */
function OrderText({ components }: { readonly components: readonly OrderLine[] }) {
  const [draft, setDraft] = useState<string | null>(null);
  const actions = useActions();
  const reading = draft === null ? null : readOrderText(draft);
  const change = (text: string) => {
    setDraft(text);
    const { components: read, fillPressure, waterCapacity, material } = readOrderText(text);
    if (read.length > 0) actions.run(setOrderComponents(read.map((line) => ({ ...line, tolerance: line.tolerance || toleranceOf(components, line.gas) }))));
    if (fillPressure !== null) actions.run(editOrder({ fillPressure }));
    if (waterCapacity !== null) actions.run(editCylinder({ waterCapacity }));
    if (material !== null) actions.run(editCylinder({ material }));
  };
  return (
    <div className="field bare">
      <label htmlFor="order-text" className="visually-hidden">Order as a line, typed or pasted</label>
      <textarea
        id="order-text"
        className="order-text"
        rows={2}
        spellCheck={false}
        value={draft ?? writeOrderText(components)}
        placeholder="50 µmol/mol CO, 5 % CO2, bal N2"
        onFocus={() => { setDraft(writeOrderText(components)); }}
        onBlur={() => { if (readOrderText(draft ?? '').notUnderstood.length === 0) setDraft(null); }}
        onChange={(event) => { change(event.currentTarget.value); }}
      />
      {reading !== null && reading.notUnderstood.length > 0 && (
        <p className="problem">Not understood: {reading.notUnderstood.join('; ')}. Write amount and gas, as in “5 % CO2”.</p>
      )}
    </div>
  );
}

/** The tolerance already given for a gas stays when the order is typed anew. */
function toleranceOf(components: readonly OrderLine[], gas: string): string {
  return components.find((line) => line.gas === gas)?.tolerance ?? '';
}

import type { Balance, Recipe, StockCylinder, StockGauge, StockParent, Thermometer } from '../../../blending/index.ts';
import { addGauge, addParent, editConditions, refreshParent, takeCylinder } from '../../../state/index.ts';
import type { StockItem, StockList } from '../../../state/index.ts';
import { useStockroom } from '../../bindings/stockroom.tsx';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import type { ListView } from './lists.ts';
import { saysTheSame } from './same.ts';

/** Copies one thing of the stock into the open recipe, or brings the copy up to date. */
export function UseButton<List extends StockList>({ view, entry }: { readonly view: ListView<List>; readonly entry: StockItem<List> }) {
  const { tools } = useStockroom();
  const actions = useActions();
  switch (view.list) {
    case 'parents':
      return <UseParent entry={entry as StockParent} />;
    case 'cylinders':
      return <UseCylinder entry={entry as StockCylinder} />;
    case 'gauges':
      return <UseThis isUsed={({ gauges }) => gauges.some(({ name, fullScale }) => name === (entry as StockGauge).name && fullScale === (entry as StockGauge).fullScale)} onUse={() => { actions.run(addGauge(tools.gaugeFromStock(entry as StockGauge, ''))); }} />;
    case 'thermometers':
      return <UseThis isUsed={({ conditions }) => conditions.thermometer === tools.thermometerWords(entry as Thermometer)} onUse={() => { actions.run(editConditions({ thermometer: tools.thermometerWords(entry as Thermometer) })); }} />;
    case 'balances':
      return (
        <UseThis
          isUsed={({ conditions }) => conditions.balance === tools.balanceWords(entry as Balance)}
          onUse={() => { actions.run(editConditions({ balance: tools.balanceWords(entry as Balance), balanceResolution: (entry as Balance).resolution })); }}
        />
      );
    default:
      return null;
  }
}

function UseThis({ isUsed, onUse }: { readonly isUsed: (recipe: Recipe) => boolean; readonly onUse: () => void }) {
  const used = useWorkspaceState((state) => isUsed(state.recipe));
  if (used) return <>in use</>;
  return <button type="button" className="plain" onClick={onUse}>Use</button>;
}

function UseCylinder({ entry }: { readonly entry: StockCylinder }) {
  const { tools } = useStockroom();
  const actions = useActions();
  const copy = useWorkspaceState((state) => state.recipe.cylinder);
  // Cylinders without a number cannot be told apart.
  if (entry.id.trim() === '' || copy.id !== entry.id) {
    return <button type="button" className="plain" onClick={() => { actions.run(takeCylinder(tools.cylinderFromStock(entry))); }}>Use</button>;
  }
  const fresh = tools.refreshedCylinder(entry, copy);
  if (saysTheSame(copy, fresh)) return <>in use</>;
  return <button type="button" className="plain strong" onClick={() => { actions.run(takeCylinder(fresh)); }}>Bring up to date</button>;
}

function UseParent({ entry }: { readonly entry: StockParent }) {
  const { tools } = useStockroom();
  const actions = useActions();
  const copy = useWorkspaceState((state) => state.recipe.parents.find(({ stock }) => stock === entry.key));
  const parent = tools.parentFromStock(entry, copy?.key ?? '');
  if (copy === undefined) return <button type="button" className="plain" onClick={() => { actions.run(addParent(parent)); }}>Use</button>;
  if (saysTheSame(copy, parent)) return <>in use</>;
  return <button type="button" className="plain strong" onClick={() => { actions.run(refreshParent(copy.key, parent)); }}>Bring up to date</button>;
}

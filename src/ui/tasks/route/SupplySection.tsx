import { useMemo } from 'react';
import type { KnownSupply, Plan, StoreGap, Supply } from '../../../blending/index.ts';
import { editBatch } from '../../../state/index.ts';
import { formatNumber, formatPressureInFull } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { PressureField, TextField } from '../../parts/Field.tsx';
import { useRouteTools } from './tools.ts';

/** What each parent holds, what is left after this plan and after several cylinders, and which one runs out. */
export function SupplySection({ plan }: { readonly plan: Plan | null }) {
  const batch = useWorkspaceState((state) => state.recipe.batch);
  const actions = useActions();
  return (
    <section aria-labelledby="supply-title">
      <h2 id="supply-title">Supply</h2>
      <div className="batch">
        <TextField field="batch.cylinders" label="identical cylinders" value={batch.cylinders} onChange={(cylinders) => { actions.run(editBatch({ cylinders })); }} />
        <label className="check">
          <input type="checkbox" checked={batch.together} onChange={(event) => { actions.run(editBatch({ together: event.currentTarget.checked })); }} />
          filled together on one manifold
        </label>
        <PressureField field="batch.boosterInlet" label="booster draws down to" value={batch.boosterInlet} placeholder="no booster" onChange={(boosterInlet) => { actions.run(editBatch({ boosterInlet })); }} />
      </div>
      {plan !== null && <SupplyTable plan={plan} />}
    </section>
  );
}

function SupplyTable({ plan }: { readonly plan: Plan }) {
  const { supplyOf } = useRouteTools();
  const supply = useMemo(() => supplyOf(plan), [supplyOf, plan]);
  const hasBooster = plan.job.batch.boosterInlet !== null;
  const show = (pressure: Pascal) => formatPressureInFull(pressure, { unit: 'bar', reference: 'gauge', resolution: 1e4, barometer: plan.job.conditions.barometer });
  const many = supply.cylinders > 1;
  return (
    <>
      <p className={supply.shortest.length > 0 ? 'problem' : 'hint'} role="status">{summary(plan, supply)}</p>
      <div className="scroll" tabIndex={0} role="group" aria-label="Supply of each parent">
        <table className="rows wide-table">
          <thead>
            <tr>
              <th scope="col">parent</th><th scope="col" className="number">now</th><th scope="col" className="number">after one cylinder</th>
              {many && <th scope="col" className="number">after {supply.cylinders}</th>}
              <th scope="col" className="number">lasts for</th>{hasBooster && <th scope="col" className="number">with booster</th>}
            </tr>
          </thead>
          <tbody>
            {supply.parents.map((parent) => (
              <tr key={parent.parent}>
                <th scope="row">{nameOf(plan, parent.parent)}<small> gives {formatNumber(parent.drawn, 2)} mol a cylinder</small></th>
                {parent.supply.ok
                  ? <KnownCells known={parent.supply.value} many={many} hasBooster={hasBooster} show={show} />
                  : <td colSpan={3 + Number(many) + Number(hasBooster)}>not computed: {gapSentence(parent.supply.reason)}</td>}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="hint">A parent lasts as long as its pressure after the draw is not below the stop it fills to. Real gas, parents at their own temperature.</p>
    </>
  );
}

interface KnownCellsProps {
  readonly known: KnownSupply;
  readonly many: boolean;
  readonly hasBooster: boolean;
  readonly show: (pressure: Pascal) => string;
}

function KnownCells({ known, many, hasBooster, show }: KnownCellsProps) {
  const left = (after: KnownSupply['afterOne']) => (after === null ? 'empty before' : <>{show(after.pressure)}<small> {formatNumber(after.amount, 1)} mol</small></>);
  return (
    <>
      <td className="number">{show(known.pressure)}<small> {formatNumber(known.held, 1)} mol</small></td>
      <td className="number">{left(known.afterOne)}</td>
      {many && <td className="number">{known.runsOutAt === null || known.cylindersBoosted !== null ? left(known.afterBatch) : 'runs out before'}</td>}
      <td className="number">{cylinders(known.cylinders)}{known.runsOutAt !== null && <small className="problem"> short at cylinder {known.runsOutAt}, {known.step === 0 ? 'purge' : `step ${String(known.step)}`} needs {show(known.stop)}</small>}</td>
      {hasBooster && <td className="number">{known.cylindersBoosted === null ? '' : cylinders(known.cylindersBoosted)}</td>}
    </>
  );
}

function cylinders(count: number): string {
  return count === 1 ? '1 cylinder' : `${String(count)} cylinders`;
}

function summary(plan: Plan, { cylinders: asked, lasts, lastsBoosted, shortest, parents }: Supply): string {
  const unknown = parents.filter(({ supply }) => !supply.ok).map(({ parent }) => nameOf(plan, parent));
  const gap = unknown.length === 0 ? '' : ` Nothing is known of ${unknown.join(', ')}.`;
  if (lasts === null) return `It cannot be said how many cylinders the parents last for.${gap}`;
  const boosted = lastsBoosted === null ? '' : ` With the booster: ${cylinders(lastsBoosted)}.`;
  if (shortest.length === 0) return `The parents last for ${cylinders(lasts)}; asked for ${String(asked)}.${boosted}${gap}`;
  return `${shortest.map((key) => nameOf(plan, key)).join(', ')} run${shortest.length === 1 ? 's' : ''} out: ${cylinders(lasts)} of the ${String(asked)} asked for can be filled.${boosted}${gap}`;
}

function nameOf(plan: Plan, key: string): string {
  return plan.job.parents.find((parent) => parent.key === key)?.name ?? key;
}

function gapSentence(gap: StoreGap): string {
  switch (gap.code) {
    case 'water-capacity-not-stated': return 'the water capacity of its cylinder is not stated.';
    case 'pressure-not-stated': return 'its pressure is not stated.';
    case 'content-not-stated': return 'how much liquefied gas is left in it is not stated.';
    case 'liquid-without-vapour-pressure': return 'it is said to be liquefied, but it is not one gas with a vapour pressure at its temperature.';
    case 'state': return 'the model has no state for it.';
  }
}

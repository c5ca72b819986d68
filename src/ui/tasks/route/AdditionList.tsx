import { useState } from 'react';
import type { Job, JudgedOrder, RouteStep } from '../../../blending/index.ts';
import { editRoute } from '../../../state/index.ts';
import { formatSignificant } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { TextField } from '../../parts/Field.tsx';
import { VerdictMark } from '../../parts/Verdict.tsx';
import { amountText, pressureNumber, scaleLabel, scaleOf } from '../../parts/show.ts';
import { moved } from './arrange.ts';
import type { ListedAddition } from './arrange.ts';
import { useRouteTools } from './tools.ts';

interface AdditionListProps {
  readonly job: Job;
  readonly order: JudgedOrder;
  readonly list: readonly ListedAddition[];
  readonly onTake: (list: readonly ListedAddition[]) => void;
}

/** The additions in their order, to drag or to move with their buttons; each with what it costs. */
export function AdditionList({ job, order, list, onTake }: AdditionListProps) {
  const { faultText } = useRouteTools();
  const [dragged, setDragged] = useState<number | null>(null);
  const [over, setOver] = useState<number | null>(null);
  const drop = (place: number) => {
    if (dragged !== null && dragged !== place) onTake(moved(list, dragged, place));
    setDragged(null);
    setOver(null);
  };
  return (
    <div className="scroll" tabIndex={0} role="group" aria-label="Additions in their order">
      <table className="rows wide-table additions">
        <thead>
          <tr>
            <th scope="col">addition</th><th scope="col" className="number">stop</th><th scope="col" className="number">fuel, of its lower limit</th>
            <th scope="col" className="number">oxygen</th><th scope="col" className="number">left in parent</th><th scope="col" className="number">known to</th><th scope="col">move</th>
          </tr>
        </thead>
        {order.steps.map((step, place) => (
          <tbody
            // Both parts of a split may be alike.
            key={`${String(step.parent)} ${String(order.steps.findIndex(({ parent }) => parent === step.parent) === place)}`} draggable
            className={[dragged === place ? 'dragged' : '', over === place && dragged !== place ? 'drop-here' : ''].join(' ')}
            onDragStart={(event) => { event.dataTransfer.effectAllowed = 'move'; event.dataTransfer.setData('text/plain', String(place)); setDragged(place); }}
            onDragOver={(event) => { event.preventDefault(); setOver(place); }}
            onDragEnd={() => { setDragged(null); setOver(null); }}
            onDrop={(event) => { event.preventDefault(); drop(place); }}
          >
            <tr>
              <th scope="row"><span className="grip" aria-hidden="true">⋮⋮</span> {place + 1}. {job.parents[step.parent]!.name}{step.share < 1 && <ShareField step={step} list={list} place={place} />}</th>
              <Figures job={job} step={step} />
              <td className="row-actions">
                <button type="button" className="plain" disabled={place === 0} aria-label={`${job.parents[step.parent]!.name} earlier`} onClick={() => { onTake(moved(list, place, place - 1)); }}>↑</button>
                <button type="button" className="plain" disabled={place === list.length - 1} aria-label={`${job.parents[step.parent]!.name} later`} onClick={() => { onTake(moved(list, place, place + 1)); }}>↓</button>
              </td>
            </tr>
            {step.faults.map((fault, index) => (
              <tr key={index} className="fault">
                <td colSpan={7}>
                  {fault.verdict === 'none' ? '' : <VerdictMark verdict={fault.verdict} />} {faultText(job, fault, job.parents[step.parent]!.name, step.pressure).replace(/: a (?:hold|caution)$/, '')}
                </td>
              </tr>
            ))}
          </tbody>
        ))}
      </table>
    </div>
  );
}

function Figures({ job, step }: { readonly job: Job; readonly step: RouteStep }) {
  const { mixture } = step;
  return (
    <>
      <td className="number">{shown(job, step.pressure, step.gauge)}</td>
      <td className="number">{mixture === null ? 'not known' : mixture.fuelOfLfl > 0 ? `${formatSignificant(100 * mixture.fuelOfLfl, 3)} %` : '–'}</td>
      <td className="number">{mixture === null ? 'not known' : content(mixture.oxygen)}</td>
      <td className="number">{step.supplyLeft === null ? 'not known' : shown(job, step.supplyLeft, null)}</td>
      <td className="number">{step.relativeUncertainty === null ? 'not measured' : `± ${formatSignificant(100 * step.relativeUncertainty, 2)} %`}<small> {job.gauges.find(({ key }) => key === step.gauge)?.name ?? ''}</small></td>
    </>
  );
}

/** On the scale of the gauge it is read on, as in the plan. */
function shown(job: Job, pressure: Pascal, gauge: string | null): string {
  const scale = scaleOf(job, gauge, pressure);
  return `${pressureNumber(pressure, scale)} ${scaleLabel(scale)}`;
}

/** A content as a share; a trace in its own unit. */
function content(x: number): string {
  return x > 0 ? amountText(x, 3) : '–';
}

/** The early part of a split addition says how large it is; the rest follows. */
function ShareField({ step, list, place }: { readonly step: RouteStep; readonly list: readonly ListedAddition[]; readonly place: number }) {
  const actions = useActions();
  const split = useWorkspaceState((state) => state.recipe.route.split);
  const sequence = useWorkspaceState((state) => state.recipe.route.sequence);
  const own = list[place]!;
  const isEarly = list.findIndex(({ parent }) => parent === own.parent) === place;
  if (!isEarly || sequence !== 'as listed') return <small> {formatSignificant(100 * step.share, 3)} % of it</small>;
  return <TextField bare field="route.split.share" label="share that goes in early" value={split.share} onChange={(share) => { actions.run(editRoute({ split: { ...split, share } })); }} />;
}

import type { ReactNode } from 'react';
import { chooseGauge, gasLabel } from '../../../blending/index.ts';
import type { Plan, PlanStep } from '../../../blending/index.ts';
import { formatMass, formatNumber, formatSignificant, formatTemperature, fromPascal } from '../../../units/index.ts';
import { WorkingFigure } from '../../parts/WorkingFigure.tsx';
import { amountText, parentName, pressureNumber, relativePercent, scaleLabel, scaleOf } from '../../parts/show.ts';

interface StepTableProps {
  readonly plan: Plan;
  readonly columnWidth: number;
  readonly hasStart: boolean;
}

/** The numbers under the ladder: a column a step, the figure to act on largest. */
export function StepTable({ plan, columnWidth, hasStart }: StepTableProps) {
  const { job, steps } = plan;
  const byPressure = job.by !== 'mass';
  const byMass = job.by !== 'pressure';
  const start = hasStart ? <StartCell plan={plan} /> : null;
  return (
    <table
      className="steps"
      style={{ width: `calc(var(--row-names) + ${String(columnWidth * (steps.length + (hasStart ? 1 : 0)))}px)`, ['--column' as string]: `${String(columnWidth)}px` }}
    >
      <colgroup>
        <col className="row-names" />
        {hasStart && <col style={{ width: columnWidth }} />}
        {steps.map((step) => <col key={step.number} style={{ width: columnWidth }} />)}
      </colgroup>
      <thead>
        <tr>
          <th scope="col"><span className="visually-hidden">quantity</span></th>
          {hasStart && <th scope="col">before filling</th>}
          {steps.map((step) => <th scope="col" key={step.number}><span className="ordinal">{step.number}</span> {parentName(job, step)}</th>)}
        </tr>
      </thead>
      <tbody>
        {byPressure && <StopRow plan={plan} start={start} />}
        {byMass && <MassRow plan={plan} hasStart={hasStart} large={!byPressure} />}
        {byPressure && <StripRow plan={plan} hasStart={hasStart} />}
        {byPressure && <IdealRow plan={plan} hasStart={hasStart} />}
        {byPressure && <GaugeRow plan={plan} hasStart={hasStart} />}
        {!byPressure && <StopRow plan={plan} start={start} small />}
        <tr>
          <th scope="row">composition then</th>
          {hasStart && <td />}
          {steps.map((step) => <td key={step.number}><Composition plan={plan} step={step} /></td>)}
        </tr>
        <tr>
          <th scope="row">partial pressures, bar absolute</th>
          {hasStart && <td />}
          {steps.map((step) => <td key={step.number}><PartialPressures plan={plan} step={step} /></td>)}
        </tr>
        <tr>
          <th scope="row">Z</th>
          {hasStart && <td />}
          {steps.map((step) => <td key={step.number}>{formatNumber(step.state.compressibilityFactor, 4)}</td>)}
        </tr>
      </tbody>
    </table>
  );
}

function StartCell({ plan }: { readonly plan: Plan }) {
  if (plan.start === null) return <td>vacuum</td>;
  const { job, start } = plan;
  const scale = scaleOf(job, chooseGauge(job.gauges, null, start.pressure)?.key ?? null, start.pressure);
  return <td><span className="stop-start">{pressureNumber(start.pressure, scale)}</span><span className="unit">{scaleLabel(scale)}</span></td>;
}

function StopRow({ plan, start, small = false }: { readonly plan: Plan; readonly start: ReactNode; readonly small?: boolean }) {
  return (
    <tr className={small ? undefined : 'stops'}>
      <th scope="row">stop at the gas temperature</th>
      {start}
      {plan.steps.map((step) => {
        const scale = scaleOf(plan.job, step.gauge, step.state.pressure);
        return (
          <td key={step.number}>
            <WorkingFigure className={small ? '' : 'act'} explain={(workings) => workings.explainStop(plan, step)}>
              {pressureNumber(step.state.pressure, scale)}
            </WorkingFigure>
            <span className="unit">{scaleLabel(scale)}</span>
            <span className="unit">at {formatTemperature(step.state.temperature)}</span>
          </td>
        );
      })}
    </tr>
  );
}

function MassRow({ plan, hasStart, large }: { readonly plan: Plan; readonly hasStart: boolean; readonly large: boolean }) {
  const { balanceResolution } = plan.job.conditions;
  return (
    <tr className={large ? 'stops' : undefined}>
      <th scope="row">balance gain{plan.job.cylinder.startReading !== null && ' and reading'}</th>
      {hasStart && <td />}
      {plan.steps.map((step) => (
        <td key={step.number}>
          <WorkingFigure className={large ? 'act' : ''} explain={(workings) => workings.explainMass(plan, step)}>
            +{formatMass(step.weighing.readingGain, balanceResolution)}
          </WorkingFigure>
          {step.weighing.reading !== null && <span className="unit">reads {formatMass(step.weighing.reading, balanceResolution)}</span>}
        </td>
      ))}
    </tr>
  );
}

/** The strip temperatures next below and next above the step's own, to show how the stop moves. */
function StripRow({ plan, hasStart }: { readonly plan: Plan; readonly hasStart: boolean }) {
  const neighbours = plan.steps.map((step) => [
    step.strip.filter((point) => point.temperature < step.state.temperature - 0.01).at(-1),
    step.strip.find((point) => point.temperature > step.state.temperature + 0.01),
  ].filter((point) => point !== undefined));
  const common = plan.steps.every((step) => step.state.temperature === plan.steps[0]?.state.temperature);
  const temperatures = (neighbours[0] ?? []).map((point) => formatTemperature(point.temperature)).join(', ');
  return (
    <tr>
      <th scope="row">{common ? `stop at ${temperatures}` : 'stop if colder, if warmer'}</th>
      {hasStart && <td />}
      {plan.steps.map((step, index) => {
        const scale = scaleOf(plan.job, step.gauge, step.state.pressure);
        return (
          <td key={step.number}>
            {neighbours[index]!.map((point) => (
              <span className="pair" key={point.temperature}>
                {pressureNumber(point.pressure, scale)}{!common && <small> at {formatTemperature(point.temperature)}</small>}
              </span>
            ))}
          </td>
        );
      })}
    </tr>
  );
}

function IdealRow({ plan, hasStart }: { readonly plan: Plan; readonly hasStart: boolean }) {
  return (
    <tr>
      <th scope="row">ideal gas would say</th>
      {hasStart && <td />}
      {plan.steps.map((step) => {
        const scale = scaleOf(plan.job, step.gauge, step.state.pressure);
        return (
          <td key={step.number}>
            {step.idealStop === null ? 'no plan' : (
              <WorkingFigure explain={(workings) => workings.explainIdealStop(plan, step)}>
                {pressureNumber(step.idealStop, scale)} <small>{relativePercent(step.idealStop, step.state.pressure)}</small>
              </WorkingFigure>
            )}
          </td>
        );
      })}
    </tr>
  );
}

function GaugeRow({ plan, hasStart }: { readonly plan: Plan; readonly hasStart: boolean }) {
  return (
    <tr>
      <th scope="row">gauge</th>
      {hasStart && <td />}
      {plan.steps.map((step) => {
        const gauge = plan.job.gauges.find((candidate) => candidate.key === step.gauge);
        return <td key={step.number}>{gauge === undefined ? 'none holds it' : gauge.name}</td>;
      })}
    </tr>
  );
}

function Composition({ plan, step }: { readonly plan: Plan; readonly step: PlanStep }) {
  const shown = plan.final.components.filter(({ nominal }) => nominal !== null);
  return (
    <ul className="composition-then">
      {shown.map(({ gas }) => {
        const x = step.state.fractions[plan.job.gases.indexOf(gas)]!;
        return x > 0 && <li key={gas}>{amountText(x, 3)} {gasLabel(gas).formula}</li>;
      })}
    </ul>
  );
}

function PartialPressures({ plan, step }: { readonly plan: Plan; readonly step: PlanStep }) {
  const shown = plan.final.components.filter(({ nominal }) => nominal !== null);
  return (
    <ul className="composition-then">
      {shown.map(({ gas }) => {
        const partial = step.state.fractions[plan.job.gases.indexOf(gas)]! * step.state.pressure;
        return partial > 0 && <li key={gas}>{formatSignificant(fromPascal(partial, 'bar'), 4)} {gasLabel(gas).formula}</li>;
      })}
    </ul>
  );
}

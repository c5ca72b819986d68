import { gasLabel, modelName, STRIP_CELSIUS } from '../../../blending/index.ts';
import type { Finding, Plan, PlanStep } from '../../../blending/index.ts';
import { sheetIdentity } from '../../../state/index.ts';
import { celsius, formatMass, formatTemperature, formatVolume } from '../../../units/index.ts';
import { useWorkspaceState } from '../../bindings/workspace.tsx';
import { amountText, parentName, pressureNumber, scaleLabel, scaleOf } from '../../parts/show.ts';
import { openHolds, standingOverride } from '../checks/override.ts';
import { CAUTIONS } from './cautions.ts';
import { Label } from './Label.tsx';
import { Preparation } from './Preparation.tsx';

/** The page for the fill room. It is always drawn, and seen only on paper. */
export function FillSheet({ program }: { readonly program: string }) {
  const answer = useWorkspaceState((state) => state.answer);
  const recipe = useWorkspaceState((state) => state.recipe);
  const issued = useWorkspaceState((state) => state.issued);
  if (!answer.ok) {
    return <article className="sheet" aria-label="Fill sheet"><h1>Fill sheet</h1><p>{recipe.name}: not planned, nothing to fill from.</p></article>;
  }
  const plan = answer.value;
  const { contentId, revision } = sheetIdentity({ recipe, issued });
  const { thermometer, balance } = recipe.conditions;
  const gauges = recipe.gauges.filter(({ key, calibrated }) => calibrated !== '' && plan.steps.some(({ gauge }) => gauge === key)).map(({ name, calibrated }) => `${name} calibrated ${calibrated}`);
  const instruments = [...gauges, thermometer, balance].filter((words) => words !== '').map((words) => ` · ${words}`).join('');
  return (
    <article className={`sheet ${density(plan)}`} aria-label="Fill sheet">
      <header className="sheet-head">
        <div>
          <h1>Fill sheet</h1>
          <p className="sheet-name">{recipe.name}{recipe.note === '' ? '' : ` · ${recipe.note}`}</p>
        </div>
        <p className="sheet-identity">Recipe {contentId} · revision {revision}</p>
      </header>
      <Holds plan={plan} />
      <OrderAndCylinder plan={plan} />
      <Preparation plan={plan} />
      <Steps plan={plan} />
      <Finished plan={plan} />
      <Label plan={plan} />
      <Findings plan={plan} />
      <section className="sheet-cautions">
        <h2>Cautions</h2>
        <ul>{CAUTIONS.map((caution) => <li key={caution}>{caution}</li>)}</ul>
      </section>
      <section className="sheet-signatures">
        {['Planned by, date', 'Second check, date', 'Filled by, date', 'Leak test, rolling start and end'].map((role) => <p key={role}><span>{role}</span></p>)}
      </section>
      <footer>{program} · real gas: {modelName(plan.job.gases)} · R {plan.gasConstant} J/(mol K){instruments} · barometer {pressureNumber(plan.job.conditions.barometer, { unit: 'hPa', reference: 'absolute', resolution: 1, barometer: plan.job.conditions.barometer })} hPa absolute</footer>
    </article>
  );
}

/** How much smaller everything must be set to stay on one page. The heights are rough, in mm on Letter, the lower paper. */
function density({ job, steps, findings }: Plan): '' | 'dense' | 'dense tight' {
  const holds = findings.filter(({ verdict }) => verdict === 'hold').length;
  const cautions = findings.filter(({ verdict }) => verdict === 'caution').length;
  const height = 16 * steps.length + 5 * job.conditioning.length + 5 * (holds + cautions) + (holds > 0 ? 9 + 7 * holds : 0);
  return height > 180 ? 'dense tight' : height > 115 ? 'dense' : '';
}

function Holds({ plan }: { readonly plan: Plan }) {
  const overrides = plan.job.overrides;
  const holds = plan.findings.filter((finding) => finding.verdict === 'hold');
  if (holds.length === 0) return null;
  const open = openHolds(plan.findings, overrides);
  return (
    <section className="sheet-hold">
      <p className="sheet-hold-title">{open.length > 0 ? '■ HOLD: do not fill from this sheet' : '■ Hold overridden'}</p>
      <ul>
        {holds.map((finding) => {
          const standing = standingOverride(finding, overrides);
          return <li key={finding.id}>{finding.title}.{standing !== null && ` Overridden by ${standing.name}: ${standing.reason}`}</li>;
        })}
      </ul>
    </section>
  );
}

function OrderAndCylinder({ plan }: { readonly plan: Plan }) {
  const { job } = plan;
  const { cylinder, order } = job;
  const scale = scaleOf(job, plan.steps.at(-1)?.gauge ?? null, order.fillPressure);
  const at = (pressure: typeof cylinder.workingPressure) => (pressure === null ? 'not stated' : `${pressureNumber(pressure, scale)} ${scaleLabel(scale)}`);
  return (
    <section className="sheet-top">
      <table>
        <caption>Order</caption>
        <thead><tr><th scope="col">component</th><th scope="col">nominal</th><th scope="col">tolerance</th><th scope="col">as planned</th></tr></thead>
        <tbody>
          {order.components.map((component) => (
            <tr key={component.gas}>
              <th scope="row">{gasLabel(job.gases[component.gas]!).formula} {gasLabel(job.gases[component.gas]!).name}</th>
              <td>{component.isBalance ? 'balance' : amountText(component.nominal, 4)}</td>
              <td>{component.tolerance === null ? '' : `± ${amountText(component.tolerance, 2)} rel.`}</td>
              <td>{amountText(plan.finished.fractions[component.gas]!, 4)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <table>
        <caption>Cylinder</caption>
        <tbody>
          <tr><th scope="row">number</th><td>{cylinder.id === '' ? '' : cylinder.id}</td></tr>
          <tr><th scope="row">water capacity, material</th><td>{formatVolume(cylinder.waterCapacity)}, {cylinder.material}</td></tr>
          <tr><th scope="row">working pressure at {formatTemperature(cylinder.workingPressureTemperature)}</th><td>{at(cylinder.workingPressure)}</td></tr>
          <tr><th scope="row">test pressure</th><td>{at(cylinder.testPressure)}</td></tr>
          <tr><th scope="row">before filling</th><td>{startText(plan)}</td></tr>
          {job.batch.cylinders > 1 && <tr><th scope="row">cylinders</th><td>{job.batch.cylinders} alike, {job.batch.together ? 'together on one manifold' : 'one after another'}</td></tr>}
          <tr><th scope="row">fill to</th><td>{at(order.fillPressure)} at {formatTemperature(order.fillTemperature)} gas temperature</td></tr>
        </tbody>
      </table>
    </section>
  );
}

function startText({ job }: Plan): string {
  const { contents } = job.cylinder;
  if (contents.state === 'not stated') return 'not stated';
  if (contents.state === 'evacuated' && contents.pressure === 0) return 'evacuated';
  const pressure = pressureNumber(contents.pressure, { unit: 'mbar', reference: 'absolute', resolution: 1, barometer: job.conditions.barometer });
  const held = job.gases.flatMap((gas, i) => (contents.fractions[i]! > 0 ? [`${amountText(contents.fractions[i]!, 3)} ${gasLabel(gas).formula}`] : [])).join(', ');
  return contents.state === 'evacuated' ? `evacuated to ${pressure} mbar absolute` : `residual ${pressure} mbar absolute: ${held}`;
}

function Steps({ plan }: { readonly plan: Plan }) {
  const byMass = plan.job.by !== 'pressure';
  return (
    <table className="sheet-steps">
      <caption>Steps</caption>
      <thead>
        <tr>
          <th scope="col" className="parent-head">step, parent</th>
          <th scope="col" className="stop-head">stop</th>
          {byMass && <th scope="col" className="stop-head">balance gain</th>}
          <th scope="col">reading</th>
          <th scope="col">gas °C</th>
          <th scope="col">time</th>
          <th scope="col">initials</th>
        </tr>
      </thead>
      {plan.steps.map((step) => <StepRows key={step.number} plan={plan} step={step} byMass={byMass} />)}
    </table>
  );
}

function StepRows({ plan, step, byMass }: { readonly plan: Plan; readonly step: PlanStep; readonly byMass: boolean }) {
  const scale = scaleOf(plan.job, step.gauge, step.state.pressure);
  const gauge = plan.job.gauges.find((candidate) => candidate.key === step.gauge);
  const { balanceResolution } = plan.job.conditions;
  const lot = useWorkspaceState((state) => state.recipe.parents.find(({ key }) => key === step.parent)?.lot ?? '');
  return (
    <tbody>
      <tr className="sheet-step">
        <th scope="row">{step.number}. {parentName(plan.job, step)}{lot !== '' && <span className="lot">lot {lot}</span>}</th>
        <td className="sheet-figure">
          <strong>{pressureNumber(step.state.pressure, scale)}</strong> {scaleLabel(scale)}
          <span>at {formatTemperature(step.state.temperature)}{gauge === undefined ? '' : `, on ${gauge.name}`}</span>
        </td>
        {byMass && (
          <td className="sheet-figure">
            <strong>+{formatMass(step.weighing.readingGain, balanceResolution)}</strong>
            {step.weighing.reading !== null && <span>reads {formatMass(step.weighing.reading, balanceResolution)}</span>}
          </td>
        )}
        <td /><td /><td /><td />
      </tr>
      {plan.job.by !== 'mass' && (
        <tr className="sheet-strip">
          <td colSpan={byMass ? 7 : 6}>
            <span>stop, {scaleLabel(scale)}, at</span>
            {STRIP_CELSIUS.map((degrees) => {
              const point = step.strip.find(({ temperature }) => celsius(temperature) === degrees);
              return <span key={degrees}>{degrees} °C: <b>{point === undefined ? 'no gas' : pressureNumber(point.pressure, scale)}</b></span>;
            })}
          </td>
        </tr>
      )}
    </tbody>
  );
}

function Finished({ plan }: { readonly plan: Plan }) {
  const scale = scaleOf(plan.job, plan.steps.at(-1)?.gauge ?? null, plan.finished.pressure);
  const pressures = plan.final.developedPressures.map(({ temperature, pressure }) => `${formatTemperature(temperature)}: ${pressureNumber(pressure, scale)}`);
  return (
    <p className="sheet-finished">
      Finished cylinder, {scaleLabel(scale)}: {pressures.join(' · ')}. Gas {formatMass(plan.final.totalMass)}.
    </p>
  );
}

function Findings({ plan }: { readonly plan: Plan }) {
  const shown = plan.findings.filter((finding) => finding.verdict !== 'note');
  const notes = plan.findings.length - shown.length;
  // What was replaced is named on paper even where it changed no verdict.
  const own = plan.findings.find(({ rule, verdict }) => rule === 'laboratory-values' && verdict === 'note');
  return (
    <section className="sheet-findings">
      <h2>Checks</h2>
      <ul>{shown.map((finding) => <li key={finding.id}><FindingLine finding={finding} /></li>)}</ul>
      {own !== undefined && <p>{own.detail}</p>}
      {notes > 0 && <p>and {notes} note{notes === 1 ? '' : 's'}; figures, limits and sources of all checks are on the screen.</p>}
    </section>
  );
}

function FindingLine({ finding }: { readonly finding: Finding }) {
  return <>{finding.verdict === 'hold' ? '■' : '▲'} <strong>{finding.title}.</strong> {finding.remedy}{finding.replaced.length > 0 && ' (judged with the laboratory’s own value)'}</>;
}

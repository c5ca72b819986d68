import { gasLabel, mixingSentence } from '../../../blending/index.ts';
import type { Mixing, MixingSplit, Plan, PlanAnswer, StandardPressure } from '../../../blending/index.ts';
import { editConditions } from '../../../state/index.ts';
import { formatNumber, formatSignificant, formatTemperature } from '../../../units/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { ChoiceField } from '../../parts/Field.tsx';
import { pressureNumber } from '../../parts/show.ts';
import { NotPlanned } from '../plan/NotPlanned.tsx';
import { TwoGasCurves } from './TwoGasCurves.tsx';

/** Entropy and Gibbs energy of mixing, and what they mean at the bench. */
export function MixingView({ answer }: { readonly answer: PlanAnswer }) {
  if (!answer.ok) return <NotPlanned problems={answer.reason.problems} />;
  const plan = answer.value;
  return (
    <>
      <section aria-labelledby="mixing-title">
        <h2 id="mixing-title">Mixing</h2>
        {plan.mixing.ok
          ? <MixingTables plan={plan} mixing={plan.mixing.value} />
          : <p className="problem">{mixingSentence(plan.mixing.reason, (source) => sourceName(plan, source))}</p>}
      </section>
      <TwoGasCurves plan={plan} />
    </>
  );
}

function sourceName(plan: Plan, source: string): string {
  if (source === 'residual') return 'the residual';
  if (source === 'blend') return 'the finished gas';
  return plan.job.parents.find((parent) => parent.key === source)?.name ?? source;
}

function MixingTables({ plan, mixing }: { readonly plan: Plan; readonly mixing: Mixing }) {
  const standard = useWorkspaceState((state) => state.recipe.conditions.standardPressure);
  const actions = useActions();
  const { amount, gibbsEnergy, entropy, enthalpy } = mixing;
  const assumed = mixing.sources.filter((source) => source.assumed);
  return (
    <>
      <p>
        From the parents to the blend, every state at {formatTemperature(mixing.temperature)}:
        mixing runs one way. To take this blend apart again would need at least{' '}
        <strong>{formatSignificant(-gibbsEnergy.ideal / 1000, 3)} kJ</strong> of work for the mixing alone; no valve gives it back.
      </p>
      <table className="rows">
        <thead>
          <tr>
            <th scope="col">of the whole cylinder, {formatSignificant(amount, 4)} mol</th>
            <th scope="col" className="number">mixing, ideal</th>
            <th scope="col" className="number">pressure</th>
            <th scope="col" className="number">real gas</th>
            <th scope="col" className="number">together</th>
          </tr>
        </thead>
        <tbody>
          <SplitRow name="ΔG, kJ" split={gibbsEnergy} by={1000} />
          <SplitRow name="ΔG, J/mol" split={gibbsEnergy} by={amount} />
          <SplitRow name="ΔS, J/K" split={entropy} by={1} />
          <SplitRow name="ΔS, J/(mol K)" split={entropy} by={amount} />
        </tbody>
      </table>
      <p className="hint">
        ΔH is {formatSignificant(enthalpy / 1000, 4)} kJ, {formatSignificant(enthalpy / amount, 4)} J/mol; ΔG = ΔH − TΔS. “Pressure” is the way from each
        parent’s pressure to the blend’s.
        {assumed.length > 0 && ` Pressure not stated, taken as the blend’s: ${assumed.map((source) => sourceName(plan, source.parent ?? 'residual')).join(', ')}.`}
      </p>
      <h3>Chemical potential in the blend, against the standard state</h3>
      <ChoiceField<StandardPressure>
        field="conditions.standardPressure" label="standard pressure p°" value={standard} choices={['1 bar', '1 atm']}
        onChange={(standardPressure) => { actions.run(editConditions({ standardPressure })); }}
      />
      <table className="rows">
        <thead>
          <tr>
            <th scope="col">μ − μ°, kJ/mol</th>
            <th scope="col" className="number">RT ln x</th>
            <th scope="col" className="number">RT ln(p/p°)</th>
            <th scope="col" className="number">RT ln φ</th>
            <th scope="col" className="number">together</th>
          </tr>
        </thead>
        <tbody>
          {mixing.potentials.map((potential) => (
            <tr key={potential.gas}>
              <th scope="row">{gasLabel(plan.job.gases[potential.gas]!).formula}</th>
              {[potential.idealMixing, potential.pressure, potential.realGas, potential.relative].map((value, index) => (
                <td key={index} className="number">{formatNumber(value / 1000, 3)}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      <p className="hint">
        At {pressureNumber(mixing.pressure, { unit: 'bar', reference: 'absolute', resolution: 1000, barometer: plan.job.conditions.barometer })} bar absolute.
        Once mixed, the gas does not settle out again by gravity; it un-mixes only if it condenses.
      </p>
    </>
  );
}

function SplitRow({ name, split, by }: { readonly name: string; readonly split: MixingSplit; readonly by: number }) {
  return (
    <tr>
      <th scope="row">{name}</th>
      {[split.ideal, split.pressure, split.realGas, split.total].map((value, index) => (
        <td key={index} className="number">{formatSignificant(value / by, 4)}</td>
      ))}
    </tr>
  );
}

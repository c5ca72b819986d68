import { useMemo } from 'react';
import type { Plan, TrianglePicture } from '../../../blending/index.ts';
import { parentName } from '../../parts/show.ts';
import { formatSignificant } from '../../../units/index.ts';
import { useRouteTools } from './tools.ts';
import { Triangle } from './Triangle.tsx';

/** Path of the fill through fuel, oxidiser and inert gas; nothing where the two never meet. */
export function TriangleSection({ plan }: { readonly plan: Plan }) {
  const { triangleOf } = useRouteTools();
  const picture = useMemo(() => triangleOf(plan), [triangleOf, plan]);
  if (!picture.ok) {
    return picture.reason.code === 'not-both' ? null : (
      <section><h2>Fuel, oxidiser and inert gas</h2><p className="problem">No table of this program says whether {picture.reason.gas} burns or oxidises: the path is not drawn.</p></section>
    );
  }
  const corner = cornerOf(picture.value);
  return (
    <section aria-labelledby="triangle-title">
      <h2 id="triangle-title">Fuel, oxidiser and inert gas</h2>
      <div className="chart-pair">
        <Triangle picture={picture.value} extent={1} />
        {corner !== null && <Triangle picture={picture.value} extent={corner} />}
      </div>
      <ul className="legend triangle-legend">
        <li><span className="line-key path" /> path of the fill, numbered by step; dotted: towards the gas that streams in</li>
        <li><span className="line-key limit" /> lower flammable limit {percent(picture.value.lowerLimit)} fuel (in air) and limiting oxygen {percent(picture.value.limitingOxygen)}, both at 1 bar absolute</li>
        <li><span className="line-key air" /> mixtures with air; squares: flammable limits on it</li>
        <li><span className="swatch held-swatch" /> mixed states here are held: fuel above {percent(picture.value.held.fuel)} with oxygen above {percent(picture.value.held.oxygen)}</li>
      </ul>
      <p className="hint">
        The limits were measured at 1 bar absolute and widen with pressure; no published table draws the envelope at the pressure of a cylinder, so none is drawn here.
        Inert gases count as nitrogen, oxidisers as oxygen. A path outside the hatched region is not thereby harmless.
      </p>
      <div className="scroll" tabIndex={0} role="group" aria-label="States of the path">
        <table className="rows narrow-table">
          <thead><tr><th scope="col">after step</th><th scope="col" className="number">fuel</th><th scope="col" className="number">oxygen equivalents</th></tr></thead>
          <tbody>
            {picture.value.legs.map(({ step, to }) => (
              <tr key={step}>
                <th scope="row">{step}. {parentName(plan.job, plan.steps[step - 1]!)}</th>
                <td className="number">{percent(to.fuel)}</td>
                <td className="number">{percent(to.oxygen)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}

/** How much of the inert corner to magnify, so that limits and finished gas lie well inside; null: the whole shows them. */
function cornerOf({ legs, lowerLimit, limitingOxygen }: TrianglePicture): number | null {
  const end = legs.at(-1)?.to;
  const needed = 1.25 * Math.max(lowerLimit + 0.02, limitingOxygen + lowerLimit, (end?.fuel ?? 0) + (end?.oxygen ?? 0));
  const nice = [0.05, 0.1, 0.15, 0.2, 0.3, 0.4, 0.5].find((extent) => extent >= needed);
  return nice ?? null;
}

function percent(share: number): string {
  return `${formatSignificant(100 * share, 3)} %`;
}

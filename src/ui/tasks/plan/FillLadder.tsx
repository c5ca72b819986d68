import { lazy, Suspense } from 'react';
import type { GasId, Plan } from '../../../blending/index.ts';
import { fromPascal } from '../../../units/index.ts';
import { gasLabel } from '../../../blending/index.ts';
import { GasSwatch } from '../../parts/GasPattern.tsx';
import type { LadderBar, LadderLimit } from '../../charts/FillLadderChart.tsx';

const FillLadderChart = lazy(() => import('../../charts/FillLadderChart.tsx'));

/** Fractions below this make no visible band; they are named in the finished gas instead. */
const VISIBLE = 1e-5;
/** A stop below this part of the scale is drawn again in the magnified strip. */
const SMALL = 0.06;
const LADDER_HEIGHT = 250;
const STRIP_HEIGHT = 64;

interface FillLadderProps {
  readonly plan: Plan;
  readonly columnWidth: number;
  readonly hasStart: boolean;
}

/** The picture of the plan: one bar a step, built up gas by gas, limits across all columns. */
export function FillLadder({ plan, columnWidth, hasStart }: FillLadderProps) {
  const { job } = plan;
  const states = [...(hasStart ? [plan.start] : []), ...plan.steps.map((step) => step.state)];
  const gases = job.gases.filter((_, i) => states.some((state) => state !== null && state.fractions[i]! >= VISIBLE));
  const bars = states.map((state, column): LadderBar => ({
    column: String(column),
    parts: state === null ? {} : Object.fromEntries(gases.map((gas) =>
      [gas, fromPascal(state.fractions[job.gases.indexOf(gas)]! * state.pressure, 'bar')])),
  }));
  const highest = Math.max(...states.map((state) => (state === null ? 0 : fromPascal(state.pressure, 'bar'))));
  const limits = limitsOf(plan).filter(({ value }) => value <= 1.35 * highest);
  const top = 1.06 * Math.max(highest, ...limits.map(({ value }) => value));
  const small = bars.map((bar) => (sum(bar) > 0 && sum(bar) < SMALL * highest ? bar : { ...bar, parts: {} }));
  const smallTop = Math.max(0, ...small.map(sum));
  const width = columnWidth * states.length;
  return (
    <>
      <div className="ladder-row" style={{ gridTemplateColumns: `var(--row-names) ${String(width)}px` }}>
        <div className="ladder-names">
          <Legend gases={gases} />
          <p className="hint">Partial pressures, bar absolute</p>
          {limits.map((limit) => <p className="hint limit" key={limit.name}>– – {limit.name}</p>)}
        </div>
        <div className="ladder-picture" style={{ height: LADDER_HEIGHT }} role="img" aria-label={describe(plan)}>
          <Suspense fallback={null}>
            <FillLadderChart picture="ladder" gases={gases} bars={bars} limits={limits} top={top} width={width} height={LADDER_HEIGHT} />
          </Suspense>
        </div>
      </div>
      {smallTop > 0 && (
        <div className="ladder-row strip" style={{ gridTemplateColumns: `var(--row-names) ${String(width)}px` }}>
          <p className="ladder-names hint">small steps, {String(Math.round(top / (1.06 * smallTop)))} times larger</p>
          <div className="ladder-picture" style={{ height: STRIP_HEIGHT }} aria-hidden="true">
            <Suspense fallback={null}>
              <FillLadderChart picture="strip" gases={gases} bars={small} limits={[]} top={1.06 * smallTop} width={width} height={STRIP_HEIGHT} />
            </Suspense>
          </div>
        </div>
      )}
    </>
  );
}

function Legend({ gases }: { readonly gases: readonly GasId[] }) {
  return (
    <ul className="legend">
      {gases.map((gas) => (
        <li key={gas}><GasSwatch gas={gas} picture="legend" /> {gasLabel(gas).formula}</li>
      ))}
    </ul>
  );
}

function limitsOf({ job }: Plan): LadderLimit[] {
  const { workingPressure, testPressure } = job.cylinder;
  const bar = (name: string, pressure: number | null): LadderLimit[] =>
    pressure === null ? [] : [{ name: `${name} ${fromPascal(pressure, 'bar').toFixed(0)} bar absolute`, value: fromPascal(pressure, 'bar') }];
  return [...bar('working pressure', workingPressure), ...bar('test pressure', testPressure)];
}

function sum(bar: LadderBar): number {
  return Object.values(bar.parts).reduce((total, part) => total + part, 0);
}

function describe(plan: Plan): string {
  const stops = plan.steps.map((step) => `${(step.state.pressure / 1e5).toFixed(2)} bar absolute`);
  return `Fill ladder: the pressure rises in ${String(stops.length)} steps to ${stops.join(', ')}.`;
}

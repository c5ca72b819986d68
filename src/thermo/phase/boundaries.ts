/**
 * Every edge of the two-phase region along a path, the retrograde ones included: a
 * compressed gas may condense, and take the liquid up again at a higher pressure.
 */
import { fail, ok } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { Composition, ThermoModel, ThermoReason } from '../contract.ts';
import { refine, sampler } from './crossing.ts';
import type { Path, Sample } from './crossing.ts';
import { dewPoint, dewPressure, dewTemperature } from './dew.ts';
import type { DewPoint, DewReason } from './dew.ts';
import { ExcessFollower } from './excess.ts';

/** An edge of the two-phase region, met in the direction of the walk. */
export interface Boundary extends DewPoint {
  readonly kind: 'enters' | 'leaves';
}

/** Edges are sought with this step in ln p and ln T, and not more of them than this. */
const PRESSURE_STEP = 0.1;
const TEMPERATURE_STEP = 0.01;
const MOST_EDGES = 6;

/** The edges at T as p (absolute) rises from low pressure to `highest`; empty when the gas stays one phase. */
export function boundariesOfPressure(model: ThermoModel, temperature: Kelvin, x: Composition, highest: Pascal): Outcome<Boundary[], ThermoReason> {
  const path: Path = (u) => ok({ temperature, pressure: Math.exp(u) });
  return edges(model, x, path, dewPressure(model, temperature, x, { highest }), ({ pressure }) => Math.log(pressure), Math.log(highest), PRESSURE_STEP);
}

/** The edges at p (absolute) as the gas cools to `coldest`; empty when it stays one phase. */
export function boundariesOfTemperature(model: ThermoModel, pressure: Pascal, x: Composition, coldest: Kelvin): Outcome<Boundary[], ThermoReason> {
  const path: Path = (u) => ok({ temperature: Math.exp(-u), pressure });
  return edges(model, x, path, dewTemperature(model, pressure, x, coldest), ({ temperature }) => -Math.log(temperature), -Math.log(coldest), TEMPERATURE_STEP);
}

function edges(
  model: ThermoModel, x: Composition, path: Path, first: Outcome<DewPoint, DewReason>, place: (point: DewPoint) => number, end: number, step: number,
): Outcome<Boundary[], ThermoReason> {
  if (!first.ok) {
    if (first.reason.code === 'no-dew-point') return ok([]);
    return first.reason.code === 'unstable-from-the-start' ? fail({ code: 'not-converged', iterations: 0, residual: 0 }) : fail(first.reason);
  }
  const found: Boundary[] = [{ ...first.value, kind: 'enters' }];
  const sample = sampler(new ExcessFollower(model, x, true), path);
  const start = sample(place(first.value) + step / 100);
  if (!start.ok) return start;
  let here: Sample = start.value;
  while (here.u < end && found.length < MOST_EDGES) {
    const next = sample(Math.min(end, here.u + step));
    if (!next.ok) return next;
    if (isInside(here) !== isInside(next.value)) {
      const edge = isInside(here) ? refine(sample, next.value, here) : refine(sample, here, next.value);
      if (!edge.ok) return edge;
      const point = dewPoint(edge.value);
      if (!point.ok) return point;
      found.push({ ...point.value, kind: isInside(here) ? 'leaves' : 'enters' });
    }
    here = next.value;
  }
  return ok(found);
}

function isInside({ excess }: Sample): boolean {
  return excess > 0;
}

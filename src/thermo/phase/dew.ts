/**
 * Dew points: where a gas begins to condense as its pressure rises, as it cools at
 * constant pressure, or as it cools in a closed cylinder. Every answer is checked by
 * a full stability test just on the gas side.
 */
import { fail, kelvin, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { Composition, ThermoModel, ThermoReason } from '../contract.ts';
import { firstCrossing, refine, sampler } from './crossing.ts';
import type { Path, Sample, Walk } from './crossing.ts';
import { ExcessFollower } from './excess.ts';
import type { Incipient } from './incipient.ts';
import { testStability } from './stability.ts';
import { lnWilsonRatio } from './starts.ts';

/** A state of a gas at which another phase begins to form. */
export interface DewPoint {
  readonly temperature: Kelvin;
  /** Absolute. */
  readonly pressure: Pascal;
  /** Density of the gas, mol/m³. */
  readonly density: number;
  readonly incipient: Incipient;
}

/** Why there is no dew point to give. */
export type DewReason =
  | ThermoReason
  /** The gas stays one phase all over what was searched: up to `pressure`, or down to `temperature`. */
  | { readonly code: 'no-dew-point'; readonly searchedTo: number }
  /** Another phase forms already where the search begins. */
  | { readonly code: 'unstable-from-the-start'; readonly at: number };

/** Pressures are searched up to here: the end of the extended range of GERG-2008, Pa absolute. */
export const HIGHEST_PRESSURE = 70e6;
/** Temperatures are searched down to here, K: colder than any store or transport. */
export const COLDEST = 150;
/** The gas side of a crossing is tested this far before it, in ln p or ln T. */
const JUST_BEFORE = 1e-4;

/** Where a search for a dew pressure ends, and may begin; absolute. */
export interface DewSearch {
  readonly highest?: Pascal;
  /** A pressure at which the gas is thought to be one phase, such as its dew pressure at a lower temperature. */
  readonly from?: Pascal;
}

/**
 * Dew pressure at T: the first crossing as p rises from low pressure, absolute.
 * Fails with `no-dew-point` when the gas stays one phase up to `highest` (default:
 * `HIGHEST_PRESSURE`).
 */
export function dewPressure(model: ThermoModel, temperature: Kelvin, x: Composition, search: DewSearch = {}): Outcome<DewPoint, DewReason> {
  const path: Path = (u) => ok({ temperature, pressure: Math.exp(u) });
  const highest = search.highest ?? HIGHEST_PRESSURE;
  const to = Math.log(highest);
  const raoult = lnRaoultPressure(model, temperature, x) - 1;
  const begin = Math.min(search.from === undefined ? raoult : Math.max(raoult, Math.log(search.from)), to - 0.5);
  // Below about a pascal every gas here is one phase.
  const backwards = [begin, Math.min(begin, raoult), ...[2, 4, 6, 8].map((decline) => Math.min(begin, raoult) - decline), 0];
  return checkedCrossing(model, x, path, { from: backwards, to, shortest: 0.01, longest: 0.4 }, highest);
}

/**
 * Dew temperature at p (absolute): the crossing of highest T, met on cooling from a
 * temperature at which the gas is one phase. Fails with `no-dew-point` when it stays
 * one phase down to `coldest`.
 */
export function dewTemperature(
  model: ThermoModel, pressure: Pascal, x: Composition, coldest: Kelvin = kelvin(COLDEST),
): Outcome<DewPoint, DewReason> {
  const path: Path = (u) => ok({ temperature: Math.exp(-u), pressure });
  const to = -Math.log(coldest);
  const begin = Math.min(-Math.log(1.1 * raoultTemperature(model, pressure, x)), to - 0.05);
  const backwards = [0, 0.1, 0.2, 0.4, 0.7, 1].map((warmer) => begin - warmer);
  return checkedCrossing(model, x, path, { from: backwards, to, shortest: 0.0005, longest: 0.04 }, coldest);
}

/**
 * The highest temperature below `from` at which a gas that cools along a path of
 * pressures (Pa absolute by T), such as that of a closed cylinder, begins to
 * condense. Fails with `no-dew-point` when it stays one phase down to `coldest`, and
 * with `unstable-from-the-start` when it does not even begin as one.
 */
export function dewOnCooling(
  model: ThermoModel, pressureAt: (temperature: Kelvin) => Outcome<Pascal, ThermoReason>, x: Composition,
  from: Kelvin, coldest: Kelvin = kelvin(COLDEST),
): Outcome<DewPoint, DewReason> {
  const path: Path = (u) => {
    const temperature = kelvin(Math.exp(-u));
    const pressure = pressureAt(temperature);
    return pressure.ok ? ok({ temperature, pressure: pressure.value }) : pressure;
  };
  return checkedCrossing(model, x, path, { from: [-Math.log(from)], to: -Math.log(coldest), shortest: 0.0005, longest: 0.03 }, coldest);
}

/** A walk with its beginning still to be chosen: the first of `from` where the gas is stable. */
interface Search extends Omit<Walk, 'start'> {
  readonly from: readonly number[];
}

/** The first crossing of a walk, tested on its gas side by every start of the stability test. */
function checkedCrossing(model: ThermoModel, x: Composition, path: Path, search: Search, searchedTo: number): Outcome<DewPoint, DewReason> {
  const sample = sampler(new ExcessFollower(model, x), path);
  const start = firstStable(sample, search.from);
  if (!start.ok) return start;
  const crossing = firstCrossing(sample, { ...search, start: start.value });
  if (!crossing.ok) return crossing;
  const found = crossing.value;
  if (found === null) return fail({ code: 'no-dew-point', searchedTo });
  const earlier = isUnstable(model, x, path, found.u - JUST_BEFORE);
  if (!earlier.ok) return earlier;
  if (!earlier.value) return dewPoint(found);
  const first = firstUnstable(model, x, path, start.value.u, found.u - JUST_BEFORE);
  return first.ok ? dewPoint(first.value) : first;
}

/** The first of these places where the gas is stable as far as the phases followed tell. */
function firstStable(sample: (u: number) => Outcome<Sample, ThermoReason>, places: readonly number[]): Outcome<Sample, DewReason> {
  let last = 0;
  for (const place of places) {
    const tried = sample(place);
    if (!tried.ok) return tried;
    if (tried.value.excess < 0) return ok(tried.value);
    last = tried.value.temperature;
  }
  return fail({ code: 'unstable-from-the-start', at: last });
}

/** A sample as a dew point. */
export function dewPoint({ temperature, pressure, density, incipient, excess }: Sample): Outcome<DewPoint, ThermoReason> {
  if (density === null || incipient === null) return fail({ code: 'not-converged', iterations: 0, residual: Math.abs(excess) });
  return ok({ temperature: kelvin(temperature), pressure: pascal(pressure), density, incipient });
}

/** Whether the gas is unstable at a place of the path, whichever phase it would form. */
function isUnstable(model: ThermoModel, x: Composition, path: Path, u: number): Outcome<boolean, ThermoReason> {
  const place = path(u);
  if (!place.ok) return place;
  const test = testStability(model, kelvin(place.value.temperature), pascal(place.value.pressure), x);
  if (test.ok) return ok(!test.value.stable);
  return test.reason.code === 'no-gas-root' ? ok(true) : test;
}

/** Halves the path by full stability tests, then follows the phase that comes first. */
function firstUnstable(model: ThermoModel, x: Composition, path: Path, from: number, to: number): Outcome<Sample, ThermoReason> {
  let low = from, high = to;
  for (let step = 0; step < 40 && high - low > JUST_BEFORE; step++) {
    const middle = (low + high) / 2;
    const unstable = isUnstable(model, x, path, middle);
    if (!unstable.ok) return unstable;
    if (unstable.value) high = middle;
    else low = middle;
  }
  const sample = sampler(new ExcessFollower(model, x), path);
  const above = sample(high);
  if (!above.ok) return above;
  const below = sample(low);
  if (!below.ok) return below;
  return below.value.excess < 0 && above.value.excess >= 0 ? refine(sample, below.value, above.value) : above;
}

/** ln of the pressure at which the gas would condense by Raoult's law with Wilson's vapour pressures; high where nothing condenses. */
function lnRaoultPressure({ gases }: ThermoModel, temperature: Kelvin, x: Composition): number {
  const sum = gases.reduce((total, gas, i) => total + x[i]! * Math.exp(-lnWilsonRatio(gas, temperature, 1)), 0);
  return -Math.log(sum);
}

/** Temperature at which the gas would condense at p by the same rule, K. */
function raoultTemperature(model: ThermoModel, pressure: Pascal, x: Composition): number {
  let low = 20, high = 1000;
  for (let step = 0; step < 30; step++) {
    const middle = Math.sqrt(low * high);
    if (lnRaoultPressure(model, kelvin(middle), x) < Math.log(pressure)) low = middle;
    else high = middle;
  }
  return high;
}

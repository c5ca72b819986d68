/**
 * How far a gas is past the edge of its stability: s = −tpd of the phase that would
 * form, below zero while the gas is stable, zero at a dew point, above it inside the
 * two-phase region. s is a smooth function of T and p as long as one phase is followed.
 */
import { ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { Composition, ThermoModel, ThermoReason } from '../contract.ts';
import { iceExcess, iceOf } from './ice.ts';
import type { Incipient } from './incipient.ts';
import { referenceAt } from './reference.ts';
import type { Reference } from './reference.ts';
import { liquidStarts, vapourStarts } from './starts.ts';
import type { Start } from './starts.ts';
import { findStationary } from './stationary.ts';
import type { Stationary } from './stationary.ts';

/** One point of a path through T and p. */
export interface ExcessPoint {
  /** K. */
  readonly temperature: number;
  /** Pa, absolute. */
  readonly pressure: number;
  /** s; −∞ where no other phase exists, +∞ where the gas has no root any more. */
  readonly excess: number;
  readonly incipient: Incipient | null;
  /** mol/m³; null where there is no gas. */
  readonly density: number | null;
}

/** All starts are tried again after so many points. */
const RENEWAL = 4;
/** Phases whose compositions differ by less than this in every fraction are followed as one. */
const ALIKE = 1e-4;

/** Evaluates s along a path and follows the phases it has found from point to point. */
export class ExcessFollower {
  readonly #model: ThermoModel;
  readonly #x: Composition;
  readonly #anyRoot: boolean;
  #followed: readonly Stationary[] = [];
  #calls = 0;

  /** `anyRoot`: the state is what has the lower Gibbs energy, gas or liquid, and lighter phases are sought too. */
  constructor(model: ThermoModel, x: Composition, anyRoot = false) {
    this.#model = model;
    this.#x = x;
    this.#anyRoot = anyRoot;
  }

  /** s at T (K) and p (Pa, absolute). Fails with what is wrong with the input, or with what the model says. */
  at(temperature: number, pressure: number): Outcome<ExcessPoint, ThermoReason> {
    const reference = referenceAt(this.#model, temperature, pressure, this.#x, this.#anyRoot);
    if (!reference.ok) {
      if (reference.reason.code !== 'no-gas-root' && reference.reason.code !== 'equation-breaks-down') return reference;
      return ok({ temperature, pressure, excess: Infinity, incipient: null, density: null });
    }
    this.#search(reference.value);
    const best = this.#followed.reduce<Stationary | null>((least, each) => (least === null || each.distance < least.distance ? each : least), null);
    const ice = iceExcess(reference.value);
    const point = { temperature, pressure, density: reference.value.density };
    if (best !== null && -best.distance >= ice) {
      return ok({ ...point, excess: -best.distance, incipient: { phase: 'fluid', composition: best.composition } });
    }
    return ok({ ...point, excess: ice, incipient: ice === -Infinity ? null : iceOf(reference.value) });
  }

  /** Follows the known phases to this reference; now and then, and where none is left, looks for new ones. */
  #search(reference: Reference): void {
    const renew = this.#calls++ % RENEWAL === 0;
    const followed = run(reference, this.#followed, []);
    this.#followed = followed.length > 0 && !renew ? followed : run(reference, this.#starts(reference), followed);
  }

  #starts(reference: Reference): Start[] {
    return this.#anyRoot ? [...liquidStarts(reference), ...vapourStarts(reference)] : liquidStarts(reference);
  }
}

/** The other phases found from these starts beside those known, each once. */
function run(reference: Reference, starts: readonly Start[], known: readonly Stationary[]): Stationary[] {
  const found = [...known];
  for (const start of starts) {
    const search = findStationary(reference, start, 'crossing');
    if (!search.ok || search.value.kind !== 'other phase') continue;
    const { composition } = search.value;
    if (!found.some((other) => composition.every((w, i) => Math.abs(w - other.composition[i]!) < ALIKE))) found.push(search.value);
  }
  return found;
}

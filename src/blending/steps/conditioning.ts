import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { JobConditioning, JobParent } from '../recipe/job.ts';
import { amountToReach, cylinderVolume, settle, totalAmount } from './cylinder.ts';
import type { Vessel } from './cylinder.ts';
import { unitDensity } from './unit-density.ts';

/** What one act did to the contents. */
export interface ConditionedStep {
  /** Index of the act in the list. */
  readonly step: number;
  /** Cycles of a purge; 0 otherwise. */
  readonly cycles: number;
  /** Absolute, after the act. */
  readonly pressure: Pascal;
  /** Part of the gas now in the cylinder that was there before all conditioning, mol/mol; 0 where nothing was. */
  readonly oldGas: number;
  /** What the ideal-gas rule (p_low/p_high)ⁿ says is left of the old gas by this act alone; null when it is not a purge or there was none. */
  readonly byRule: number | null;
  /** Purge gas used, mol. */
  readonly purgeGas: number;
  /** Contents before the act, mol. */
  readonly before: Float64Array;
  /** The same at the upper pressure of the first cycle of a purge; null without one. */
  readonly atHigh: Float64Array | null;
}

export interface Conditioned {
  readonly steps: readonly ConditionedStep[];
  /** Contents afterwards, mol, aligned with `model.gases`. */
  readonly contents: Float64Array;
}

/** Why conditioning cannot be computed. */
export type ConditioningProblem =
  /** The wanted level is not reached in any sensible number of cycles: the two pressures are too close. `oldGas` as in `ConditionedStep`. */
  | { readonly code: 'purge-never-ends'; readonly step: number; readonly cycles: number; readonly oldGas: number }
  | ThermoReason;

const MOST_CYCLES = 100;

/**
 * Follows the contents of the cylinder through its conditioning, with full
 * mixing in each cycle and nothing given off by the wall: letting out and
 * pumping keep the composition, a purge gas comes on top, in an evacuated
 * cylinder too. An act that asks for a pressure at or above the one there
 * changes nothing; what leaves nothing in the cylinder is left out.
 *
 * `found` is what is in the cylinder before, mol; everything is at `temperature`.
 */
export function conditionCylinder(
  model: ThermoModel, vessel: Vessel, acts: readonly JobConditioning[], parents: readonly JobParent[],
  found: Float64Array, temperature: Kelvin,
): Outcome<Conditioned, ConditioningProblem> {
  let contents = found;
  /** Part of the contents that was there before. */
  let oldGas = totalAmount(found) > 0 ? 1 : 0;
  const steps: ConditionedStep[] = [];
  for (const [step, act] of acts.entries()) {
    if (act.kind === 'free') continue;
    const before = contents;
    const oldBefore = oldGas;
    let atHigh: Float64Array | null = null;
    let cycles = 0;
    let purgeGas = 0;
    if (act.kind === 'lower') {
      const lower = loweredTo(model, vessel, contents, act.to, temperature);
      if (!lower.ok) return lower;
      contents = lower.value;
    } else {
      const { fractions } = parents[act.parent]!;
      const most = act.cycles ?? MOST_CYCLES;
      const enough = (): boolean => act.cycles === null && oldGas <= (act.wanted ?? 0);
      const first = loweredTo(model, vessel, contents, act.low, temperature);
      if (!first.ok) return first;
      contents = first.value;
      while (cycles < most && !enough()) {
        const added = amountToReach(model, vessel, contents, fractions, act.high, temperature);
        if (!added.ok) return added;
        const held = totalAmount(contents);
        oldGas *= held / (held + added.value);
        purgeGas += added.value;
        const full: Float64Array = contents.map((amount, i) => amount + added.value * fractions[i]!);
        atHigh ??= full;
        const lower = loweredTo(model, vessel, full, act.low, temperature);
        if (!lower.ok) return lower;
        contents = lower.value;
        cycles += 1;
      }
      if (act.cycles === null && !enough()) return fail({ code: 'purge-never-ends', step, cycles, oldGas });
    }
    if (totalAmount(contents) === 0) continue;
    const state = settle(model, vessel, contents, temperature);
    if (!state.ok) return state;
    steps.push({
      step, cycles, pressure: pascal(state.value.pressure), oldGas, purgeGas, before, atHigh,
      byRule: act.kind === 'purge' && oldBefore > 0 ? (act.low / act.high) ** cycles : null,
    });
  }
  return ok({ steps, contents });
}

/** The contents let out or pumped down to an absolute pressure, same composition; unchanged where they are below it. */
function loweredTo(
  model: ThermoModel, vessel: Vessel, contents: Float64Array, to: Pascal, temperature: Kelvin,
): Outcome<Float64Array, ThermoReason> {
  const total = totalAmount(contents);
  if (total === 0) return ok(contents);
  const fractions = contents.map((amount) => amount / total);
  const density = unitDensity(model, temperature, to, fractions);
  if (!density.ok) return density;
  const left = density.value * cylinderVolume(vessel, to, temperature);
  return ok(left >= total ? contents : fractions.map((x) => x * left));
}

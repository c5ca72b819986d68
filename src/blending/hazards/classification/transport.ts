import type { UncheckedPlan } from '../../plan/plan.ts';
import { airEntry, mixtureEntry, singleEntry } from '../data/transport-entries.ts';
import type { TransportEntry } from '../data/transport-entries.ts';
import { toxicLoad } from '../rules/hazard-zone.ts';
import { isOrdered } from '../rules/largest-content.ts';
import { flammableRow } from '../data/flammable-gases.ts';
import { oxidiserRow } from '../data/oxidising-gases.ts';
import { oxidisingAbovePercent } from '../iso10156.ts';
import { valueIn } from '../../values/value.ts';
import type { Criteria } from './criteria.ts';
import { airOxygenFrom } from './limits.ts';

/** Which entry of the list of dangerous goods a gas would come under, and the gases to name beside it. */
export interface TransportChoice {
  readonly entry: TransportEntry;
  /** `single` and `air` have entries of their own; `mixture` is one of the collective entries. */
  readonly kind: 'single' | 'air' | 'mixture';
  readonly liquefied: boolean;
  /** The gases to name, at most two, those that make the class first. */
  readonly technicalNames: readonly string[];
}

/** Content from which the one ordered gas is called by its own name (own choice). */
const singleFrom = 0.99;
/** What air may hold beside oxygen and nitrogen, mostly argon (own choice). */
const restOfAir = 0.015;

/**
 * The entry for a finished gas whose hazards are all judged; null when none
 * covers them together. Precedence: toxic (2.3) before flammable (2.1) before 2.2.
 */
export function chooseEntry(plan: UncheckedPlan, criteria: Criteria): TransportChoice | null {
  const { gases } = plan.job;
  const x = plan.finished.fractions;
  const hazards = {
    toxic: criteria.toxic === 'yes',
    // Toxic mixtures of ammonia follow its own entry, which is without 2.1.
    flammable: criteria.flammable === 'yes' && !criteria.ammoniaOnly,
    oxidising: criteria.oxidising === 'yes',
    corrosive: criteria.corrosive,
    liquefied: criteria.liquefied,
  };
  const ordered = gases.filter((_, i) => isOrdered(plan, i));
  const only = ordered.length === 1 ? ordered[0] : undefined;
  const single = only !== undefined && (x[gases.indexOf(only)] ?? 0) >= singleFrom ? singleEntry(only) : undefined;
  if (only !== undefined && single) return { entry: single, kind: 'single', liquefied: criteria.liquefied, technicalNames: [only] };
  if (isAir(plan) && !hazards.toxic && !hazards.oxidising) {
    return { entry: airEntry, kind: 'air', liquefied: false, technicalNames: [] };
  }
  const entry = mixtureEntry(hazards);
  return entry && { entry, kind: 'mixture', liquefied: criteria.liquefied, technicalNames: technicalNames(plan, hazards) };
}

function isAir({ job, finished }: UncheckedPlan): boolean {
  const content = (gas: string): number => finished.fractions[(job.gases as readonly string[]).indexOf(gas)] ?? 0;
  const onlyAir = job.order.components.every(({ gas }) => ['oxygen', 'nitrogen', 'argon'].includes(job.gases[gas]!));
  const oxygen = content('oxygen') * 100;
  return onlyAir && oxygen >= valueIn(job.values, airOxygenFrom) && oxygen <= valueIn(job.values, oxidisingAbovePercent)
    && content('oxygen') + content('nitrogen') >= 1 - restOfAir;
}

function technicalNames(
  plan: UncheckedPlan, { toxic, flammable, oxidising }: { readonly toxic: boolean; readonly flammable: boolean; readonly oxidising: boolean },
): readonly string[] {
  const { gases, values } = plan.job;
  const load = toxicLoad(plan).over;
  const weights = gases.map((gas, i) => {
    const content = plan.finished.fractions[i] ?? 0;
    if (toxic) return content * (load[i] ?? 0);
    if (flammable) return flammableRow(gas, values) ? content : 0;
    if (oxidising) return oxidiserRow(gas, values) ? content : 0;
    return content;
  });
  const byWeight = gases.map((gas, i) => ({ gas, weight: weights[i]!, content: plan.finished.fractions[i] ?? 0 }));
  const hazardous = byWeight.filter((each) => each.weight > 0).sort((a, b) => b.weight - a.weight);
  const rest = byWeight.filter((each) => each.weight <= 0 && each.content > 0).sort((a, b) => b.content - a.content);
  return [...hazardous, ...rest].slice(0, 2).map((each) => each.gas);
}

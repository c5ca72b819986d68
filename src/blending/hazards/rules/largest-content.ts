import type { UncheckedPlan } from '../../plan/plan.ts';
import { worstCase } from '../worst-case.ts';

/** Largest amount fraction that the gas at an index of `Job.gases` may have in the finished gas within the ordered tolerances. */
export function largestContent(plan: UncheckedPlan, gas: number): number {
  const { gases } = plan.job;
  return worstCase(plan, { over: gases.map((_, i) => (i === gas ? 1 : 0)), under: gases.map(() => 1) }).value;
}

/** Whether a gas of the job stands in the order, with more than nothing of it. */
export function isOrdered(plan: UncheckedPlan, gas: number): boolean {
  return plan.job.order.components.some((component) => component.gas === gas && (component.isBalance || component.nominal > 0));
}

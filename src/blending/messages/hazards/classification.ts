import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences about the class of the finished gas, and of toxic gases. */

/** What was done where a coefficient is missing, remembered or a tolerance not stated, with what is taken for it; empty when nothing. */
export function assumptions(standIns: readonly string[], tolerance: string | null): string {
  const parts: string[] = [];
  if (standIns.length > 0) {
    parts.push(` Coefficient missing or from memory, replaced by a cautious one: ${standIns.join(', ')}.`);
  }
  if (tolerance !== null) parts.push(` Components without a stated tolerance are taken at ±${tolerance}.`);
  return parts.join('');
}

export const flammable = (nominal: string, worst: string, limit: string | null, assumed: string): Words => ({
  title: `Finished gas is flammable in air: sum ${nominal}`,
  detail: `Above 1 it is treated as flammable; highest within the tolerance ${worst}.${limit === null ? '' : ` Lower flammable limit in air about ${limit}.`}${assumed} Valid at atmospheric pressure only.`,
  remedy: 'Label and store as flammable gas; keep away from ignition sources when the gas is let out.',
});

export const perhapsFlammable = (nominal: string, worst: string, assumed: string): Words => ({
  title: `Finished gas may be flammable in air: sum up to ${worst}`,
  detail: `As planned, with the standard's own coefficients, ${nominal}; on the cautious side it exceeds 1.${assumed} Valid at atmospheric pressure only.`,
  remedy: 'Treat and label it as flammable, or lower the content or narrow the tolerance.',
});

export const notFlammable = (nominal: string, worst: string, assumed: string): Words => ({
  title: `Finished gas not above the flammability limit: sum ${nominal}`,
  detail: `Highest within the tolerance ${worst}.${assumed} Valid at atmospheric pressure only; it says nothing about the states during the fill.`,
  remedy: '',
});

export const leanInOxidiser = (share: string): Words => ({
  title: `Fuel in the finished gas is ${share} of its lower flammable limit`,
  detail: 'The gas brings its own oxidiser, so the test for mixtures with inert gas does not apply; with this little fuel no addition of air or oxygen reaches the limit at atmospheric pressure.',
  remedy: '',
});

export const outsideFlammabilityTest = (share: string): Words => ({
  title: 'Flammability of the finished gas not covered by the calculation',
  detail: `Fuel (${share} of its lower flammable limit) and oxidiser are in it together, which the calculation leaves out.`,
  remedy: 'See the check on fuel with oxidiser; a test or a published limit for this mixture decides its class.',
});

export const classNotComputed = (what: string, code: string): Words => ({
  title: `${what} not computed`,
  detail: becauseOf(code),
  remedy: 'Treat the gas as belonging to the more hazardous class until someone with the data has judged it.',
});

export const oxidising = (nominal: string, worst: string, limit: string, assumed: string): Words => ({
  title: `Oxidising power of the finished gas ${nominal}`,
  detail: `More oxidising than air from ${limit} on; highest within the tolerance ${worst}.${assumed}`,
  remedy: 'Label as oxidising gas; keep valve and fittings free of oil and grease.',
});

export const notOxidising = (nominal: string, worst: string, limit: string, assumed: string): Words => ({
  title: `Oxidising power of the finished gas ${nominal}`,
  detail: `Not above ${limit}; highest within the tolerance ${worst}.${assumed}`,
  remedy: '',
});

export const outsideOxidisingTest = (figure: string): Words => ({
  title: `Oxidising power of the finished gas not covered by the calculation`,
  detail: `The formula gives ${figure}, but fuel is present beyond a trace and the formula does not cover that.`,
  remedy: 'See the check on fuel with oxidiser; a test decides the class.',
});

export const toxicMixture = (names: string, mixture: string, gases: string, words: string): Words => ({
  title: `Toxic component: ${names}`,
  detail: `${words} Finished gas: ${mixture}; ${gases}. LC50 (rat, 1 h) from memory; verify before classing. Exposure limits at work are far lower than these figures.`,
  remedy: 'Fill under extraction with a gas detector for each component; class, valve and packaging follow the mixture LC50.',
});

export const toxicUnknown = (names: string): Words => ({
  title: `Harmful component without an LC50 here: ${names}`,
  detail: 'It is poisonous, or harms over time, and this program has no LC50 for it: the LC50 of the finished gas, where one is given, leaves it out.',
  remedy: 'Take class, limits and precautions from its safety data sheet; fill under extraction.',
});

export const toxicTrace = (mixture: string, gases: string): Words => ({
  title: 'Trace of a toxic gas',
  detail: `${gases}. Finished gas: ${mixture}, from memory.`,
  remedy: '',
});

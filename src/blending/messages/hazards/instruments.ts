import type { Words } from './words.ts';

/** Sentences about gauges, balance and supply. */

export const noGauge = (step: number, figure: string): Words => ({
  title: `No gauge holds the stop of step ${step}`,
  detail: `The stop is ${figure}; the scale of every gauge chosen or listed ends below it.`,
  remedy: 'Add a gauge with a longer scale, or lower the fill pressure.',
});

export const gaugeCannotMeet = (step: number, gauge: string, figure: string, limit: string): Words => ({
  title: `Gauge too coarse for step ${step}: the rise is known to ${figure}`,
  detail: `${gauge} gives this standard uncertainty; the tolerance of the component is ${limit}.`,
  remedy: 'Use a gauge with a shorter scale, weigh this addition, or bring the component in as a premix.',
});

export const gaugeCoarse = (step: number, gauge: string, figure: string, limit: string): Words => ({
  title: `Gauge coarse for step ${step}: the rise is known to ${figure}`,
  detail: `${gauge} gives this standard uncertainty; more than ${limit} leaves little of the tolerance for anything else.`,
  remedy: 'Use a finer gauge or weigh this addition.',
});

export const gaugeCoarseButWeighed = (step: number, gauge: string, figure: string): Words => ({
  title: `Gauge coarse for step ${step}: the rise is known to ${figure}`,
  detail: `${gauge} is too coarse for this addition, but the balance resolves it.`,
  remedy: 'Let the balance decide this step; the gauge only confirms it.',
});

export const isolateGauge = (step: number, gauge: string, scale: string, figure: string): Words => ({
  title: `Shut off ${gauge} before step ${step}`,
  detail: `Its scale ends at ${scale}; this step goes to ${figure}. An over-ranged gauge can burst.`,
  remedy: 'Isolate the gauge after its last reading, before the next parent is opened.',
});

export const balanceNotStated = (): Words => ({
  title: 'Resolution of the balance not stated',
  detail: 'Whether the balance can resolve the additions cannot be judged.',
  remedy: 'Enter the smallest step that the balance shows.',
});

export const balanceCannotMeet = (step: number, figure: string, limit: string): Words => ({
  title: `Balance too coarse for step ${step}: the gain is known to ${figure}`,
  detail: `From the resolution alone; drift and buoyancy come on top. The tolerance of the component is ${limit}.`,
  remedy: 'Use a finer balance, weigh from a small transfer vessel, or bring the component in as a premix.',
});

export const balanceCoarse = (step: number, figure: string, limit: string): Words => ({
  title: `Balance coarse for step ${step}: the gain is known to ${figure}`,
  detail: `From the resolution alone; more than ${limit} leaves little of the tolerance for drift and buoyancy.`,
  remedy: 'Use a finer balance or a premix.',
});

/** `aim`: what a parent has to reach, as in “the stop of step 2”. */
export const supplyTooLow = (name: string, figure: string, needed: string, aim: string): Words => ({
  title: `Supply of ${name} ${figure}, below ${aim}`,
  detail: `It needs ${needed}. Flow would stop before it, and a higher cylinder pressure would push the mixture back into the parent.`,
  remedy: 'Take a fuller parent, a booster made for this gas, or another order of addition.',
});

export const supplyMargin = (name: string, figure: string, needed: string, aim: string): Words => ({
  title: `Supply of ${name} ${figure}, close to ${aim}`,
  detail: `It needs ${needed}. Filling slows towards the end, and the parent falls as it is drawn.`,
  remedy: 'Have a fuller parent at hand.',
});

export const supplyNotStated = (name: string, needed: string): Words => ({
  title: `Supply pressure of ${name} not stated`,
  detail: `Whether it reaches the ${needed} needed cannot be judged; if it does not, the mixture flows back into the parent.`,
  remedy: 'Enter the supply pressure of this parent.',
});

/** What the sentences about a liquefied parent need; pressures as shown. */
export interface LiquefiedSupply {
  readonly name: string;
  /** Its vapour pressure at room temperature. */
  readonly figure: string;
  /** What it has to reach. */
  readonly stop: string;
  readonly aim: string;
  /** Room temperature. */
  readonly at: string;
}

export const liquefiedTooLow = ({ name, figure, stop, aim, at }: LiquefiedSupply): Words => ({
  title: `${name} gives ${figure} as vapour, below ${aim}`,
  detail: `It is a liquefied gas: at ${at} its vapour stands at ${figure} however full the cylinder is, and cannot push higher; it needs ${stop}. A higher cylinder pressure would push the mixture back into it.`,
  remedy: 'Add it earlier, at a lower total pressure, from a gaseous premix, or with a pump made for liquefied gas.',
});

export const liquefiedMargin = ({ name, figure, stop, aim, at }: LiquefiedSupply): Words => ({
  title: `${name} gives ${figure} as vapour, close to ${aim}`,
  detail: `It is a liquefied gas: at ${at} its vapour stands at ${figure}, and lower once the cylinder cools as it is drawn; it needs ${stop}. Filling slows towards the end.`,
  remedy: 'Draw slowly and let the parent warm up, or add it at a lower total pressure.',
});

export const liquefiedNotStated = ({ name, figure, stop, at }: LiquefiedSupply): Words => ({
  title: `Supply pressure of ${name} not stated`,
  detail: `While it holds liquid its vapour stands at ${figure} at ${at}, above the ${stop} needed; once the liquid is gone it falls.`,
  remedy: 'Enter the supply pressure of this parent, or weigh it.',
});

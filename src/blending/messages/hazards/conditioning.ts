import { becauseOf } from './words.ts';
import type { Words } from './words.ts';

/** Sentences about the purges before the first addition. `number`: the act of the conditioning, from 1. */

const purge = (number: number, name: string): string => `purge with ${name} (act ${String(number)})`;

/** Where the purge gas streams into what is in the cylinder; `before`: the pressure there then. */
export const boundary = (
  verdict: 'note' | 'caution' | 'hold', number: number, name: string, oxidiserEnters: boolean, before: string, most: string,
): Words => {
  const [enters, meets] = oxidiserEnters ? ['oxidiser', 'fuel'] : ['fuel', 'oxidiser'];
  const what = { note: `a trace of ${meets}`, caution: `little or diluted ${meets}`, hold: meets }[verdict];
  return {
    title: `The ${purge(number, name)} lets ${enters} into a cylinder with ${what}`,
    detail: {
      note: `There is enough for a flammable mixture of at most ${most} in the whole cylinder (${before} in it before).`,
      caution: `No ratio at the boundary is beyond the limits used here, but the margin to them is small (${before} in the cylinder before).`,
      hold: `Where the gas streams in, every ratio of the two occurs, and some of them are in the flammable range (${before} in the cylinder before).`,
    }[verdict],
    remedy: verdict === 'note' ? '' : 'Let out and purge with an inert gas first; purge the line with inert gas between the two.',
  };
};

export const pair = (
  level: 'forbid' | 'restrict' | 'caution', number: number, name: string, inside: string, entering: string, reason: string, condition: string | null,
): Words => ({
  title: `The ${purge(number, name)} lets ${entering} into a cylinder with ${inside}`,
  detail: `The two react: ${reason}.${condition === null ? '' : ` Brought together at most under this condition: ${condition}.`}`,
  remedy: level === 'caution' ? '' : 'Purge with a gas that does not react with what is in the cylinder, or pump it out first.',
});

export const aboveMark = (number: number, name: string, figure: string, mark: string): Words => ({
  title: `The ${purge(number, name)} goes up to ${figure}, above ${mark}`,
  detail: 'Each cycle would fill the cylinder above what it is marked for.',
  remedy: 'Lower the upper pressure of the purge and run more cycles.',
});

export const aboveMarkWarm = (number: number, name: string, figure: string, mark: string): Words => ({
  title: `The ${purge(number, name)} goes up to ${figure}, above ${mark}`,
  detail: 'The gas is warmer then; brought to the marked temperature it would not stand above the mark.',
  remedy: 'Lower the upper pressure of the purge; colder gas at the same reading is overfilled.',
});

export const markNotJudged = (number: number, name: string, figure: string, mark: string, code: string): Words => ({
  title: `The ${purge(number, name)} goes up to ${figure} and cannot be judged against ${mark}`,
  detail: `It reads above the mark, and its pressure at the marked temperature was not computed. ${becauseOf(code)}`,
  remedy: 'Lower the upper pressure of the purge.',
});

export const levelMissed = (number: number, cycles: number, figure: string, limit: string): Words => ({
  title: `Act ${String(number)} of the conditioning leaves ${figure} of the old gas`,
  detail: `Asked for were at most ${limit}; ${String(cycles)} cycle${cycles === 1 ? ' does' : 's do'} not reach that.`,
  remedy: 'Run more cycles, or leave their number empty so that it is computed; or pump lower.',
});

export const line = (name: string, figure: string): Words => ({
  title: `The filling line carries enriched gas to purge: ${figure}`,
  detail: `${name} comes through it. Line, hose, gauge and filling valve must be clean and rated for oxygen up to here, whatever is filled later.`,
  remedy: '',
});

export const lineWithBoth = (name: string, figure: string, others: string): Words => ({
  title: `The filling line carries fuel and enriched gas (${figure}), one of them to purge`,
  detail: `${name} purges through the line through which ${others} comes as well. What is left in a hose or a dead end meets under pressure.`,
  remedy: 'Use separate lines, or purge and vent the line with inert gas between the two; keep line, hose and gauge clean and rated for oxygen.',
});

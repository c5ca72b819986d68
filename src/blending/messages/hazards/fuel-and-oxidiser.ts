import type { Words } from './words.ts';

/** Sentences about fuel and oxidiser meeting in the cylinder. */

const why =
  'Published limits hold at atmospheric pressure; under pressure the flammable range widens and less oxygen is enough, and no table covers a filled cylinder.';

export const togetherHold = (where: string, fuel: string, oxygen: string, pressure: string, more: string, share: string): Words => ({
  title: `Fuel and oxidiser together ${where}: fuel at ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
  detail: `At ${pressure} this mixture may burn or explode in the cylinder. ${why}${more}`,
  remedy: `Dilute the fuel below ${share} of its limit before any oxidiser comes in, keep the oxygen low, or make the mixture by another method after a reviewed feasibility study.`,
});

export const togetherLean = (where: string, fuel: string, oxygen: string, pressure: string, more: string): Words => ({
  title: `Fuel and oxidiser together ${where}: fuel at ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
  detail: `At ${pressure} one of the two is below the share used here as a margin. ${why}${more}`,
  remedy: 'Add slowly, keep the order of addition, and have the route reviewed by someone licensed to fill such mixtures.',
});

export const togetherTrace = (where: string, fuel: string, oxygen: string, share: string): Words => ({
  title: `Trace of fuel or oxidiser ${where}`,
  detail: `Fuel at ${fuel} of its lower flammable limit, oxygen ${oxygen}; one of them is below ${share} of its limit.`,
  remedy: '',
});

export const togetherNotComputed = (gas: string): Words => ({
  title: 'Fuel with oxidiser not computed',
  detail: `${gas} is in none of the tables of this check, so the states of this fill cannot be judged.`,
  remedy: 'Have the route reviewed by someone with the data of this gas before anything is filled.',
});

export const boundaryHold = (step: number, parent: string, oxidiserEnters: boolean, before: string): Words => ({
  title: oxidiserEnters
    ? `Step ${step} lets oxidiser (${parent}) into a cylinder with fuel`
    : `Step ${step} lets fuel (${parent}) into a cylinder with oxidiser`,
  detail: `Where the gas streams in, every ratio of the two occurs, and some of them are in the flammable range (${before} in the cylinder before). The mixed state afterwards does not tell this. ${why}`,
  remedy: oxidiserEnters
    ? 'Put the inert gas between them: dilute the fuel below its lower flammable limit first, and purge the line with inert gas.'
    : 'Add the fuel first, or bring it in as a premix below its lower flammable limit; purge the line with inert gas.',
});

export const boundaryLean = (step: number, parent: string, oxidiserEnters: boolean, before: string): Words => ({
  title: oxidiserEnters
    ? `Step ${step} lets oxidiser (${parent}) into a cylinder with diluted fuel`
    : `Step ${step} lets diluted fuel (${parent}) into a cylinder with oxidiser`,
  detail: `No ratio at the boundary is beyond the limits used here, but the margin to them is small (${before} in the cylinder before). ${why}`,
  remedy: 'Add slowly, purge the line with inert gas between the two, and keep this order of addition.',
});

export const boundaryTrace = (step: number, parent: string, oxidiserEnters: boolean, before: string, most: string): Words => ({
  title: oxidiserEnters
    ? `Step ${step}: oxidiser (${parent}) meets a trace of fuel left at low pressure`
    : `Step ${step}: fuel (${parent}) meets a trace of oxidiser left at low pressure`,
  detail: `There is enough for a flammable mixture of at most ${most} in the whole cylinder (${before} in it before).`,
  remedy: '',
});

export const parentMixture = (name: string, fuel: string, oxygen: string, hold: boolean): Words => ({
  title: `Parent ${name} holds fuel and oxidiser: fuel at ${fuel} of its lower flammable limit, oxygen ${oxygen}`,
  detail: `${hold ? 'It may burn in its own cylinder and line.' : 'Letting it into another cylinder heats and compresses it.'} ${why}`,
  remedy: hold
    ? 'Do not compress or decant this gas without a reviewed procedure for it.'
    : 'Fill slowly, at or below the pressure for which the parent was made.',
});

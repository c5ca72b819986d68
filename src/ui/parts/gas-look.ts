import type { GasId } from '../../blending/index.ts';

export type Hatch = 'solid' | 'rising' | 'falling' | 'upright' | 'level' | 'cross' | 'dots';

/** How one gas is drawn everywhere: one colour and one hatching, legible in grey print. */
export interface GasLook {
  readonly colour: string;
  readonly hatch: Hatch;
}

/*
 * Colours: the palette of M. Okabe and K. Ito for colour-blind readers, with two
 * greys. Cylinder shoulder colours are avoided on purpose: they differ by country.
 */
const ORANGE = '#e69f00';
const SKY = '#56b4e9';
const GREEN = '#009e73';
const YELLOW = '#f0e442';
const BLUE = '#0072b2';
const VERMILLION = '#d55e00';
const PURPLE = '#cc79a7';
const GREY = '#7f8c99';
const PALE = '#b8c2cc';

const LOOKS: Readonly<Record<GasId, GasLook>> = {
  nitrogen: { colour: PALE, hatch: 'upright' },
  oxygen: { colour: GREEN, hatch: 'solid' },
  argon: { colour: PURPLE, hatch: 'level' },
  helium: { colour: YELLOW, hatch: 'level' },
  hydrogen: { colour: VERMILLION, hatch: 'dots' },
  'carbon dioxide': { colour: ORANGE, hatch: 'rising' },
  'carbon monoxide': { colour: BLUE, hatch: 'cross' },
  methane: { colour: SKY, hatch: 'falling' },
  ethane: { colour: SKY, hatch: 'cross' },
  propane: { colour: SKY, hatch: 'dots' },
  'n-butane': { colour: BLUE, hatch: 'falling' },
  isobutane: { colour: BLUE, hatch: 'dots' },
  'n-pentane': { colour: PURPLE, hatch: 'rising' },
  isopentane: { colour: PURPLE, hatch: 'dots' },
  'n-hexane': { colour: VERMILLION, hatch: 'rising' },
  'n-heptane': { colour: VERMILLION, hatch: 'level' },
  'n-octane': { colour: ORANGE, hatch: 'cross' },
  'n-nonane': { colour: ORANGE, hatch: 'dots' },
  'n-decane': { colour: GREEN, hatch: 'cross' },
  water: { colour: BLUE, hatch: 'level' },
  'hydrogen sulfide': { colour: YELLOW, hatch: 'cross' },
  neon: { colour: VERMILLION, hatch: 'solid' },
  krypton: { colour: GREY, hatch: 'rising' },
  xenon: { colour: PALE, hatch: 'solid' },
  neopentane: { colour: PURPLE, hatch: 'solid' },
  toluene: { colour: GREEN, hatch: 'rising' },
  'carbonyl sulfide': { colour: YELLOW, hatch: 'solid' },
  'nitrous oxide': { colour: SKY, hatch: 'solid' },
  acetone: { colour: GREY, hatch: 'falling' },
  deuterium: { colour: YELLOW, hatch: 'rising' },
  ethylene: { colour: SKY, hatch: 'rising' },
  propylene: { colour: SKY, hatch: 'upright' },
  isobutene: { colour: BLUE, hatch: 'solid' },
  '1-butene': { colour: BLUE, hatch: 'rising' },
  benzene: { colour: GREEN, hatch: 'falling' },
  'sulfur dioxide': { colour: YELLOW, hatch: 'falling' },
  ammonia: { colour: PURPLE, hatch: 'falling' },
  'hydrogen chloride': { colour: GREEN, hatch: 'upright' },
  chlorine: { colour: GREEN, hatch: 'level' },
  'sulfur hexafluoride': { colour: PALE, hatch: 'rising' },
  tetrafluoromethane: { colour: PALE, hatch: 'falling' },
  r134a: { colour: PALE, hatch: 'level' },
  'ethylene oxide': { colour: GREY, hatch: 'upright' },
  methanol: { colour: GREY, hatch: 'level' },
  ethanol: { colour: GREY, hatch: 'cross' },
  trifluoromethane: { colour: PALE, hatch: 'cross' },
  'vinyl chloride': { colour: PALE, hatch: 'dots' },
  acetylene: { colour: SKY, hatch: 'level' },
  'methyl mercaptan': { colour: YELLOW, hatch: 'upright' },
  'nitric oxide': { colour: VERMILLION, hatch: 'falling' },
  'nitrogen dioxide': { colour: VERMILLION, hatch: 'upright' },
  'hydrogen fluoride': { colour: GREEN, hatch: 'dots' },
  'hydrogen cyanide': { colour: PURPLE, hatch: 'upright' },
  phosphine: { colour: ORANGE, hatch: 'solid' },
  arsine: { colour: ORANGE, hatch: 'falling' },
  silane: { colour: ORANGE, hatch: 'upright' },
  formaldehyde: { colour: GREY, hatch: 'dots' },
  '1,3-butadiene': { colour: BLUE, hatch: 'upright' },
};

/** Colour and hatching of a gas. */
export function gasLook(gas: GasId): GasLook {
  return LOOKS[gas];
}

/** Colour for amounts that are too small to name apart. */
export const OTHERS_LOOK: GasLook = { colour: GREY, hatch: 'solid' };

/** Id of the SVG pattern of a gas inside one picture; pictures on a page must not share ids. */
export function patternId(picture: string, gas: GasId): string {
  return `${picture}-${gas.replace(/[^a-z0-9]+/g, '-')}`;
}

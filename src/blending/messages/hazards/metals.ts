import type { Words } from './words.ts';

/** Sentences about gases and the metals they touch. */

const unknown = (stated: boolean): string => (stated ? '' : ' The material is not stated; judged as the worse of steel and aluminium.');

export const never = (gas: string, metal: string, note: string, stated: boolean): Words => ({
  title: `Not in ${metal}: ${gas}`,
  detail: `The gas ${note}.${unknown(stated)}`,
  remedy: stated ? 'Take a cylinder of another material.' : 'State the material of the cylinder; take one that this gas does not attack.',
});

export const attacks = (gas: string, metal: string, note: string, stated: boolean): Words => ({
  title: `In ${metal} with care: ${gas}`,
  detail: `The gas ${note}.${unknown(stated)}`,
  remedy: 'Check the pairing with the supplier of the cylinder and ISO 11114-1; use a dry cylinder, treated where the content is small.',
});

export const deuteriumInSteel = (partial: string, much: boolean, stated: boolean): Words => ({
  title: `Deuterium in steel, partial pressure ${partial}`,
  detail: `${much ? 'Above about 50 bar quenched and tempered steel must be limited in strength, as for hydrogen; such cylinders carry the mark H.' : 'Not above the partial pressure from which the strength of the steel must be limited.'}${unknown(stated)}`,
  remedy: much ? 'Check the mark on the shoulder, or take aluminium.' : '',
});

export const dryOnly = (gases: string): Words => ({
  title: `Only dry: ${gases}`,
  detail: 'With moisture these gases attack the wall or are lost to it.',
  remedy: '',
});

export const unknownGas = (gas: string): Words => ({
  title: `Cylinder material not judged for ${gas}`,
  detail: 'The gas is not in the table of metals.',
  remedy: 'Ask the supplier of the gas which metals it may touch.',
});

export const noBrass = (gases: string): Words => ({
  title: `Valve and fittings: no brass or copper for ${gases}`,
  detail: 'The materials of valve, line, regulator and gauge are not known to this program.',
  remedy: 'Use valve, line, regulator and gauge of stainless steel, or of the metal that the supplier names.',
});

export const careFittings = (gases: string): Words => ({
  title: `Valve and fittings: mind ${gases}`,
  detail: 'The materials of valve, line, regulator and gauge are not known to this program.',
  remedy: '',
});

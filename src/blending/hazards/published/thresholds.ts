import { cautionShare, solventContent } from '../condensation-judgement.ts';
import { lowestLimitingOxygen } from '../data/flammable-gases.ts';
import { cautiousEquivalency, polyatomicDefault } from '../data/inert-gases.ts';
import { allowance, negligibleShare, together } from '../fuel-and-oxidiser.ts';
import { flammableAbove, oxidisingAbovePercent } from '../iso10156.ts';
import { heatCapacityRatio } from '../oxygen-heat.ts';
import { oxygenInAir } from '../room-air.ts';
import { carbonMonoxideCaps, mainComponent } from '../rules/carbon-monoxide-pressure.ts';
import { hydrogenPartial, steelImpurity } from '../rules/cylinder-material.ts';
import { oxidiserTrace } from '../rules/flammable-gas.ts';
import { unstatedParent } from '../rules/fuel-with-oxidiser.ts';
import { pairImmaterial, pairMatters } from '../rules/gas-model.ts';
import { slowOpeningAbove } from '../rules/oxygen-compression.ts';
import { transport } from '../rules/pressure-when-hot.ts';
import { unorderedAbove } from '../rules/purity.ts';
import { roomLimits } from '../rules/room.ts';
import { underTest } from '../rules/test-pressure.ts';
import { vacuumLimits } from '../rules/vacuum.ts';
import { highlyToxicUpTo, toxicTrace, toxicUpTo } from '../rules/toxic-gas.ts';
import { standInContent } from '../stand-ins.ts';
import { liquidBelow } from '../step-condensation.ts';
import { limitWithoutTolerance, shareOfTolerance } from '../step-resolution.ts';
import { margin as supplyMargin } from '../supply-judgement.ts';
import { harmlessPressure } from '../together-judgement.ts';
import type { RuleValue } from '../../values/value.ts';
import { assumedTolerance } from '../worst-case.ts';
import { colderBy } from '../../phase/plan-phase.ts';
import { threshold } from './listed.ts';
import type { ListedValue, ValueSection, ValueWords } from './listed.ts';

const OWN = 'Own choice';
const PRACTICE = 'Common practice';
const CFR_CO = '49 CFR 173.302a';
const CFR_ROOM = '29 CFR 1910.146';
const P200 = 'UN Model Regulations, packing instruction P200';

/** The thresholds of the rules that judge from the first plan on, by section. */
const words: Readonly<Partial<Record<ValueSection, readonly (readonly [RuleValue, ...ValueWords])[]>>> = {
  Flammability: [
    [flammableAbove, 'Σ A′/Tci above which a gas counts as flammable in air', '', 'ISO 10156:2017 clause 4.3', 'seen'],
    [polyatomicDefault, 'Kk of other non-flammable gases of three or more atoms', '', 'ISO 10156:2017 Table 1, note', 'seen'],
    [cautiousEquivalency, 'Kk that stands in for a missing one on the cautious side', '', 'Lowest of ISO 10156:2017 Table 1; own choice'],
    [standInContent, 'Content up to which a coefficient that stands in is not named', 'mol/mol', OWN],
    [assumedTolerance, 'Relative tolerance taken for a component ordered without one', '', '5 to 10 % are usual; the wider end is taken'],
  ],
  'Fuel and oxidiser together': [
    [together.fuelShare, 'Share of the lower flammable limit from which fuel with oxidiser is held', '', PRACTICE],
    [together.oxygenShare, 'Share of the limiting oxygen concentration from which fuel with oxidiser is held', '', PRACTICE],
    [together.traceShare, 'Share of either limit below which it is a trace', '', OWN],
    [together.impurityShare, 'Share of either limit below which it is an impurity and not worth a word', '', OWN],
    [allowance.from, 'Pressure above which less of a limiting oxygen concentration is relied on', 'bar absolute', OWN],
    [allowance.share, 'Share of a limiting oxygen concentration that is relied on above that pressure', '', OWN],
    [lowestLimitingOxygen, 'Limiting oxygen concentration of a fuel without one', '%', 'Lowest of the table; own choice'],
    [negligibleShare, 'Share of the fuel load below which a fuel does not set the oxygen limit', '', OWN],
    [harmlessPressure, 'Pressure of flammable mixture in the whole cylinder up to which a meeting is a note', 'mbar absolute', OWN],
    [unstatedParent, 'Pressure at which a parent without a stated one is judged', 'bar absolute', OWN],
  ],
  'Oxidising power and oxygen': [
    [oxidisingAbovePercent, 'Oxidising power, or oxygen content, above which a gas is oxidising and asks for oxygen service', '%', 'ISO 10156:2017 clause 5.3; 29 CFR 1910.146', 'seen'],
    [oxidiserTrace, 'Oxygen equivalents up to which an oxidiser is an impurity of the finished gas', 'mol/mol', OWN],
    [slowOpeningAbove, 'Supply pressure above which slow-opening valves are asked for', 'psi gauge', '46 CFR 197.326', 'seen'],
    [heatCapacityRatio, 'Heat capacity ratio of oxygen in adiabatic compression', '', 'Ideal diatomic gas', 'computed'],
  ],
  Toxicity: [
    [toxicUpTo, 'LC50 up to which a mixture is toxic in transport', 'µmol/mol', 'UN Model Regulations 2.2.3; ADR 2.2.2.1.5', 'seen'],
    [highlyToxicUpTo, 'LC50 up to which a mixture is called highly toxic', 'µmol/mol', P200, 'from memory'],
    [transport.zoneB, 'Highest LC50 of hazard zone B', 'µmol/mol', '49 CFR 173.116', 'from memory'],
    [toxicTrace, 'Content up to which a toxic gas is a trace', 'mol/mol', OWN],
  ],
  Pressure: [
    [underTest.hot, 'Temperature at which the test pressure must not be exceeded', '°C', P200, 'from memory'],
    [underTest.settled, 'Temperature of the settled pressure', '°C', P200, 'from memory'],
    [underTest.share, 'Share of the test pressure that the settled pressure may reach', '', P200, 'from memory'],
    [transport.at, 'Temperature at which the service pressure limits the hot cylinder', '°C', '49 CFR 173.301a(d)', 'seen'],
    [transport.share, 'Share of the service pressure allowed at that temperature', '', '49 CFR 173.301a(d)', 'seen'],
    [carbonMonoxideCaps.cap, 'Highest pressure of carbon monoxide', 'psi gauge', CFR_CO, 'seen'],
    [carbonMonoxideCaps.dryCap, 'Highest pressure of carbon monoxide, dry and free of sulfur', 'psi gauge', CFR_CO, 'seen'],
    [carbonMonoxideCaps.dryShare, 'Share of the service pressure allowed to carbon monoxide, dry and free of sulfur', '', CFR_CO, 'seen'],
    [carbonMonoxideCaps.at, 'Temperature of the caps of carbon monoxide', '°C', CFR_CO, 'seen'],
    [mainComponent, 'Content from which the caps of carbon monoxide count for the total pressure', 'mol/mol', OWN],
  ],
  Condensation: [
    [cautionShare, 'Share of a condensation limit from which a caution is given', '', '50 to 70 % of the limit are the usual margin'],
    [colderBy, 'How much colder than stated the stored cylinder is looked at as well', 'K', OWN],
    [solventContent, 'Content from which a gas is part of what a condensing gas is dissolved in', 'mol/mol', OWN],
    [liquidBelow, 'Compressibility factor below which a condensable state is taken as a liquid', '', OWN],
  ],
  'Reactions and metals': [
    [hydrogenPartial, 'Partial pressure of hydrogen from which the strength of steel matters', 'bar absolute', 'Trade knowledge; check ISO 11114-4'],
    [steelImpurity, 'Content up to which a gas that attacks steel is not named', 'mol/mol', OWN],
  ],
  'Room air': [
    [oxygenInAir, 'Oxygen in clean air', 'mol/mol', 'Composition of dry air', 'from memory'],
    [roomLimits.deficientBelow, 'Oxygen in room air below which it is deficient', 'mol/mol', CFR_ROOM, 'seen'],
    [roomLimits.severeBelow, 'Oxygen in room air below which people are in danger', 'mol/mol', 'Used in some countries', 'from memory'],
    [roomLimits.enrichedAbove, 'Oxygen in room air above which it is enriched', 'mol/mol', CFR_ROOM, 'seen'],
    [roomLimits.flammableAbove, 'Share of the lower flammable limit in room air', '', CFR_ROOM, 'seen'],
  ],
  'Instruments, supply and purity': [
    [limitWithoutTolerance, 'Relative uncertainty of a step that is cautioned where no tolerance was ordered', '', OWN],
    [shareOfTolerance, 'Share of a tolerance from which the uncertainty of a step is cautioned', '', 'The expanded uncertainty, k = 2, uses the tolerance up; own choice'],
    [supplyMargin.share, 'Margin of a supply over its stop, as a share of the stop', '', PRACTICE],
    [vacuumLimits.poor, 'Pressure from which an evacuated cylinder is cautioned', 'mbar absolute', OWN],
    [vacuumLimits.none, 'Pressure from which what is called evacuated is held', 'mbar absolute', OWN],
    [supplyMargin.least, 'Least margin of a supply over its stop', 'bar', PRACTICE],
    [unorderedAbove.content, 'Content from which a gas that was not ordered is reported', 'mol/mol', OWN],
    [unorderedAbove.ofSmallest, 'The same as a share of the smallest ordered component', '', OWN],
  ],
  'Gas model': [
    [pairMatters, 'Content of both gases above which an estimated pair is worth a caution', 'mol/mol', OWN],
    [pairImmaterial, 'Content up to which a pair cannot move a stop', 'mol/mol', OWN],
  ],
};

/** Every threshold of those rules. */
export function thresholdValues(): readonly ListedValue[] {
  return (Object.keys(words) as ValueSection[]).flatMap((section) =>
    (words[section] ?? []).map(([value, ...said]) => threshold(section, value, said)));
}

/** What is drawn of a plan and of two gases, and where the finished gas condenses: fetched when a view shows it. */
export { mixingCurveOf, mixingPointOf, pressureAlongFill, pressureOverTemperature } from '../plan/curves.ts';
export type { FillCurvePoint, PressureAtTemperature } from '../plan/curves.ts';
export { condensationCurve, lowestGasTemperature } from '../phase/condensation-curve.ts';
export { formingText, moistureCaveat, phaseSentence } from '../messages/phase.ts';
export { curvePoint, mixingCurve } from '../mixing/curve.ts';

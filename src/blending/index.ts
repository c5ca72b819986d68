/**
 * Door of the blending layer (level 2): the laboratory on top of `units` and `thermo`.
 *
 * Start reading at `plan/plan-recipe.ts`, where the pipeline from a typed
 * recipe to a judged plan is drawn.
 */
export * from './recipe/document.ts';
export type * from './recipe/job.ts';
export type { FieldPath, NearestComposition, RecipeProblem } from './recipe/problem.ts';
export { defaultConditions, defaultContents, defaultCylinder, defaultRoute, emptyRecipe, unstatedPressure } from './recipe/defaults.ts';
export { demoRecipes } from './recipe/demo/index.ts';
export { readOrderText, writeOrderText } from './recipe/order-text.ts';
export type { OrderTextReading } from './recipe/order-text.ts';
export { isBalanceText } from './recipe/composition.ts';
export * from './recipe/file/file.ts';
export * from './recipe/file/identity.ts';
export type * from './plan/plan.ts';
export { planJob, planRecipe } from './plan/plan-recipe.ts';
export type { PlanAnswer, PlanOptions } from './plan/plan-recipe.ts';
export { DEVELOPED_CELSIUS } from './plan/final.ts';
export { STRIP_CELSIUS } from './plan/fill-states.ts';
export { compositionFromMasses } from './steps/mass-composition.ts';
export type { MassProblem } from './steps/mass-composition.ts';
export * from './mixing/mixing.ts';
export * from './mixing/curve.ts';
export type * from './hazards/finding.ts';
export { entrySentence } from './messages/entry.ts';
export { mixingSentence, recipeSentence, thermoSentence } from './messages/recipe.ts';
export { gasFromText, gasLabel, knownGases } from './gases.ts';
export type { GasId, GasLabel } from './gases.ts';
export { loadAllGases, modelName } from '../thermo/index.ts';
export { mixingCurveOf, mixingPointOf, pressureAlongFill, pressureOverTemperature } from './plan/curves.ts';
export type { FillCurvePoint, PressureAtTemperature } from './plan/curves.ts';
export * from './phase/condensation-curve.ts';
export type * from './phase/plan-phase.ts';
export type { LargestFill } from './phase/largest-fill.ts';
export type { Forming } from './phase/forming.ts';
export { formingText, moistureCaveat, phaseSentence } from './messages/phase.ts';
export type * from './working/working.ts';
export { loadWorkings } from './working/load.ts';
export type { Workings } from './working/load.ts';
export { gasText, searchGases } from './gases/search.ts';
export type { GasMatch, MatchKind } from './gases/search.ts';
export { gasCard } from './gases/card.ts';
export type { GasCard } from './gases/card.ts';
export { gasFacts } from './gases/facts.ts';
export type { GasFacts, GasFigure } from './gases/facts.ts';
export { compressibilityCurve, correlatedVapourPressure, vapourPressureAt, vapourPressureCurve } from './gases/curves.ts';
export type { CompressibilityCurve, CompressibilityPoint, VapourPressurePoint } from './gases/curves.ts';
export { loadProof } from './proof/load.ts';
export { proofCounts } from './proof/run.ts';
export type * from './proof/case.ts';
export type * from './proof/runner.ts';

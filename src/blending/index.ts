/**
 * Door of the blending layer (level 2): the laboratory on top of `units` and `thermo`.
 *
 * Start reading at `plan/plan-recipe.ts`, where the pipeline from a typed
 * recipe to a judged plan is drawn.
 */
export * from './recipe/document.ts';
export type * from './recipe/job.ts';
export type { FieldPath, NearestComposition, RecipeProblem } from './recipe/problem.ts';
export {
  defaultBatch, defaultConditions, defaultContents, defaultCylinder, defaultRoute, emptyRecipe, noSplit, parentNamed, purityTable,
  unstatedPressure,
} from './recipe/defaults.ts';
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
export type * from './plan/arrangement.ts';
export { chooseGauge } from './steps/gauge.ts';
export { compositionFromMasses } from './steps/mass-composition.ts';
export type { MassProblem } from './steps/mass-composition.ts';
export * from './mixing/mixing.ts';
export type * from './mixing/curve.ts';
export type * from './hazards/finding.ts';
export { entrySentence } from './messages/entry.ts';
export { mixingSentence, recipeSentence, thermoSentence } from './messages/recipe.ts';
export { gasFromText, gasLabel, knownGases } from './gases.ts';
export type { GasId, GasLabel } from './gases.ts';
export { modelName } from '../thermo/index.ts';
export { loadCurves } from './curves/load.ts';
export type { CurveTools } from './curves/load.ts';
export type { FillCurvePoint, PressureAtTemperature } from './plan/curves.ts';
export type * from './phase/condensation-curve.ts';
export type * from './phase/plan-phase.ts';
export type { LargestFill } from './phase/largest-fill.ts';
export type { Forming } from './phase/forming.ts';
export type * from './working/working.ts';
export { loadWorkings } from './working/load.ts';
export type { Workings } from './working/load.ts';
export { gasText, searchGases } from './gases/search.ts';
export type { GasMatch, MatchKind } from './gases/search.ts';
export type { GasCard } from './gases/card.ts';
export type { GasFacts, GasFigure } from './gases/facts.ts';
export { loadGasTools } from './gases/load.ts';
export type { GasTools } from './gases/load.ts';
export type { CompressibilityCurve, CompressibilityPoint, VapourPressurePoint } from './gases/curves.ts';
export type { TriangleLeg, TrianglePicture, TrianglePoint } from './picture/triangle.ts';
export type { KnownSupply, LeftInParent, ParentSupply, StoreGap, Supply } from './supply/index.ts';
export type * from './calculator.ts';
export { loadCalculations } from './calculations/load.ts';
export type * from './route/data.ts';
export { loadRouteTools } from './route/load.ts';
export type { RouteTools } from './route/load.ts';
export type { Criterion, OrderCost } from './route/criteria.ts';
export type * from './stock/document.ts';
export type { StockFileProblem } from './stock/file/problem.ts';
export type { CellFault, TableProblem } from './stock/csv/problem.ts';
export type { Table, TableReading } from './stock/csv/table.ts';
export type { Column } from './stock/csv/column.ts';
export type { Answer as ProposedAnswer, Proposals } from './stock/choose/propose.ts';
export type { Proposal } from './stock/choose/proposal.ts';
export type { Objective } from './stock/choose/costs.ts';
export { loadStockTools } from './stock/load.ts';
export type { StockTools } from './stock/load.ts';
export { loadClassification } from './hazards/classification/load.ts';
export type { Classification, ClassLine, SuggestedClass } from './hazards/classification/index.ts';
export { loadRest } from './rest.ts';
export { loadProof } from './proof/load.ts';
export { proofCounts } from './proof/run.ts';
export type * from './proof/case.ts';
export type * from './proof/runner.ts';
export { laboratoryValueProblems } from './recipe/laboratory-values.ts';
export { loadPublishedValues } from './hazards/published/load.ts';
export type { ListedValue, ValueSection } from './hazards/published/listed.ts';

export { neededPressure } from './needed-pressure.ts';
export { saturationOf, storeOf } from './store.ts';
export type { ParentStore, StoreGap } from './store.ts';
export { supplyOf } from './supply.ts';
export type { KnownSupply, LeftInParent, ParentSupply, Supply } from './supply.ts';

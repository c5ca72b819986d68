/** Every intent that changes a recipe, one small function each. */
export * from './conditions.ts';
export * from './cylinder.ts';
export * from './document.ts';
export * from './gauges.ts';
export * from './order.ts';
export * from './overrides.ts';
export * from './parents.ts';
export * from './route.ts';
export * from './conditioning.ts';
export * from './values.ts';
export * from './stock.ts';

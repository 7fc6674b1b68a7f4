export { plan, settleCase, type PlanOptions, type Settled } from './plan.ts';
export { compileFiles, shippedRules } from './rules.ts';
export * from './types.ts';
export { fluidRange, noPropertyTable, propertyFits } from './property-fits.ts';
export { setExponents } from './target-exponents.ts';
export { targetSpreads } from './target-spread.ts';

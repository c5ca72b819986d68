/** Door of the hazard rules. SAFETY.md lists every rule with its source, file and test. */
export { admitRules, judgePlan } from './judge-plan.ts';
export { hazardRules } from './all-rules.ts';
export { firstRules } from './rules.ts';
export type { Finding, FindingPlace, Trust, Verdict } from './finding.ts';
export type { HazardContext, HazardRule, HazardTools } from './rule.ts';

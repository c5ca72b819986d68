import { loadAllGases } from '../thermo/index.ts';
import { admitRules } from './hazards/judge-plan.ts';
import { admitOrderSearch, SEARCHED_AT_MOST, SEARCHED_WHILE_TYPING } from './plan/order-search.ts';

/**
 * Brings what the first plan does not wait for: the equations of the gases
 * outside GERG-2008, the search for the best order of addition and most of the
 * hazard rules. Until then a plan says what it was made without.
 * `patient`: nobody types meanwhile, so that orders of many parents are searched
 * too. It rejects as `import()` does when a chunk cannot be fetched.
 */
export async function loadRest({ patient = false }: { readonly patient?: boolean } = {}): Promise<void> {
  const [{ hazardRules }, { bestOrder }] = await Promise.all([
    import('./hazards/all-rules.ts'), import('./route/order-search.ts'), loadAllGases(),
  ]);
  admitRules(hazardRules);
  admitOrderSearch(bestOrder, patient ? SEARCHED_AT_MOST : SEARCHED_WHILE_TYPING);
}

import type { ThermoModel } from '../../thermo/index.ts';
import type { Job } from '../recipe/job.ts';
import type { Vessel } from '../steps/cylinder.ts';
import type { FillAmounts } from './amounts.ts';
import type { Arrangement } from './arrangement.ts';

/** Finds the best order of addition; null when there are too many parents to search. */
export type OrderSearch = (job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts) => Arrangement | null;

/** So many parents are searched while somebody types; more are left to a thread of their own. */
export const SEARCHED_WHILE_TYPING = 5;
/** Where nobody waits for the next key. */
export const SEARCHED_AT_MOST = 12;

let admitted: { readonly search: OrderSearch; readonly most: number } | undefined;

/** Makes the search known to `planJob`, for up to `most` parents: its chunk comes after the first plan. */
export function admitOrderSearch(search: OrderSearch, most: number): void {
  admitted = { search, most };
}

/** The search for so many parents; undefined where it has not come, or is left to another thread. */
export function orderSearchFor(parents: number): OrderSearch | undefined {
  return admitted !== undefined && parents <= admitted.most ? admitted.search : undefined;
}

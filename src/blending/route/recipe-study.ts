import { fail, ok } from '../../units/index.ts';
import { realModel } from '../../thermo/index.ts';
import type { Calculations } from '../calculator.ts';
import { solveAmounts } from '../plan/amounts.ts';
import { sequenceOfAdditions } from '../plan/sequence.ts';
import type { Recipe } from '../recipe/document.ts';
import { normaliseRecipe } from '../recipe/normalise.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { costOfOrder, studyOrders } from './study.ts';

/**
 * Studies the orders of addition of a recipe as typed, and judges the order
 * that it states itself. Fails with `not-planned` where the recipe has no plan,
 * whose own problems say why, and as `studyOrders` does.
 */
export function studyRecipe(recipe: Recipe): Calculations['study']['answer'] {
  const read = normaliseRecipe(recipe);
  if (!read.ok) return fail({ code: 'not-planned' });
  const job = read.value;
  const model = realModel(job.gases);
  if (!model.ok) return fail({ code: 'not-planned' });
  const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
  const amounts = solveAmounts(job, model.value, vessel);
  if (!amounts.ok) return fail({ code: 'not-planned' });
  const study = studyOrders(job, model.value, vessel, amounts.value);
  if (!study.ok) return study;
  const { sequence } = recipe.route;
  if (sequence === 'best') return ok({ job, study: study.value, own: study.value.chosen });
  const own = costOfOrder(job, model.value, vessel, amounts.value, sequenceOfAdditions(job, amounts.value.additions, sequence));
  return own.ok ? ok({ job, study: study.value, own: own.value }) : own;
}

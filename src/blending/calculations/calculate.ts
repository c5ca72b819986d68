import type { CalculationName, Calculations } from '../calculator.ts';
import { studyRecipe } from '../route/recipe-study.ts';
import { proposeFromStock } from '../stock/choose/propose.ts';

const table: { readonly [Name in CalculationName]: (input: Calculations[Name]['input']) => Calculations[Name]['answer'] } = {
  study: studyRecipe,
  propose: ({ recipe, stock, today }) => proposeFromStock(recipe, stock, today),
};

/** Works one calculation out, here and now. */
export function calculate<Name extends CalculationName>(name: Name, input: Calculations[Name]['input']): Calculations[Name]['answer'] {
  return table[name](input);
}

/** The texts of one finding. */
export interface Words {
  readonly title: string;
  readonly detail: string;
  readonly remedy: string;
}

/** Why a figure is missing, in words, from the code of an outcome. */
export function becauseOf(code: string): string {
  switch (code) {
    case 'no-gas-root':
      return 'The gas model finds no gas-like state there: the mixture would condense first.';
    case 'gas-not-classified':
      return 'A gas of the mixture is in none of the tables of this check.';
    case 'equation-breaks-down':
      return 'The gas model is unstable there, as it is where a mixture separates into gas and liquid.';
    case 'below-vapour-pressure-range':
      return 'A component is below the range of its vapour pressure equation; it would be solid when pure.';
    case 'not-converged':
      return 'The pressure was not found by the gas model.';
    default:
      return `The gas model gives no figure there (${code}).`;
  }
}

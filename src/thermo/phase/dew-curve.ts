import { pascal } from '../../units/index.ts';
import type { Kelvin, Outcome } from '../../units/index.ts';
import type { Composition, ThermoModel } from '../contract.ts';
import { dewPressure } from './dew.ts';
import type { DewPoint, DewReason, DewSearch } from './dew.ts';

/** The dew pressure rises with temperature: a search may begin this part below the last one. */
const BELOW_LAST = 0.98;

/**
 * Dew pressures at rising temperatures, each search begun from the answer before.
 * After two temperatures in a row without a dew point up to `highest`, warmer ones
 * are not searched: they are past the warmest point of the dew line.
 */
export function dewCurve(
  model: ThermoModel, x: Composition, temperatures: readonly Kelvin[], { highest }: Pick<DewSearch, 'highest'> = {},
): Outcome<DewPoint, DewReason>[] {
  const limit = highest === undefined ? {} : { highest };
  const answers: Outcome<DewPoint, DewReason>[] = [];
  for (const temperature of temperatures) {
    const last = answers.at(-1);
    const beforeLast = answers.at(-2);
    if (last !== undefined && beforeLast !== undefined && isNone(last) && isNone(beforeLast)) {
      answers.push(last);
      continue;
    }
    const from = last?.ok === true ? { from: pascal(BELOW_LAST * last.value.pressure) } : {};
    answers.push(dewPressure(model, temperature, x, { ...limit, ...from }));
  }
  return answers;
}

function isNone(answer: Outcome<DewPoint, DewReason>): boolean {
  return !answer.ok && answer.reason.code === 'no-dew-point';
}

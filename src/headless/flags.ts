import { fail, ok } from '../units/index.ts';
import type { Outcome } from '../units/index.ts';

export type GasConstant = 'codata' | 'gerg2008';

/** Reads the flags that all commands share; an unknown flag is refused by name. */
export function readFlags(flags: readonly string[]): Outcome<GasConstant, { readonly code: 'flag-unknown'; readonly flag: string }> {
  let gasConstant: GasConstant = 'codata';
  for (const flag of flags) {
    if (flag === '--gas-constant=gerg2008') gasConstant = 'gerg2008';
    else if (flag === '--gas-constant=codata') gasConstant = 'codata';
    else return fail({ code: 'flag-unknown', flag });
  }
  return ok(gasConstant);
}

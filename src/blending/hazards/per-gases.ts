import type { LaboratoryValues } from '../values/value.ts';

/**
 * Remembers what was made for a list of gases and a set of values. All rules of
 * one plan ask with the same two, so each table is looked up once a plan, not
 * once a rule.
 */
export function perGases<Value>(
  make: (gases: readonly string[], values: LaboratoryValues) => Value,
): (gases: readonly string[], values: LaboratoryValues) => Value {
  const known = new WeakMap<LaboratoryValues, WeakMap<readonly string[], { readonly value: Value }>>();
  return (gases, values) => {
    let ofValues = known.get(values);
    if (ofValues === undefined) known.set(values, ofValues = new WeakMap());
    const before = ofValues.get(gases);
    if (before) return before.value;
    const value = make(gases, values);
    ofValues.set(gases, { value });
    return value;
  };
}

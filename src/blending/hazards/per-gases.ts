/**
 * Remembers what was made for a list of gases. All rules of one plan ask with
 * the same list, so each table is looked up once a plan, not once a rule.
 */
export function perGases<Value>(make: (gases: readonly string[]) => Value): (gases: readonly string[]) => Value {
  const known = new WeakMap<readonly string[], { readonly value: Value }>();
  return (gases) => {
    const before = known.get(gases);
    if (before) return before.value;
    const value = make(gases);
    known.set(gases, { value });
    return value;
  };
}

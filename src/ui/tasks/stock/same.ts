/** Whether two things say the same, in whatever order their fields come; fields in `apart` are not compared. */
export function saysTheSame<Thing extends object>(one: Thing, other: Thing, apart: readonly (keyof Thing & string)[] = []): boolean {
  return said(one, apart) === said(other, apart);
}

/** Whether two lists hold the same things, in whatever order. */
export function holdTheSame<Thing extends object>(one: readonly Thing[], other: readonly Thing[], apart: readonly (keyof Thing & string)[]): boolean {
  const all = (things: readonly Thing[]): string => things.map((thing) => said(thing, apart)).sort().join('\n');
  return one.length === other.length && all(one) === all(other);
}

function said(value: object, apart: readonly string[]): string {
  return JSON.stringify(inOrder(Object.fromEntries(Object.entries(value).filter(([field]) => !apart.includes(field)))));
}

function inOrder(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(inOrder);
  if (typeof value !== 'object' || value === null) return value;
  return Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)).map(([field, each]) => [field, inOrder(each)]);
}

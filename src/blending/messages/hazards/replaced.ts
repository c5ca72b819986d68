/** What stands behind the source of a finding that was judged with the laboratory's own values. */
export function replacedWords(own: readonly (readonly [id: string, value: { readonly value: number; readonly source: string; readonly date: string }])[]): string {
  const list = own.map(([id, { value, source, date }]) => `${id} ${String(value)} (${source}, ${date})`).join('; ');
  return `laboratory’s own value: ${list}`;
}

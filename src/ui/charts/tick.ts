/** A tick with the real minus sign and without binary noise. */
export function tickText(value: number): string {
  return String(Number(value.toPrecision(6))).replace('-', '−');
}

/**
 * Least squares of small dense systems, plain and with non-negative unknowns.
 *
 * Source: C. L. Lawson, R. J. Hanson, Solving Least Squares Problems (1974),
 * chapters 11 (Householder) and 23 (algorithm NNLS).
 */

/** A dense matrix, row by row. */
export type Matrix = readonly (readonly number[])[];

/** Relative size below which a column counts as dependent on those before it. */
const DEPENDENT = 1e-12;

/**
 * Minimises |A z − b| over the listed columns of A by Householder reflections.
 * Returns one value per listed column; null when those columns are dependent.
 */
export function leastSquares(a: Matrix, b: readonly number[], columns: readonly number[]): number[] | null {
  const rows = a.length;
  const count = columns.length;
  if (count > rows) return null;
  const work = a.map((row) => columns.map((column) => row[column]!));
  const right = [...b];
  for (let k = 0; k < count; k++) {
    let norm = 0;
    for (let i = k; i < rows; i++) norm += work[i]![k]! ** 2;
    norm = Math.sqrt(norm);
    let whole = 0;
    for (let i = 0; i < rows; i++) whole += a[i]![columns[k]!]! ** 2;
    whole = Math.sqrt(whole);
    if (!(norm > DEPENDENT * whole)) return null;
    const pivot = work[k]![k]!;
    const head = pivot > 0 ? -norm : norm;
    const reflector = new Array<number>(rows).fill(0);
    reflector[k] = pivot - head;
    for (let i = k + 1; i < rows; i++) reflector[i] = work[i]![k]!;
    const scale = reflector[k]! * head;
    for (let j = k; j < count; j++) {
      let dot = 0;
      for (let i = k; i < rows; i++) dot += reflector[i]! * work[i]![j]!;
      for (let i = k; i < rows; i++) work[i]![j]! += (dot / scale) * reflector[i]!;
    }
    let dot = 0;
    for (let i = k; i < rows; i++) dot += reflector[i]! * right[i]!;
    for (let i = k; i < rows; i++) right[i]! += (dot / scale) * reflector[i]!;
  }
  const solution = new Array<number>(count).fill(0);
  for (let k = count - 1; k >= 0; k--) {
    let sum = right[k]!;
    for (let j = k + 1; j < count; j++) sum -= work[k]![j]! * solution[j]!;
    solution[k] = sum / work[k]![k]!;
  }
  return solution;
}

/**
 * Minimises |A z − b| with every z ≥ 0. Of dependent columns it uses one and
 * leaves the others at zero. Returns one value per column of A.
 */
export function nonNegativeLeastSquares(a: Matrix, b: readonly number[]): number[] {
  const count = a[0]?.length ?? 0;
  const z = new Array<number>(count).fill(0);
  const passive = new Set<number>();
  /** Columns that turned out dependent on the passive ones: not to be tried again. */
  const barred = new Set<number>();
  const scale = Math.max(1, ...b.map(Math.abs));
  for (let round = 0; round < 6 * count + 6; round++) {
    const entering = steepest(a, b, z, passive, barred, scale);
    if (entering === null) break;
    passive.add(entering);
    for (;;) {
      const columns = [...passive];
      const trial = leastSquares(a, b, columns);
      if (trial === null) {
        passive.delete(entering);
        barred.add(entering);
        break;
      }
      const blocking = columns.filter((_, index) => trial[index]! <= 0);
      if (blocking.length === 0) {
        z.fill(0);
        columns.forEach((column, index) => (z[column] = trial[index]!));
        break;
      }
      const step = Math.min(
        ...columns.map((column, index) => (trial[index]! <= 0 ? z[column]! / (z[column]! - trial[index]!) : Infinity)),
      );
      columns.forEach((column, index) => (z[column] = z[column]! + step * (trial[index]! - z[column]!)));
      for (const column of columns) {
        if (z[column]! <= 1e-15) {
          z[column] = 0;
          passive.delete(column);
        }
      }
      if (!passive.has(entering)) barred.add(entering);
      if (passive.size === 0) break;
    }
  }
  return z;
}

/** The idle column along which the error falls fastest; null when none helps. */
function steepest(
  a: Matrix, b: readonly number[], z: readonly number[],
  passive: ReadonlySet<number>, barred: ReadonlySet<number>, scale: number,
): number | null {
  const residual = b.map((value, i) => value - a[i]!.reduce((sum, entry, j) => sum + entry * z[j]!, 0));
  let best: number | null = null;
  let bestGradient = 0;
  for (let j = 0; j < z.length; j++) {
    if (passive.has(j) || barred.has(j)) continue;
    let gradient = 0;
    let length = 0;
    for (let i = 0; i < b.length; i++) {
      gradient += a[i]![j]! * residual[i]!;
      length += a[i]![j]! ** 2;
    }
    length = Math.sqrt(length);
    // Compared per unit of column length, or a trace component's long column would always win.
    const slope = length > 0 ? gradient / length : 0;
    if (slope > 1e-14 * scale && slope > bestGradient) {
      best = j;
      bestGradient = slope;
    }
  }
  return best;
}

/**
 * The density search where isotherms may turn over (about T ≤ 1.05 Tᵣ).
 *
 * Invariant: `low` lies on the gas branch, that is, p rises all the way from
 * zero density to it. On that branch ln p is concave in ln ρ until the turning
 * point, so Newton's steps from the left do not overshoot; where one does, the
 * stretch between is searched for a turning point before it is crossed.
 */
import type { MergedTerms } from '../terms/merged-terms.ts';
import { isMet, NEARLY } from './density-result.ts';
import type { DensityEnd, DensityResult } from './density-result.ts';

const MOST_ITERATIONS = 200;
/** A step may raise the density by this factor at most. */
const LONGEST_STEP = 1.5;
/** The turning point is located to this relative width. */
const TURNING_WIDTH = 1e-3;
/** An answer further than this from `low` was reached without seeing what lies between. */
const UNSEEN_STEP = 1.02;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

export class NearCriticalSearch {
  readonly #terms: MergedTerms;
  readonly #volume: number;
  readonly #target: number;
  #iterations = 0;
  // The last point evaluated.
  #density = 0;
  #ratio = 0;
  #z = 1;
  #stiffness = 1;
  // The bracket. `turned` is a density past the turning point with p too low.
  #low = 0;
  #lowStiffness = 1;
  #lowBefore = 0;
  #high = Infinity;
  #turned = Infinity;
  #crossed = false;

  constructor(terms: MergedTerms, volume: number, target: number) {
    this.#terms = terms;
    this.#volume = volume;
    this.#target = target;
  }

  /** Searches from the dilute side; B in m³/mol. */
  run(second: number): DensityResult {
    this.#evaluate(start(second, this.#target));
    while (this.#iterations < MOST_ITERATIONS) {
      if (this.#solved()) return this.#answer('found');
      this.#narrow();
      const bound = Math.min(this.#high, this.#turned);
      if (bound < Infinity && bound - this.#low <= 1e-12 * bound) {
        return this.#answer(this.#high > this.#turned ? 'no-gas-root' : this.#closed());
      }
      this.#evaluate(this.#next(bound));
    }
    return this.#answer('not-converged');
  }

  /** The bracket closed around one density: an answer if it meets p nearly. */
  #closed(): DensityEnd {
    return this.#rising() && Math.abs(this.#ratio - 1) < NEARLY ? 'found' : 'not-converged';
  }

  #evaluate(density: number): void {
    this.#iterations++;
    this.#terms.evaluate(density * this.#volume);
    this.#density = density;
    this.#z = 1 + this.#terms.delta1;
    this.#stiffness = 1 + 2 * this.#terms.delta1 + this.#terms.delta2;
    this.#ratio = density * this.#z / this.#target;
  }

  #rising(): boolean {
    return this.#stiffness > 0 && this.#z > 0 && Number.isFinite(this.#ratio);
  }

  /** Whether the last point is the answer: p met, on the gas branch. */
  #solved(): boolean {
    if (!this.#rising() || this.#density > Math.min(this.#high, this.#turned)) return false;
    return isMet(Math.abs(this.#ratio - 1), this.#z) && this.#sameBranch(this.#density > UNSEEN_STEP * this.#low);
  }

  /** Sharpens the bracket with the last point. */
  #narrow(): void {
    if (this.#rising() && this.#sameBranch(false)) {
      if (this.#ratio < 1) {
        this.#lowBefore = this.#low;
        this.#low = this.#density;
        this.#lowStiffness = this.#stiffness;
      } else {
        this.#high = this.#density;
      }
    } else if (this.#ratio >= 1) {
      this.#high = this.#density;
    } else {
      this.#turned = this.#density;
    }
  }

  /**
   * Whether p rises all the way from `low` to the last point. While the
   * stiffness falls step by step it does; once it rises, or if `search` asks
   * for it, the least value since the low before is sought by golden section.
   * If p turns over there, that point becomes the last one.
   */
  #sameBranch(search: boolean): boolean {
    if (this.#crossed || this.#low === 0) return true;
    if (!search && this.#stiffness <= this.#lowStiffness) return true;
    const reached = this.#density;
    let from = this.#lowBefore, to = reached;
    let left = to - GOLDEN * (to - from), right = from + GOLDEN * (to - from);
    let atLeft = this.#stiffnessAt(left), atRight = this.#stiffnessAt(right);
    while (to - from > TURNING_WIDTH * to) {
      if (!(atLeft > 0)) return false;
      if (atLeft < atRight) {
        to = right; right = left; atRight = atLeft;
        left = to - GOLDEN * (to - from);
        atLeft = this.#stiffnessAt(left);
      } else {
        from = left; left = right; atLeft = atRight;
        right = from + GOLDEN * (to - from);
        atRight = this.#stiffnessAt(right);
        if (!(atRight > 0)) return false;
      }
    }
    this.#crossed = true;
    this.#evaluate(reached);
    return true;
  }

  #stiffnessAt(density: number): number {
    this.#evaluate(density);
    return this.#stiffness;
  }

  /** Newton from the last point if it stays inside the bracket, else the middle of it. */
  #next(bound: number): number {
    if (this.#rising()) {
      const step = this.#density * Math.exp(-Math.log(this.#ratio) * this.#z / this.#stiffness);
      const next = Math.min(step, LONGEST_STEP * this.#density);
      if (next > this.#low && next < bound) return next;
    }
    if (bound === Infinity) return LONGEST_STEP * this.#density;
    return this.#low === 0 ? bound / 2 : Math.sqrt(this.#low) * Math.sqrt(bound);
  }

  #answer(end: DensityEnd): DensityResult {
    return { end, density: this.#density, iterations: this.#iterations, residual: Math.abs(this.#ratio - 1) };
  }
}

/**
 * A first density on the gas branch: the root of ρ(1 + Bρ) = target while that
 * lies well before its turning point −1/(2B), else halfway to the turning point.
 */
function start(second: number, target: number): number {
  if (second >= 0) return target;
  const discriminant = 1 + 4 * second * target;
  return discriminant > 0.25 ? 2 * target / (1 + Math.sqrt(discriminant)) : -1 / (4 * second);
}

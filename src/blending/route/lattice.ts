import type { Arrangement } from '../plan/arrangement.ts';
import { WIDTH, compareUnits } from './criteria.ts';
import { addCost, addPhaseCost, judgeAddition } from './judge.ts';
import type { Part } from './judge.ts';
import type { RouteProblem } from './problem.ts';
import type { Contents, FillState } from './states.ts';

/** A parent that goes in with two parts: its position in the problem, and the share of the early part. */
export interface SplitParent {
  readonly position: number;
  readonly share: number;
}

/**
 * All orders of one fill as paths through the subsets of its additions, after Held and Karp (J. SIAM
 * 10 (1962) 196): the state after some additions does not depend on their order, so the best way to
 * a subset is a best way to one with an addition less, and 2ⁿ subsets stand for n! orders. What does
 * depend on the addition before (at which temperature and on which gauge it was read) makes two nodes
 * of a subset. Costs are vectors of whole numbers compared lexicographically; adding the same to
 * two of them does not change which is better, which is all that the argument needs.
 *
 * Stability tests cost more than all the rest, so a state is first counted at the least that its phase can
 * cost; the states of the path found are tested, and the search is repeated until a path was tested before.
 */
export class Lattice {
  /** Additions, in the order of `RouteProblem.parents`; the late part of a split parent in its place, the early one last. */
  readonly parts: readonly Part[];
  readonly #problem: RouteProblem;
  readonly #split: SplitParent | null;
  readonly #full: number;
  /** The code of the contents with the early part alone. */
  readonly #inPart: number;
  /** By node: subset × readings + reading of the last addition; undefined: not reached, null: without an answer. */
  readonly #states: (FillState | null | undefined)[];
  readonly #from: Int32Array;
  readonly #to: Int32Array;
  readonly #added: Uint8Array;
  #edges = 0;
  /** `WIDTH` places an edge, without the phase of the state it leads to. */
  readonly #costs: Float64Array;
  readonly #phaseCosts: Float64Array;
  /** Best cost from the empty cylinder to a node, and the edge by which it is reached. */
  readonly #forward: Float64Array;
  readonly #by: Int32Array;
  /** Best cost from a node to the finished gas, and the edge that begins it. */
  readonly #backward: Float64Array;
  readonly #on: Int32Array;

  constructor(problem: RouteProblem, split: SplitParent | null) {
    this.#problem = problem;
    this.#split = split;
    const whole = problem.parents.map((parent): Part => ({ parent, share: 1, isLast: true }));
    if (split !== null) {
      const { parent } = whole[split.position]!;
      whole[split.position] = { parent, share: 1 - split.share, isLast: true };
      whole.push({ parent, share: split.share, isLast: false });
    }
    this.parts = whole;
    this.#full = 2 ** whole.length - 1;
    this.#inPart = split === null ? 0 : problem.book.partsCode(new Map([[split.position, split.share]]));
    const nodes = 2 ** whole.length * problem.readings;
    // Half of the subsets lack a given part.
    const mostEdges = (nodes / 2) * whole.length;
    this.#states = new Array<FillState | null | undefined>(nodes);
    this.#from = new Int32Array(mostEdges);
    this.#to = new Int32Array(mostEdges);
    this.#added = new Uint8Array(mostEdges);
    this.#costs = new Float64Array(mostEdges * WIDTH);
    this.#phaseCosts = new Float64Array(nodes * WIDTH);
    this.#forward = new Float64Array(nodes * WIDTH);
    this.#by = new Int32Array(nodes);
    this.#backward = new Float64Array(nodes * WIDTH);
    this.#on = new Int32Array(nodes);
    this.#makeEdges();
  }

  /** Transitions between states. */
  get size(): number {
    return this.#edges;
  }

  /** The best order, its states tested; null where every order passes a state without an answer. */
  best(): Arrangement | null {
    for (;;) {
      this.#search();
      const path = this.#pathTo(this.#bestEnd());
      if (path === null || !this.#testAlong(path)) return path === null ? null : this.#arrangement(path);
    }
  }

  /** The best order that is not `best()`; null where there is none. */
  second(): Arrangement | null {
    for (;;) {
      this.#search();
      const best = new Set(this.#pathTo(this.#bestEnd()) ?? []);
      let second = -1;
      const least = new Float64Array(WIDTH);
      this.#eachThrough((edge, cost) => {
        if (best.has(edge) || (second >= 0 && compareUnits(cost, 0, least, 0) >= 0)) return;
        second = edge;
        least.set(cost);
      });
      if (second < 0) return null;
      const path = this.#pathThrough(second);
      if (!this.#testAlong(path)) return this.#arrangement(path);
    }
  }

  /**
   * For each criterion the best order that is worse than `cost` (whole units, without what every order
   * has) by that criterion first, as far as states were tested.
   */
  bestByBrokenCriterion(cost: ArrayLike<number>): ReadonlyMap<number, Arrangement> {
    const edges = new Map<number, { readonly edge: number; readonly cost: Float64Array }>();
    this.#eachThrough((edge, through) => {
      let k = 0;
      while (k < WIDTH && through[k] === cost[k]) k++;
      if (k === WIDTH || through[k]! < cost[k]!) return;
      const known = edges.get(k);
      if (known === undefined || compareUnits(through, 0, known.cost, 0) < 0) edges.set(k, { edge, cost: Float64Array.from(through) });
    });
    return new Map([...edges].map(([k, { edge }]) => [k, this.#arrangement(this.#pathThrough(edge))]));
  }

  /** Whole units of the best order, without what every order has. */
  bestUnits(): Float64Array {
    const end = this.#bestEnd();
    return this.#forward.slice(end * WIDTH, (end + 1) * WIDTH);
  }

  #makeEdges(): void {
    const { readings } = this.#problem;
    // A subset comes after all of its own subsets, so every node is complete when its edges are made.
    for (let subset = 0; subset < this.#full; subset++) {
      for (let reading = 0; reading < readings; reading++) {
        const from = subset * readings + reading;
        const before = this.#states[from] ?? null;
        if (subset === 0 ? reading > 0 : before === null) continue;
        for (let k = 0; k < this.parts.length; k++) {
          if (((subset >> k) & 1) === 0 && this.#mayFollow(subset, k)) this.#addEdge(from, before, subset, k);
        }
      }
    }
  }

  #addEdge(from: number, before: FillState | null, subset: number, k: number): void {
    const part = this.parts[k]!;
    const next = subset | (1 << k);
    const to = next * this.#problem.readings + part.parent.reading;
    let after = this.#states[to];
    if (after === undefined) this.#states[to] = after = this.#problem.book.state(this.#contents(next), part.parent.reading);
    if (after === null) return;
    const judged = judgeAddition(this.#problem, before, after, part, next === this.#full);
    addCost(this.#problem, after, part, judged, this.#costs, this.#edges * WIDTH);
    this.#from[this.#edges] = from;
    this.#to[this.#edges] = to;
    this.#added[this.#edges] = k;
    this.#edges += 1;
  }

  /** The rest of a split parent waits for its early part. */
  #mayFollow(subset: number, k: number): boolean {
    return this.#split === null || k !== this.#split.position || ((subset >> (this.parts.length - 1)) & 1) === 1;
  }

  #contents(subset: number): Contents {
    if (this.#split === null) return { whole: subset, parts: 0 };
    const early = 1 << (this.parts.length - 1);
    const isInPart = (subset & early) !== 0 && ((subset >> this.#split.position) & 1) === 0;
    return { whole: subset & ~early, parts: isInPart ? this.#inPart : 0 };
  }

  /** Best costs to and from every node, with the phases known so far. */
  #search(): void {
    this.#phaseCosts.fill(0);
    const lastFrom = this.#full * this.#problem.readings;
    for (let node = 0; node < this.#states.length; node++) {
      const state = this.#states[node] ?? null;
      if (state !== null) addPhaseCost(this.#problem, state, node >= lastFrom, this.#phaseCosts, node * WIDTH);
    }
    const forward = this.#forward;
    this.#by.fill(-1);
    for (let edge = 0; edge < this.#edges; edge++) {
      const from = this.#from[edge]!, to = this.#to[edge]!;
      if (from !== 0 && this.#by[from]! < 0) continue;
      this.#relax(forward, from, edge, forward, to, this.#by);
    }
    const backward = this.#backward;
    this.#on.fill(-1);
    for (let edge = this.#edges - 1; edge >= 0; edge--) {
      const from = this.#from[edge]!, to = this.#to[edge]!;
      if (to < lastFrom && this.#on[to]! < 0) continue;
      this.#relax(backward, to, edge, backward, from, this.#on);
    }
  }

  /** Puts the cost at `near` plus that of an edge in the place of the one at `far`, if it is less. */
  #relax(source: Float64Array, near: number, edge: number, target: Float64Array, far: number, chosen: Int32Array): void {
    const cost = edge * WIDTH, phase = this.#to[edge]! * WIDTH, a = near * WIDTH, b = far * WIDTH;
    let isLess = chosen[far]! < 0;
    for (let k = 0; !isLess && k < WIDTH; k++) {
      const difference = source[a + k]! + this.#costs[cost + k]! + this.#phaseCosts[phase + k]! - target[b + k]!;
      if (difference > 0) return;
      isLess = difference < 0;
    }
    if (!isLess) return;
    for (let k = 0; k < WIDTH; k++) target[b + k] = source[a + k]! + this.#costs[cost + k]! + this.#phaseCosts[phase + k]!;
    chosen[far] = edge;
  }

  /** The node of the finished gas that is reached at the least cost; −1: none. */
  #bestEnd(): number {
    let best = -1;
    for (let reading = 0; reading < this.#problem.readings; reading++) {
      const node = this.#full * this.#problem.readings + reading;
      if (this.#by[node]! < 0) continue;
      if (best < 0 || compareUnits(this.#forward, node * WIDTH, this.#forward, best * WIDTH) < 0) best = node;
    }
    return best;
  }

  /** Every edge on a whole path, with the cost of the best path through it. */
  #eachThrough(visit: (edge: number, cost: Float64Array) => void): void {
    const cost = new Float64Array(WIDTH);
    const lastFrom = this.#full * this.#problem.readings;
    for (let edge = 0; edge < this.#edges; edge++) {
      const from = this.#from[edge]!, to = this.#to[edge]!;
      if ((from !== 0 && this.#by[from]! < 0) || (to < lastFrom && this.#on[to]! < 0)) continue;
      for (let k = 0; k < WIDTH; k++) {
        cost[k] = this.#forward[from * WIDTH + k]! + this.#costs[edge * WIDTH + k]! + this.#phaseCosts[to * WIDTH + k]! + this.#backward[to * WIDTH + k]!;
      }
      visit(edge, cost);
    }
  }

  #pathTo(end: number): number[] | null {
    if (end < 0) return null;
    const path: number[] = [];
    for (let node = end; node !== 0; node = this.#from[path[0]!]!) path.unshift(this.#by[node]!);
    return path;
  }

  #pathThrough(edge: number): number[] {
    const from = this.#from[edge]!;
    const path = [...(from === 0 ? [] : this.#pathTo(from)!), edge];
    for (let node = this.#to[edge]!; node < this.#full * this.#problem.readings; node = this.#to[path.at(-1)!]!) path.push(this.#on[node]!);
    return path;
  }

  #arrangement(path: readonly number[]): Arrangement {
    return path.map((edge) => {
      const { parent, share } = this.parts[this.#added[edge]!]!;
      return { parent: parent.index, share };
    });
  }

  /** Tests the states of a path; whether one had not been tested before. */
  #testAlong(path: readonly number[]): boolean {
    const untested = path.map((edge) => this.#states[this.#to[edge]!]!).filter(({ phase }) => phase === null);
    for (const state of untested) this.#problem.book.phaseOf(state);
    return untested.length > 0;
  }
}

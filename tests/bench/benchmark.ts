/** One thing whose speed matters. */
export interface Benchmark {
  readonly name: string;
  /** What is aimed at, as printed beside the figures. */
  readonly aim: string;
  /** Unit of the figure printed for one iteration. */
  readonly unit: 'µs' | 'ms';
  /**
   * Does the work `iterations` times, with other inputs each time, and gives a number made from all results, so that
   * no engine can leave the work out.
   */
  readonly run: (iterations: number) => number;
}

export interface Measurement {
  readonly name: string;
  readonly aim: string;
  readonly unit: 'µs' | 'ms';
  /** Median over the rounds of the time of one iteration, in `unit`. */
  readonly value: number;
}

const rounds = 9;
/** Long enough that a browser's coarse clock does not matter, ms. */
const roundLength_ms = 150;

function time_ms(benchmark: Benchmark, iterations: number): number {
  const begun = performance.now();
  const result = benchmark.run(iterations);
  const elapsed = performance.now() - begun;
  if (!Number.isFinite(result)) throw new Error(`"${benchmark.name}" gave ${result}: it does not measure real work.`);
  return elapsed;
}

/** The engine's last optimiser may need a second of steady work; a technician who types gets there too. */
const warmUp_ms = 1000;

/** Warms the code up, then finds how many iterations fill one round. */
function iterationsPerRound(benchmark: Benchmark): number {
  let iterations = 1;
  let spent = 0;
  for (;;) {
    const elapsed = time_ms(benchmark, iterations);
    spent += elapsed;
    if (spent >= warmUp_ms && elapsed >= roundLength_ms / 2) return Math.max(1, Math.round(iterations * (roundLength_ms / elapsed)));
    if (elapsed < roundLength_ms) iterations *= 2;
  }
}

/** Measures one benchmark: the median of several rounds. */
export function measure(benchmark: Benchmark): Measurement {
  const iterations = iterationsPerRound(benchmark);
  const times = Array.from({ length: rounds }, () => time_ms(benchmark, iterations) / iterations).sort((a, b) => a - b);
  const median_ms = times[Math.floor(rounds / 2)]!;
  const { name, aim, unit } = benchmark;
  return { name, aim, unit, value: unit === 'ms' ? median_ms : median_ms * 1000 };
}

import { measure } from './benchmark.ts';
import type { Benchmark, Measurement } from './benchmark.ts';
import { planBenchmarks } from './plan.ts';
import { thermoBenchmarks } from './thermo.ts';

/** Everything measured, in the order printed. */
const benchmarks: readonly Benchmark[] = [...thermoBenchmarks, ...planBenchmarks];

/** Runs all measurements in the engine this is loaded into; called by the bench script in Node and in the browser. */
export function measureAll(): Measurement[] {
  return benchmarks.map(measure);
}

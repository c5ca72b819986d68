import { loadRest } from '../../src/blending/index.ts';
import { measure } from './benchmark.ts';
import type { Benchmark, Measurement } from './benchmark.ts';
import { orderBenchmarks } from './order.ts';
import { phaseBenchmarks } from './phase.ts';
import { planBenchmarks } from './plan.ts';
import { thermoBenchmarks } from './thermo.ts';

/** Everything measured, in the order printed. */
const benchmarks: readonly Benchmark[] = [...thermoBenchmarks, ...phaseBenchmarks, ...planBenchmarks, ...orderBenchmarks];

/** Runs all measurements in the engine this is loaded into; called by the bench script in Node and in the browser. */
export async function measureAll(): Promise<Measurement[]> {
  await loadRest();
  return benchmarks.map(measure);
}

import { loadAllGases } from '../../src/thermo/index.ts';
import { measure } from './benchmark.ts';
import type { Benchmark, Measurement } from './benchmark.ts';
import { phaseBenchmarks } from './phase.ts';
import { planBenchmarks } from './plan.ts';
import { thermoBenchmarks } from './thermo.ts';

/** Everything measured, in the order printed. */
const benchmarks: readonly Benchmark[] = [...thermoBenchmarks, ...phaseBenchmarks, ...planBenchmarks];

/** Runs all measurements in the engine this is loaded into; called by the bench script in Node and in the browser. */
export async function measureAll(): Promise<Measurement[]> {
  await loadAllGases();
  return benchmarks.map(measure);
}

import { parseAmountFraction, pascal } from '../../units/index.ts';
import type { ConditioningStep, Parent } from './document.ts';
import type { JobConditioning } from './job.ts';
import type { FieldReader } from './reader.ts';

/** More cycles than anybody does by hand; a typed number above it is taken for a slip. */
export const MOST_CYCLES = 100;

/** Reads the acts on the cylinder before the first addition. Problems go to the reader. */
export function readConditioning(
  reader: FieldReader, steps: readonly ConditioningStep[], parents: readonly Parent[],
): readonly JobConditioning[] {
  return steps.map((step, index) => readStep(reader, `conditioning.${String(index)}`, step, parents));
}

function readStep(reader: FieldReader, field: string, step: ConditioningStep, parents: readonly Parent[]): JobConditioning {
  switch (step.kind) {
    case 'free':
      return step;
    case 'lower': {
      const to = reader.pressure(`${field}.to`, step.to, reader.barometer);
      reader.positive(`${field}.to`, to);
      return { kind: 'lower', to };
    }
    case 'purge': {
      const low = reader.pressure(`${field}.low`, step.low, pascal(1));
      const high = reader.pressure(`${field}.high`, step.high, reader.barometer);
      reader.positive(`${field}.low`, low);
      if (!(high > low)) reader.problems.push({ code: 'purge-not-above', field: `${field}.high` });
      const parent = parents.findIndex(({ key }) => key === step.parent);
      if (parent < 0) reader.problems.push({ code: 'purge-without-parent', field: `${field}.parent` });
      const cycles = step.cycles.trim() === '' ? null : reader.count(`${field}.cycles`, step.cycles, MOST_CYCLES);
      const wanted = reader.optional(`${field}.wanted`, step.wanted, (text) => {
        const entry = parseAmountFraction(text);
        return entry.ok ? { ok: true, value: { si: entry.value.fraction } } : entry;
      });
      if (wanted !== null) reader.positive(`${field}.wanted`, wanted);
      if (step.cycles.trim() === '' && step.wanted.trim() === '') {
        reader.problems.push({ code: 'purge-without-end', field: `${field}.cycles` });
      }
      return { kind: 'purge', parent: Math.max(0, parent), low, high, cycles, wanted };
    }
  }
}

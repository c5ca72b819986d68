import { parseRelative } from '../../units/index.ts';
import type { Batch, Recipe } from './document.ts';
import type { JobBatch, JobSplit } from './job.ts';
import type { FieldReader } from './reader.ts';

/** More than any manifold or morning holds; a larger number is taken for a slip. */
const MOST_CYLINDERS = 1000;

/** The parent added in two parts; null: none. Problems go to the reader. */
export function readSplit(reader: FieldReader, { parents, route }: Pick<Recipe, 'parents' | 'route'>): JobSplit | null {
  const { split, sequence } = route;
  const parent = parents.findIndex(({ key }) => key === split.parent);
  if (sequence !== 'as listed' || split.parent === '' || parent < 0) return null;
  const share = reader.read('route.split.share', parseRelative(split.share), 0.5);
  if (!(share > 0 && share < 1)) reader.problems.push({ code: 'share-outside', field: 'route.split.share' });
  const before = parents.findIndex(({ key }) => key === split.before);
  return { parent, share, before: before < 0 ? null : before };
}

/** How many cylinders, and how they are filled. Problems go to the reader. */
export function readBatch(reader: FieldReader, batch: Batch): JobBatch {
  return {
    cylinders: reader.count('batch.cylinders', batch.cylinders, MOST_CYLINDERS),
    together: batch.together,
    boosterInlet: reader.optionalPressure('batch.boosterInlet', batch.boosterInlet),
  };
}

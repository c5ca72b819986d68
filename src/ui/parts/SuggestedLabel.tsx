import { use, useMemo } from 'react';
import { loadClassification } from '../../blending/index.ts';
import type { Classification, ClassLine, Plan, SuggestedClass } from '../../blending/index.ts';

// Asked for as soon as a view that shows it is.
const tools = loadClassification();

/** Class and label lines that the finished gas may need, as planned and at worst. */
export function useSuggestion(plan: Plan): Classification {
  const { suggestClassification } = use(tools);
  return useMemo(() => suggestClassification(plan), [suggestClassification, plan]);
}

/** The lines of one suggestion in short: class, number and name, then statements. */
export function suggestionLines({ transport, statements, signalWord, notJudged }: SuggestedClass): readonly ClassLine[] {
  if (notJudged.length > 0) return notJudged.map((text) => ({ code: '', text, source: '', trust: 'computed' }));
  const word: readonly ClassLine[] = signalWord === null ? [] : [{ code: '', text: `Signal word: ${signalWord}`, source: '', trust: 'computed' }];
  return [...(transport?.lines ?? []), ...word, ...statements];
}

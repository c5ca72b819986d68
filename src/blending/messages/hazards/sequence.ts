import type { FindingWords } from '../../hazards/rule.ts';

export function orderNotSearched(): FindingWords {
  return {
    title: 'The best order of addition is not found yet',
    detail: 'Until it is, the smallest addition comes first and the balance gas last. Nothing says that this is the better order.',
    remedy: 'Wait a moment; if this stays, list the parents in the order wanted.',
  };
}

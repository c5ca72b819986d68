import { formatNumber } from '../../units/index.ts';
import type { EntryProblem } from '../../units/index.ts';

/** What is wrong with a typed quantity and what to type instead, in one sentence. */
export function entrySentence(problem: EntryProblem): string {
  const typed = `“${problem.text.trim()}”`;
  switch (problem.code) {
    case 'empty':
      return 'Nothing is entered here yet.';
    case 'not-a-number':
      return `${typed} does not start with a number.`;
    case 'ambiguous-number': {
      const [decimal, thousands] = problem.readings;
      return `${typed} can be read as ${trimmed(decimal)} or as ${trimmed(thousands)}: type it without the comma or the point that groups thousands.`;
    }
    case 'unknown-unit':
      return `The unit “${problem.unit}” is not known here${listed(problem.understood)}.`;
    case 'ambiguous-unit':
      return `The unit “${problem.unit}” can mean ${problem.readings.join(' or ')}: write it with its capitals.`;
    case 'unit-missing':
      return `${typed} needs a unit${listed(problem.understood)}.`;
    case 'below-absolute-zero':
      return `${typed} is not above absolute zero, −273.15 °C.`;
    case 'below-vacuum':
      return `${typed} ${problem.reference} is below a perfect vacuum.`;
    case 'barometer-missing':
      return 'A gauge pressure needs the barometric pressure of the day.';
    case 'negative':
      return `${typed} is negative.`;
    case 'above-one':
      return `${typed} is more than 100 %.`;
    case 'too-large':
      return `${typed} is larger than anything this program computes with.`;
  }
}

function listed(understood: readonly string[]): string {
  return understood.length === 0 ? '' : `; understood are ${understood.slice(0, 8).join(', ')}`;
}

function trimmed(value: number): string {
  return formatNumber(value, 6).replace(/\.?0+$/, '');
}

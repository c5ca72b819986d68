import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { standing, today } from '../../../../src/ui/tasks/stock/today.ts';

describe('today, by the clock of the machine', () => {
  beforeEach(() => { vi.useFakeTimers({ now: new Date(2026, 0, 5, 23, 59) }); });
  afterEach(() => { vi.useRealTimers(); });

  it('is written as dates in the stock are, in local time', () => {
    expect(today()).toBe('2026-01-05');
  });

  it('tells what has passed from what soon will: the day itself is still good, sixty days ahead is soon', () => {
    expect(['2026-01-04', '2026-01-05', '2026-03-06', '2026-03-07', '2027-01-05'].map(standing)).toEqual(['passed', 'soon', 'soon', 'later', 'later']);
  });

  it('says nothing of what is no day', () => {
    expect(['', 'soon', '2026-1-5', '05.01.2026'].map(standing)).toEqual(['none', 'none', 'none', 'none']);
  });
});

/** Today as `2026-12-01`, by the clock of this machine. */
export function today(): string {
  const now = new Date();
  const two = (part: number) => String(part).padStart(2, '0');
  return `${String(now.getFullYear())}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** How a date stands: passed, within the next 60 days, later, or not a day at all. */
export function standing(date: string): 'passed' | 'soon' | 'later' | 'none' {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(date)) return 'none';
  const now = today();
  if (date < now) return 'passed';
  const days = (Date.parse(date) - Date.parse(now)) / 86_400_000;
  return days <= 60 ? 'soon' : 'later';
}

const minuteMs = 60_000;

const dayMonth = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' });
const dayMonthYear = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const hourMinute = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

/** When something was, as one would say it: "a minute ago", "today 19:40", "yesterday", "30 Nov". */
export function relativeDate(iso: string, now: Date): string {
  const then = new Date(iso);
  const minutes = Math.floor((now.getTime() - then.getTime()) / minuteMs);
  if (minutes >= 0 && minutes < 1) return 'just now';
  if (minutes === 1) return 'a minute ago';
  if (minutes > 1 && minutes < 10) return `${minutes} minutes ago`;
  const days = daysBetween(then, now);
  if (days === 0) return `today ${hourMinute.format(then)}`;
  if (days === 1) return 'yesterday';
  return then.getFullYear() === now.getFullYear() ? dayMonth.format(then) : dayMonthYear.format(then);
}

/** Midnights between the two, by the reader's clock; summer time makes some days 23 or 25 hours long. */
function daysBetween(then: Date, now: Date): number {
  const midnight = (date: Date) => Date.UTC(date.getFullYear(), date.getMonth(), date.getDate());
  return Math.round((midnight(now) - midnight(then)) / (24 * 60 * minuteMs));
}

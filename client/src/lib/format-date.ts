const LOCALE = 'en-GB';

const dayMonth = new Intl.DateTimeFormat(LOCALE, { day: 'numeric', month: 'short' });
const dayMonthYear = new Intl.DateTimeFormat(LOCALE, {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
});
const clock = new Intl.DateTimeFormat(LOCALE, { hour: '2-digit', minute: '2-digit' });

const sameDay = (a: Date, b: Date) => a.toDateString() === b.toDateString();

/** A moment, as short as it stays clear: `10:42` today, `4 Dec` this year, `4 Dec 2025` before. */
export function formatMoment(iso: string, now: Date = new Date()): string {
  const moment = new Date(iso);
  if (Number.isNaN(moment.getTime())) return iso;
  if (sameDay(moment, now)) return clock.format(moment);
  const thisYear = moment.getFullYear() === now.getFullYear();
  return (thisYear ? dayMonth : dayMonthYear).format(moment);
}

/** A calendar day, `YYYY-MM-DD`: the same day wherever it is read. */
export function formatDay(day: string, now: Date = new Date()): string {
  const [year = 0, month = 1, date = 1] = day.split('-').map(Number);
  const local = new Date(year, month - 1, date);
  return (year === now.getFullYear() ? dayMonth : dayMonthYear).format(local);
}

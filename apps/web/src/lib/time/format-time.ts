const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const moment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
});

/** '3 Dec 2025', in the reader's time zone. */
export const formatDay = (iso: string): string => day.format(new Date(iso));

/** '3 Dec 2025, 14:05', in the reader's time zone. */
export const formatMoment = (iso: string): string => moment.format(new Date(iso));

const relative = new Intl.RelativeTimeFormat('en-GB', { numeric: 'auto' });
const STEPS: readonly [Intl.RelativeTimeFormatUnit, number][] = [
  ['day', 86_400],
  ['hour', 3_600],
  ['minute', 60],
];

/** 'yesterday', '3 hours ago'; the day itself once it is more than a week back. */
export function formatAgo(iso: string, now: number = Date.now()): string {
  const seconds = (now - new Date(iso).getTime()) / 1000;
  if (seconds > 7 * 86_400) return formatDay(iso);
  const step = STEPS.find(([, length]) => seconds >= length);
  return step === undefined ? 'just now' : relative.format(-Math.floor(seconds / step[1]), step[0]);
}

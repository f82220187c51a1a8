import { formatAgo, formatMoment } from '../../lib/time/format-time.ts';

/** A point in time in words, the exact one on hover and in the markup. */
export function Moment({ at, exact = false }: { at: string; exact?: boolean }) {
  return (
    <time dateTime={at} title={formatMoment(at)} className="whitespace-nowrap">
      {exact ? formatMoment(at) : formatAgo(at)}
    </time>
  );
}

/** A hash in full, broken anywhere, to be compared by eye or copied. */
export function HashLine({ label, hash }: { label: string; hash: string }) {
  return (
    <div>
      <dt className="text-[13px] text-ink-soft">{label}</dt>
      <dd className="figures m-0 text-xs wrap-anywhere select-all">{hash}</dd>
    </div>
  );
}

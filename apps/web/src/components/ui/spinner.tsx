/** A small turning arc; still where motion is not wanted. */
export function Spinner() {
  return (
    <svg viewBox="0 0 16 16" width="14" height="14" aria-hidden="true" className="motion-safe:animate-spin">
      <circle cx="8" cy="8" r="6" fill="none" stroke="currentColor" strokeOpacity="0.3" strokeWidth="2" />
      <path d="M8 2a6 6 0 0 1 6 6" fill="none" stroke="currentColor" strokeWidth="2" />
    </svg>
  );
}

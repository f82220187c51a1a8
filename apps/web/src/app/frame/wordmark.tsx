import { Link } from 'react-router-dom';

/** The name with a blade drawn root to tip beneath it. */
export function Wordmark() {
  return (
    <Link
      to="/"
      className="inline-flex min-h-8 items-center gap-2 text-ink no-underline"
      aria-label="Tipward, programmes"
    >
      <svg viewBox="0 0 44 14" width="44" height="14" aria-hidden="true">
        <path
          d="M1 9h5c3 0 4-6.500 9-6.500L43 7v1.200L15 9.800c-4 .2-6 1.200-9 1.200H1z"
          fill="currentColor"
        />
        <path d="M33 0v14" stroke="var(--accent)" strokeWidth="1.500" />
      </svg>
      <span className="text-base font-semibold tracking-tight">Tipward</span>
    </Link>
  );
}

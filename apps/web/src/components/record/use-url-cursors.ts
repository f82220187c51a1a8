import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';

function numberIn(params: URLSearchParams, name: string): number | null {
  const value = Number(params.get(name) ?? NaN);
  return Number.isFinite(value) ? value : null;
}

/** Span cursor (?r=, m) and operating cursor (?l=, λ) in the URL, so that a link shows what its sender saw. */
export function useUrlCursors() {
  const [params, setParams] = useSearchParams();
  const put = useCallback(
    (name: string, text: string) => {
      setParams(
        (before) => {
          const next = new URLSearchParams(before);
          next.set(name, text);
          return next;
        },
        { replace: true, preventScrollReset: true },
      );
    },
    [setParams],
  );
  const setRadius = useCallback(
    (radiusM: number) => {
      put('r', radiusM.toFixed(3));
    },
    [put],
  );
  const setTipSpeedRatio = useCallback(
    (lambda: number) => {
      put('l', lambda.toFixed(2));
    },
    [put],
  );
  return {
    radiusM: numberIn(params, 'r'),
    tipSpeedRatio: numberIn(params, 'l'),
    setRadius,
    setTipSpeedRatio,
  };
}

import { getAirfoil } from '@tipward/contract';
import type { Airfoil, PinnedAirfoil } from '@tipward/contract';
import { useQueries } from '@tanstack/react-query';
import { useMemo } from 'react';
import { apiQuery } from '../../../lib/api/api-query.ts';

export interface PinnedAirfoils {
  /** All of them, in the order pinned; null until the last has come. One array for one set. */
  readonly airfoils: readonly Airfoil[] | null;
  readonly error: Error | null;
}

/** The airfoils a content pins, outlines and polars included. They never change, so they are read once. */
export function usePinnedAirfoils(pinned: readonly PinnedAirfoil[]): PinnedAirfoils {
  const { loaded, error } = useQueries({
    queries: pinned.map((foil) => ({
      ...apiQuery(getAirfoil, { params: { airfoilId: foil.airfoilId } }),
      staleTime: Infinity,
    })),
    combine: (results) => ({
      loaded: results.map((result) => result.data),
      error: results.find((result) => result.error !== null)?.error ?? null,
    }),
  });
  const key = loaded.map((foil) => foil?.id ?? '').join(' ');
  const airfoils = useMemo(
    () => (loaded.some((foil) => foil === undefined) ? null : loaded.flatMap((foil) => foil ?? [])),
    // `loaded` is a new array each time; which airfoils it holds is told by their ids.
    // eslint-disable-next-line react-hooks/exhaustive-deps -- airfoils never change under one id
    [key],
  );
  return { airfoils, error };
}

import type { Version } from '@tipward/contract';
import type { AirfoilData, BladeSurface, LiveResult } from '@tipward/design-model';
import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { SpecificationIssue } from '@tipward/contract';
import type { SolverContext } from '../../../lib/solver/protocol.ts';
import type { Latest } from '../../../lib/solver/use-latest.ts';
import { usePinnedAirfoils } from '../api/get-airfoil.ts';
import { useReferenceVersion } from '../api/get-version.ts';
import { surfaceOf } from '../lib/surface-of.ts';
import type { DrawnReference } from '../lib/studio-series.ts';
import type { Solvable } from './use-solver.ts';

export const NO_REFERENCE = 'none';

export interface Reference {
  /** Id of the version compared with, 'none' when a person chose none. */
  readonly chosen: string;
  readonly choose: (versionId: string) => void;
  readonly version: Version | null;
  readonly error: Error | null;
  readonly solvable: Solvable | null;
  readonly surface: BladeSurface | null;
}

const NO_AIRFOILS: Version['content']['airfoils'] = [];

/** A specification issue and the airfoils, as the solver takes them; null until both are there. */
export function useSolverContext(
  issue: SpecificationIssue | undefined,
  airfoils: readonly AirfoilData[] | null,
): SolverContext | null {
  return useMemo(
    () =>
      issue === undefined || airfoils === null
        ? null
        : {
            specification: issue.specification,
            specificationHash: issue.specificationHash,
            requirements: issue.requirements,
            airfoils,
          },
    [issue, airfoils],
  );
}

/** The version a draft is held against: its parent, unless the link names another (?ref=) or none. */
export function useReference(parentId: string | null, issues: readonly SpecificationIssue[]): Reference {
  const [query, setQuery] = useSearchParams();
  const chosen = query.get('ref') ?? parentId ?? NO_REFERENCE;
  const { data, error } = useReferenceVersion(chosen === NO_REFERENCE ? null : chosen);
  const version = chosen === NO_REFERENCE ? null : (data ?? null);
  const { airfoils } = usePinnedAirfoils(version?.content.airfoils ?? NO_AIRFOILS);
  const issue = issues.find((each) => each.issue === version?.specificationIssue);
  const context = useSolverContext(issue, airfoils);
  const solvable = useMemo(
    () => (version === null || context === null ? null : { content: version.content, context }),
    [version, context],
  );
  const surface = useMemo(() => surfaceOf(version?.content ?? null, airfoils), [version, airfoils]);
  const choose = (versionId: string) => {
    setQuery(
      (before) => {
        const next = new URLSearchParams(before);
        if (versionId === (parentId ?? NO_REFERENCE)) next.delete('ref');
        else next.set('ref', versionId);
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  };
  return { chosen, choose, version, error: chosen === NO_REFERENCE ? null : error, solvable, surface };
}

/** The reference as it is drawn; null until it is solved for the cursor in hand. */
export function useDrawnReference(version: Version | null, live: Latest<LiveResult>): DrawnReference | null {
  const solved = version !== null && live.current ? live.output : null;
  return useMemo(
    () => (version === null || solved === null ? null : { label: version.label, live: solved }),
    [version, solved],
  );
}

import type { DesignContent, Evaluation } from '@tipward/contract';

interface Item {
  readonly content: DesignContent;
  readonly evaluation: Evaluation | null;
}

const varies = (items: readonly unknown[]) => new Set(items.map((item) => JSON.stringify(item))).size > 1;

/** Names every way in which the inputs of a comparison differ beyond the blade itself; empty when it is like for like. */
export function likeForLike(items: readonly Item[]): string[] {
  const contents = items.map((item) => item.content);
  const found: string[] = [];
  const differ = (
    what: string,
    pick: (content: DesignContent) => unknown,
    show: (content: DesignContent) => string,
  ) => {
    if (varies(contents.map(pick))) found.push(`${what}: ${[...new Set(contents.map(show))].join(', ')}`);
  };
  differ(
    'Specification issue',
    (c) => c.specificationIssue,
    (c) => `issue ${c.specificationIssue}`,
  );
  differ(
    'Surface state',
    (c) => c.settings.surfaceState,
    (c) => c.settings.surfaceState,
  );
  differ(
    'Pitch',
    (c) => c.pitchDeg,
    (c) => `${c.pitchDeg}°`,
  );
  differ(
    'High-induction relation',
    (c) => c.settings.highInduction,
    (c) => c.settings.highInduction,
  );
  differ(
    'Loss factors',
    (c) => [c.settings.tipLoss, c.settings.hubLoss],
    (c) => `tip ${c.settings.tipLoss ? 'on' : 'off'}, hub ${c.settings.hubLoss ? 'on' : 'off'}`,
  );
  differ(
    'Drag in induction',
    (c) => c.settings.dragInInduction,
    (c) => (c.settings.dragInInduction ? 'on' : 'off'),
  );
  differ(
    'Elements',
    (c) => c.settings.elements,
    (c) => String(c.settings.elements),
  );
  for (const name of new Set(contents.flatMap((c) => c.airfoils.map((foil) => foil.name)))) {
    const hashes = contents.flatMap((c) =>
      c.airfoils.filter((foil) => foil.name === name).map((foil) => foil.polarSetHash),
    );
    if (varies(hashes))
      found.push(`Polars of ${name}: ${[...new Set(hashes)].map((hash) => hash.slice(0, 8)).join(', ')}`);
  }
  const solvers = items.flatMap((item) => (item.evaluation === null ? [] : [item.evaluation.solver.version]));
  if (varies(solvers)) found.push(`Solver version: ${[...new Set(solvers)].join(', ')}`);
  return found;
}

import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { Polar, Rotor } from '../src/index.ts';

/** The reference program, compiled; `run` solves the surface `rounds` times in a process of its own. */
export interface CReference {
  run(rounds: number): { milliseconds: number; checksum: number }[];
  remove(): void;
}

const SOURCE = fileURLToPath(new URL('reference.c', import.meta.url));

function polarNumbers(polar: Polar): number[] {
  const { nodes } = polar;
  const rows = Array.from(polar.alpha, (alpha, i) => [alpha, polar.cl[i] ?? 0, polar.cd[i] ?? 0]).flat();
  const columns = [
    nodes.alpha,
    nodes.cl,
    nodes.cd,
    nodes.clSlopeBefore,
    nodes.clSlopeAfter,
    nodes.cdSlopeBefore,
    nodes.cdSlopeAfter,
  ];
  const nodeRows = Array.from(nodes.alpha, (_, i) => columns.map((column) => column[i] ?? 0)).flat();
  return [polar.alpha.length, ...rows, nodes.alpha.length, ...nodeRows];
}

function caseNumbers(rotor: Rotor, ratios: readonly number[], pitches: readonly number[]): number[] {
  const polars = [...new Set(rotor.elements.map((element) => element.polar))];
  const elements = rotor.elements.flatMap((element) => [
    element.radiusM,
    element.chordM,
    element.twistRad,
    element.widthM,
    element.loss.tip,
    element.loss.hub,
    polars.indexOf(element.polar),
  ]);
  return [
    polars.length,
    ...polars.flatMap(polarNumbers),
    rotor.bladeCount,
    rotor.elements.length,
    rotor.tipRadiusM,
    ...elements,
    ratios.length,
    ...ratios,
    pitches.length,
    ...pitches.map((pitch) => (pitch * Math.PI) / 180),
  ];
}

/** Null where no C compiler answers to `cc`. */
export function compileReference(
  rotor: Rotor,
  ratios: readonly number[],
  pitches: readonly number[],
): CReference | null {
  if (spawnSync('cc', ['--version']).status !== 0) return null;
  const folder = mkdtempSync(join(tmpdir(), 'tipward-bench-'));
  const program = join(folder, 'reference');
  execFileSync('cc', ['-O3', '-o', program, SOURCE, '-lm'], { stdio: 'inherit' });
  const numbers = caseNumbers(rotor, ratios, pitches);
  return {
    run: (rounds) =>
      execFileSync(program, { input: [rounds, ...numbers].join(' '), encoding: 'utf8' })
        .trim()
        .split('\n')
        .map((line) => {
          const [milliseconds, checksum] = line.split(' ').map(Number);
          return { milliseconds: milliseconds ?? NaN, checksum: checksum ?? NaN };
        }),
    remove: () => {
      rmSync(folder, { recursive: true });
    },
  };
}

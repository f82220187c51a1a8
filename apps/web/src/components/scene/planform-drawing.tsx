import type { BladeSurface } from '@tipward/design-model';
import { useMemo } from 'react';
import { useSpanAxis } from '../plots/span-axis-context.ts';
import { planformEdges, rowAt } from './surface-rows.ts';

const SECTIONS = [0.05, 0.25, 0.45, 0.65, 0.85] as const;

/** Outline of the planform, leading edge up, on the shared pixel axis. */
function planformPath(surface: BladeSurface, x: (r: number) => number, y: (m: number) => number): string {
  const edges = planformEdges(surface);
  const point = (radiusM: number, edgeM: number) => `${x(radiusM).toFixed(2)} ${y(edgeM).toFixed(2)}`;
  const leading = edges.map((edge) => point(edge.radiusM, edge.leadingM));
  const trailing = edges.toReversed().map((edge) => point(edge.radiusM, edge.trailingM));
  return `M${[...leading, ...trailing].join('L')}Z`;
}

/** A section as seen from the tip, chordwise to the right, at its own radius on the axis. */
function sectionPath(surface: BladeSurface, row: number, x: number, y: number, scale: number): string {
  const points = Array.from({ length: surface.columns }, (_, column) => {
    const at = (row * surface.columns + column) * 3;
    const along = surface.positions[at + 1] ?? 0;
    const up = surface.positions[at + 2] ?? 0;
    return `${(x - along * scale).toFixed(2)} ${(y - up * scale).toFixed(2)}`;
  });
  return `M${points.join('L')}Z`;
}

/** Planform and sections drawn flat, for machines without WebGL. */
export function PlanformDrawing({
  surface,
  reference,
  cursorRadiusM,
  height,
}: {
  surface: BladeSurface;
  reference: BladeSurface | null;
  cursorRadiusM: number | null;
  height: number;
}) {
  const axis = useSpanAxis();
  const drawing = useMemo(() => {
    const zoom = (axis.right - axis.left) / (axis.tipRadiusM - axis.hubRadiusM);
    const middle = height * 0.36;
    const y = (m: number) => middle - m * zoom;
    const chords = planformEdges(surface).map((edge) => edge.leadingM - edge.trailingM);
    const room = Math.min((axis.right - axis.left) / SECTIONS.length - 8, height * 0.34);
    const sectionScale = room / Math.max(...chords, 1e-6);
    const span = axis.tipRadiusM - axis.hubRadiusM;
    return {
      planform: planformPath(surface, axis.scale, y),
      ghost: reference === null ? null : planformPath(reference, axis.scale, y),
      sections: SECTIONS.flatMap((share) => {
        const radiusM = axis.hubRadiusM + share * span;
        const at = rowAt(surface, radiusM);
        if (at === null) return [];
        const x = axis.scale(radiusM);
        return [{ radiusM, path: sectionPath(surface, at.row, x, height * 0.8, sectionScale) }];
      }),
    };
  }, [surface, reference, axis, height]);
  return (
    <svg
      width={axis.width}
      height={height}
      role="img"
      aria-label="Planform and sections of the blade, root left, tip right"
      className="block"
    >
      {drawing.ghost !== null && (
        <path d={drawing.ghost} fill="none" stroke="var(--series-2)" strokeDasharray="6 4" />
      )}
      <path d={drawing.planform} fill="var(--panel)" stroke="var(--series-1)" strokeWidth={1.5} />
      {drawing.sections.map((section) => (
        <path key={section.radiusM} d={section.path} fill="none" stroke="var(--ink-soft)" />
      ))}
      {cursorRadiusM !== null && (
        <line
          x1={axis.scale(cursorRadiusM)}
          x2={axis.scale(cursorRadiusM)}
          y1={0}
          y2={height}
          stroke="var(--ink)"
          strokeWidth={0.75}
        />
      )}
    </svg>
  );
}

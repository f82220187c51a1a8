import type { BladeSurface } from '@tipward/design-model';
import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry, Line, LineBasicMaterial } from 'three';
import { writeSection } from './surface-rows.ts';

/** Writes a section into the line's own buffers. */
function drawRing(
  { geometry, material }: Line<BufferGeometry, LineBasicMaterial>,
  surface: BladeSurface,
  radiusM: number | null,
  color: string,
  opacity: number,
): void {
  const position = geometry.getAttribute('position');
  const drawn = radiusM !== null && writeSection(surface, radiusM, position.array as Float32Array);
  position.needsUpdate = true;
  material.color.set(color);
  material.opacity = opacity;
  geometry.setDrawRange(0, drawn ? surface.columns : 0);
}

/** The section of the blade at a radius as a line around it; hidden off the blade. */
export function SectionRing({
  surface,
  radiusM,
  color,
  opacity = 1,
}: {
  surface: BladeSurface;
  radiusM: number | null;
  color: string;
  opacity?: number;
}) {
  const invalidate = useThree((state) => state.invalidate);
  const { columns } = surface;
  const ring = useMemo(() => {
    const geometry = new BufferGeometry();
    geometry.setAttribute('position', new BufferAttribute(new Float32Array(columns * 3), 3));
    const line = new Line(geometry, new LineBasicMaterial({ transparent: true, depthTest: false }));
    line.frustumCulled = false;
    line.renderOrder = 2;
    return line;
  }, [columns]);
  useEffect(
    () => () => {
      ring.geometry.dispose();
      ring.material.dispose();
    },
    [ring],
  );
  useLayoutEffect(() => {
    drawRing(ring, surface, radiusM, color, opacity);
    invalidate();
  }, [ring, surface, radiusM, color, opacity, invalidate]);
  return <primitive object={ring} />;
}

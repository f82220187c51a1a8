import type { BladeSurface } from '@tipward/design-model';
import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry, DoubleSide } from 'three';
import { surfaceIndex } from './surface-rows.ts';

/** One blade's skin. Its buffers are written in place while the mesh keeps its size, and freed when it goes. */
export function BladeMesh({
  surface,
  color,
  ghost = false,
}: {
  surface: BladeSurface;
  color: string;
  ghost?: boolean;
}) {
  const invalidate = useThree((state) => state.invalidate);
  const { rows, columns } = surface;
  const geometry = useMemo(() => {
    const made = new BufferGeometry();
    made.setAttribute('position', new BufferAttribute(new Float32Array(rows * columns * 3), 3));
    made.setIndex(new BufferAttribute(surfaceIndex(rows, columns), 1));
    return made;
  }, [rows, columns]);
  useEffect(
    () => () => {
      geometry.dispose();
    },
    [geometry],
  );
  useLayoutEffect(() => {
    const position = geometry.getAttribute('position');
    (position.array as Float32Array).set(surface.positions);
    position.needsUpdate = true;
    geometry.computeVertexNormals();
    geometry.computeBoundingSphere();
    invalidate();
  }, [geometry, surface, invalidate]);
  return (
    <mesh geometry={geometry} renderOrder={ghost ? 1 : 0}>
      {ghost ? (
        // Pushed back, so that it shows only where it stands out beyond the blade in hand.
        <meshBasicMaterial
          color={color}
          side={DoubleSide}
          transparent
          opacity={0.4}
          depthWrite={false}
          polygonOffset
          polygonOffsetFactor={4}
          polygonOffsetUnits={16}
        />
      ) : (
        <meshStandardMaterial color={color} side={DoubleSide} roughness={0.75} metalness={0} />
      )}
    </mesh>
  );
}

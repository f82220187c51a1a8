import type { BladeSurface } from '@tipward/design-model';
import { Canvas } from '@react-three/fiber';
import type { BladeView, SpanFraming } from './blade-views.ts';
import { BladeMesh } from './blade-mesh.tsx';
import { useSceneColors } from './scene-colors.ts';
import { SectionRing } from './section-ring.tsx';
import { SpanCamera } from './span-camera.tsx';

export interface BladeSceneProps {
  readonly surface: BladeSurface;
  readonly reference: BladeSurface | null;
  readonly stationRadiiM: readonly number[];
  readonly cursorRadiusM: number | null;
  readonly framing: SpanFraming;
  readonly view: BladeView;
  readonly viewSerial: number;
  readonly onOrbit: () => void;
}

/** The blade in three dimensions, drawn only when something changed. */
export default function BladeScene(props: BladeSceneProps) {
  const { surface, reference, stationRadiiM, cursorRadiusM, framing, view, viewSerial, onOrbit } = props;
  const colors = useSceneColors();
  return (
    <Canvas
      orthographic
      frameloop="demand"
      dpr={[1, 2]}
      flat
      camera={{ position: [0, 0, framing.distanceM] }}
    >
      <hemisphereLight args={['#ffffff', '#8a8578', 1.6]} />
      <directionalLight position={[-20, 60, 80]} intensity={1.8} />
      <directionalLight position={[20, -40, -80]} intensity={0.9} />
      <SpanCamera framing={framing} view={view} viewSerial={viewSerial} onOrbit={onOrbit} />
      <BladeMesh surface={surface} color={colors.blade} />
      {reference !== null && <BladeMesh surface={reference} color={colors.ghost} ghost />}
      {stationRadiiM.map((radiusM, i) => (
        <SectionRing key={i} surface={surface} radiusM={radiusM} color={colors.station} opacity={0.35} />
      ))}
      <SectionRing surface={surface} radiusM={cursorRadiusM} color={colors.ring} />
    </Canvas>
  );
}

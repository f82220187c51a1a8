import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useRef } from 'react';
import { OrthographicCamera } from 'three';
import { OrbitControls } from 'three/addons/controls/OrbitControls.js';
import type { BladeView, SpanFraming } from './blade-views.ts';
import { BLADE_VIEWS } from './blade-views.ts';

/** Puts the camera where a named view looks from, the span on the shared axis. */
function standAt(camera: OrthographicCamera, framing: SpanFraming, view: BladeView): void {
  const { from, up } = BLADE_VIEWS[view];
  const length = Math.hypot(...from);
  const reach = framing.distanceM / length;
  camera.up.set(up[0], up[1], up[2]);
  camera.position.set(framing.centreM + from[0] * reach, from[1] * reach, from[2] * reach);
  camera.zoom = framing.zoom;
  camera.near = 0.01;
  camera.far = 2 * framing.distanceM;
  camera.lookAt(framing.centreM, 0, 0);
  camera.updateProjectionMatrix();
}

/** Holds the camera: a named view on the shared axis, until a drag orbits away from it. */
export function SpanCamera({
  framing,
  view,
  viewSerial,
  onOrbit,
}: {
  framing: SpanFraming;
  view: BladeView;
  /** Grows each time a view is asked for, so that the same one can be asked for again. */
  viewSerial: number;
  onOrbit: () => void;
}) {
  const camera = useThree((state) => state.camera);
  const canvas = useThree((state) => state.gl.domElement);
  const invalidate = useThree((state) => state.invalidate);
  const controls = useRef<OrbitControls | null>(null);
  const orbit = useRef(onOrbit);
  useEffect(() => {
    orbit.current = onOrbit;
  }, [onOrbit]);

  useEffect(() => {
    const made = new OrbitControls(camera, canvas);
    made.enablePan = false;
    made.enableDamping = false;
    const change = () => {
      invalidate();
    };
    const start = () => {
      orbit.current();
    };
    made.addEventListener('change', change);
    made.addEventListener('start', start);
    controls.current = made;
    return () => {
      made.removeEventListener('change', change);
      made.removeEventListener('start', start);
      made.dispose();
      controls.current = null;
    };
  }, [camera, canvas, invalidate]);

  useLayoutEffect(() => {
    if (!(camera instanceof OrthographicCamera)) return;
    standAt(camera, framing, view);
    invalidate();
  }, [camera, framing, view, viewSerial, invalidate]);

  // After the view, so that the controls turn about the blade and learn the new 'up'.
  useEffect(() => {
    const held = controls.current;
    if (held === null) return;
    held.target.set(framing.centreM, 0, 0);
    held.update();
  }, [camera, framing, view, viewSerial]);
  return null;
}

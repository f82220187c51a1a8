import { useSyncExternalStore } from 'react';

export interface SceneColors {
  readonly blade: string;
  readonly ghost: string;
  readonly ring: string;
  readonly station: string;
}

const NAMES = {
  blade: '--rule-strong',
  ghost: '--series-2',
  ring: '--accent',
  station: '--ink-soft',
} as const;
const FALLBACK: SceneColors = { blade: '#c9c4b4', ghost: '#5a6f8c', ring: '#c8502a', station: '#5b6472' };

function read(): string {
  const style = getComputedStyle(document.documentElement);
  const colors = Object.fromEntries(
    Object.entries(NAMES).map(([key, name]) => [key, style.getPropertyValue(name).trim()]),
  );
  return JSON.stringify(colors);
}

function subscribe(listener: () => void): () => void {
  const observer = new MutationObserver(listener);
  observer.observe(document.documentElement, {
    attributes: true,
    attributeFilter: ['class', 'data-theme', 'style'],
  });
  const scheme = window.matchMedia('(prefers-color-scheme: dark)');
  scheme.addEventListener('change', listener);
  return () => {
    observer.disconnect();
    scheme.removeEventListener('change', listener);
  };
}

/** The theme's colours as plain values, since WebGL knows no CSS variables; followed when the theme changes. */
export function useSceneColors(): SceneColors {
  const text = useSyncExternalStore(subscribe, read);
  const found = JSON.parse(text) as Partial<SceneColors>;
  return {
    blade: found.blade || FALLBACK.blade,
    ghost: found.ghost || FALLBACK.ghost,
    ring: found.ring || FALLBACK.ring,
    station: found.station || FALLBACK.station,
  };
}

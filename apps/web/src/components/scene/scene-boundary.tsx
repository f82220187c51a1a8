import { Component } from 'react';
import type { ReactNode } from 'react';

/** Catches a renderer that cannot start (no WebGL) and shows the flat drawing instead. */
export class SceneBoundary extends Component<
  { fallback: (reason: string) => ReactNode; children: ReactNode },
  { reason: string | null }
> {
  override state: { reason: string | null } = { reason: null };

  static getDerivedStateFromError(error: unknown): { reason: string } {
    return { reason: error instanceof Error ? error.message : String(error) };
  }

  override render(): ReactNode {
    return this.state.reason === null ? this.props.children : this.props.fallback(this.state.reason);
  }
}

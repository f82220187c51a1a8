import type { DraftContent } from '@tipward/contract';

interface Step {
  /** What was done, for the undo button: 'Chord at station 4'. */
  readonly label: string;
  /** Edits with one key that follow each other are one step: the keys typed into one cell. */
  readonly mergeKey: string | null;
  readonly content: DraftContent;
}

/** The draft under edit. `past` holds contents before each step, `future` those after each undone one. */
export interface StudioState {
  readonly content: DraftContent;
  readonly past: readonly Step[];
  readonly future: readonly Step[];
}

export type StudioAction =
  | {
      readonly type: 'change';
      readonly label: string;
      readonly mergeKey?: string;
      readonly change: (content: DraftContent) => DraftContent;
    }
  /** Takes a merged edit back as if it never was: Escape in a cell. */
  | { readonly type: 'cancel'; readonly mergeKey: string }
  | { readonly type: 'undo' }
  | { readonly type: 'redo' };

const STEPS_KEPT = 500;

export const startState = (content: DraftContent): StudioState => ({ content, past: [], future: [] });

function changed(state: StudioState, action: Extract<StudioAction, { type: 'change' }>): StudioState {
  const content = action.change(state.content);
  if (content === state.content) return state;
  const mergeKey = action.mergeKey ?? null;
  const last = state.past.at(-1);
  const merges = mergeKey !== null && last?.mergeKey === mergeKey && state.future.length === 0;
  const past = merges
    ? state.past
    : [...state.past, { label: action.label, mergeKey, content: state.content }];
  return { content, past: past.slice(-STEPS_KEPT), future: [] };
}

export function studioReducer(state: StudioState, action: StudioAction): StudioState {
  switch (action.type) {
    case 'change':
      return changed(state, action);
    case 'cancel': {
      const last = state.past.at(-1);
      if (last?.mergeKey !== action.mergeKey) return state;
      return { ...state, content: last.content, past: state.past.slice(0, -1) };
    }
    case 'undo': {
      const last = state.past.at(-1);
      if (last === undefined) return state;
      return {
        content: last.content,
        past: state.past.slice(0, -1),
        future: [...state.future, { label: last.label, mergeKey: null, content: state.content }],
      };
    }
    case 'redo': {
      const next = state.future.at(-1);
      if (next === undefined) return state;
      return {
        content: next.content,
        past: [...state.past, { label: next.label, mergeKey: null, content: state.content }],
        future: state.future.slice(0, -1),
      };
    }
  }
}

import type { Draft, DraftContent } from '@tipward/contract';
import { ApiProblem, asProblem } from '../../../lib/api/api-problem.ts';
import { mayPass } from '../../../lib/api/query-client.ts';
import type { KeptEdits } from './kept-edits.ts';

export type SaveState =
  | { readonly kind: 'saved' }
  /** Edited; the save follows when typing pauses. */
  | { readonly kind: 'waiting' }
  | { readonly kind: 'saving' }
  /** No answer: kept on this machine (or only in this page when storage is shut off) and tried again. */
  | { readonly kind: 'offline'; readonly keptHere: boolean }
  /** The server will not have it; trying again would not help. */
  | { readonly kind: 'refused'; readonly message: string; readonly keptHere: boolean }
  /** Someone saved meanwhile: both stand side by side until a person chooses. */
  | { readonly kind: 'conflict'; readonly stored: Draft; readonly storedETag: string };

export interface AutosaverSettings {
  readonly etag: string;
  readonly save: (content: DraftContent, etag: string) => Promise<{ etag: string }>;
  readonly kept: KeptEdits;
  readonly debounceMs?: number;
  readonly now?: () => string;
}

const DEBOUNCE_MS = 800;
const FIRST_RETRY_MS = 2000;
const LONGEST_RETRY_MS = 30_000;

/** Saves a draft when typing pauses, one request at a time, each on the ETag of the one before. */
export class Autosaver {
  private state: SaveState = { kind: 'saved' };
  private etag: string;
  private unsaved: DraftContent | null = null;
  private timer: ReturnType<typeof setTimeout> | null = null;
  private saving: Promise<void> | null = null;
  private retryMs = FIRST_RETRY_MS;
  private keptHere = false;
  private readonly listeners = new Set<() => void>();
  private readonly settings: AutosaverSettings;

  constructor(settings: AutosaverSettings) {
    this.settings = settings;
    this.etag = settings.etag;
  }

  readonly getState = (): SaveState => this.state;

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => {
      this.listeners.delete(listener);
    };
  };

  /** ETag of the draft as stored, as far as is known here. */
  currentETag(): string {
    return this.etag;
  }

  edit(content: DraftContent): void {
    this.unsaved = content;
    this.keptHere = this.settings.kept.keep(content, this.etag, this.now());
    if (this.state.kind === 'conflict' || this.state.kind === 'offline') return;
    if (this.saving === null) this.set({ kind: 'waiting' });
    this.schedule(this.settings.debounceMs ?? DEBOUNCE_MS);
  }

  /** Saves what is unsaved now. Resolves when it is stored, or when it is known why not (see the state). */
  async flush(): Promise<void> {
    this.unschedule();
    // Two that wait for the same save must not both start the next.
    while (this.saving !== null) await this.saving;
    if (this.unsaved === null || this.state.kind === 'conflict') return;
    this.saving = this.saveOnce().finally(() => {
      this.saving = null;
    });
    await this.saving;
    if (this.getState().kind === 'waiting') this.schedule(this.settings.debounceMs ?? DEBOUNCE_MS);
  }

  /** Ends a conflict. 'mine' is saved over the stored draft; with 'theirs' the caller takes the stored content up. */
  resolve(choice: 'mine' | 'theirs'): void {
    if (this.state.kind !== 'conflict') return;
    const { stored, storedETag } = this.state;
    const mine = this.unsaved;
    this.etag = storedETag;
    if (choice === 'theirs') {
      if (mine !== null) this.settings.kept.setAside({ content: mine, etag: storedETag, at: this.now() });
      this.unsaved = null;
      this.settings.kept.forget();
      this.set({ kind: 'saved' });
      return;
    }
    this.settings.kept.setAside({ content: stored.content, etag: storedETag, at: stored.updatedAt });
    this.set({ kind: 'waiting' });
    void this.flush();
  }

  /** Stops timers; what is unsaved stays kept on this machine. */
  close(): void {
    this.unschedule();
  }

  private async saveOnce(): Promise<void> {
    const content = this.unsaved;
    if (content === null) return;
    this.set({ kind: 'saving' });
    try {
      const { etag } = await this.settings.save(content, this.etag);
      this.etag = etag;
      this.retryMs = FIRST_RETRY_MS;
      if (this.unsaved === content) {
        this.unsaved = null;
        this.settings.kept.forget();
        this.set({ kind: 'saved' });
      } else {
        if (this.unsaved !== null) this.settings.kept.keep(this.unsaved, etag, this.now());
        this.set({ kind: 'waiting' });
      }
    } catch (error) {
      this.fail(asProblem(error));
    }
  }

  private fail(problem: ApiProblem): void {
    if (problem.status === 412 && problem.currentETag !== null) {
      this.set({ kind: 'conflict', stored: problem.current as Draft, storedETag: problem.currentETag });
    } else if (mayPass(problem)) {
      this.set({ kind: 'offline', keptHere: this.keptHere });
      this.schedule(this.retryMs);
      this.retryMs = Math.min(2 * this.retryMs, LONGEST_RETRY_MS);
    } else this.set({ kind: 'refused', message: problem.message, keptHere: this.keptHere });
  }

  private schedule(delayMs: number): void {
    this.unschedule();
    this.timer = setTimeout(() => {
      this.timer = null;
      void this.flush();
    }, delayMs);
  }

  private unschedule(): void {
    if (this.timer !== null) clearTimeout(this.timer);
    this.timer = null;
  }

  private now(): string {
    return this.settings.now?.() ?? new Date().toISOString();
  }

  private set(state: SaveState): void {
    this.state = state;
    for (const listener of this.listeners) listener();
  }
}

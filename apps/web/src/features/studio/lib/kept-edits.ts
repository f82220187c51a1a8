import { draftContent } from '@tipward/contract';
import type { DraftContent } from '@tipward/contract';
import { z } from 'zod';

const keptEdit = z.object({
  content: draftContent,
  /** ETag of the stored draft the edit was made on. */
  etag: z.string(),
  /** When it was kept (ISO). */
  at: z.string(),
});
export type KeptEdit = z.infer<typeof keptEdit>;

const SET_ASIDE_KEPT = 5;

/** The part of localStorage that is needed. */
export type EditStorage = Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>;

/**
 * Edits of one draft kept on this machine: the one not yet saved, offered back after a crash, and those a person set
 * aside when two were in conflict. A storage that is shut off or full makes `keep` say false; it never throws.
 */
export class KeptEdits {
  private readonly storage: EditStorage | null;
  private readonly key: string;

  constructor(storage: EditStorage | null, draftId: string) {
    this.storage = storage;
    this.key = `tipward-draft-${draftId}`;
  }

  keep(content: DraftContent, etag: string, at: string): boolean {
    return this.write(this.key, { content, etag, at });
  }

  kept(): KeptEdit | null {
    return keptEdit.nullable().catch(null).parse(this.read(this.key));
  }

  forget(): void {
    try {
      this.storage?.removeItem(this.key);
    } catch {
      // A storage that cannot be written holds nothing to forget.
    }
  }

  /** Keeps the losing side of a conflict; the last five stay. */
  setAside(edit: KeptEdit): boolean {
    return this.write(`${this.key}-aside`, [edit, ...this.allSetAside()].slice(0, SET_ASIDE_KEPT));
  }

  /** Newest first. */
  allSetAside(): KeptEdit[] {
    return z
      .array(keptEdit)
      .catch([])
      .parse(this.read(`${this.key}-aside`) ?? []);
  }

  private read(key: string): unknown {
    try {
      return JSON.parse(this.storage?.getItem(key) ?? 'null') as unknown;
    } catch {
      return null;
    }
  }

  private write(key: string, value: unknown): boolean {
    if (this.storage === null) return false;
    try {
      this.storage.setItem(key, JSON.stringify(value));
      return true;
    } catch {
      return false;
    }
  }
}

/** localStorage, or null where the browser shuts it off. */
export function browserStorage(): EditStorage | null {
  try {
    return window.localStorage;
  } catch {
    return null;
  }
}

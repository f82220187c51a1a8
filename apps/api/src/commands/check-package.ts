import { createHash } from 'node:crypto';
import { manifestEntry } from '@tipward/contract';
import { unzipSync } from 'fflate';
import { z } from 'zod';

const MANIFEST = 'manifest.json';
const manifest = z.looseObject({ files: z.array(manifestEntry).min(1) });

export interface PackageCheck {
  readonly files: number;
  readonly sha256: string;
  /** Everything that is not as the manifest says; empty when the package proves itself. */
  readonly faults: readonly string[];
}

const sha256 = (bytes: Uint8Array): string => createHash('sha256').update(bytes).digest('hex');

function readManifest(files: ReadonlyMap<string, Uint8Array>): z.infer<typeof manifest> | string {
  const bytes = files.get(MANIFEST);
  if (bytes === undefined) return `${MANIFEST} is missing`;
  try {
    const read = manifest.safeParse(JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes)));
    return read.success ? read.data : `${MANIFEST} is no manifest: ${z.prettifyError(read.error)}`;
  } catch (error) {
    return `${MANIFEST} is not readable: ${error instanceof Error ? error.message : String(error)}`;
  }
}

function holdAgainst(
  entries: z.infer<typeof manifest>['files'],
  files: ReadonlyMap<string, Uint8Array>,
): string[] {
  const named = new Set(entries.map(({ file }) => file));
  const faults = entries.flatMap((entry, i) => {
    if (entries.findIndex(({ file }) => file === entry.file) !== i) return [`${entry.file} is named twice`];
    const bytes = files.get(entry.file);
    if (bytes === undefined) return [`${entry.file} is missing`];
    if (bytes.length !== entry.bytes) return [`${entry.file} has ${bytes.length} bytes, not ${entry.bytes}`];
    const hash = sha256(bytes);
    return hash === entry.sha256 ? [] : [`${entry.file} has SHA-256 ${hash}, not ${entry.sha256}`];
  });
  const extra = [...files.keys()].filter((file) => file !== MANIFEST && !named.has(file));
  return [...faults, ...extra.map((file) => `${file} is not in the manifest`)];
}

/** Holds every file of a release package against its manifest, and the manifest against the files. */
export function checkPackage(zip: Uint8Array): PackageCheck {
  const hash = sha256(zip);
  let unpacked: Record<string, Uint8Array>;
  try {
    unpacked = unzipSync(zip);
  } catch (error) {
    const why = error instanceof Error ? error.message : String(error);
    return { files: 0, sha256: hash, faults: [`the package is no readable ZIP: ${why}`] };
  }
  const files = new Map(Object.entries(unpacked).filter(([name]) => !name.endsWith('/')));
  const read = readManifest(files);
  const faults = typeof read === 'string' ? [read] : holdAgainst(read.files, files);
  return { files: files.size, sha256: hash, faults };
}

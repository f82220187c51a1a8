import { createHash } from 'node:crypto';
import { buffer } from 'node:stream/consumers';
import type { z } from 'zod';
import type { manifestEntry } from '@tipward/contract';
import { ZipFile } from 'yazl';
import { releaseFiles, type PackageFile, type PackageSource } from './release-files.ts';

type ManifestEntry = z.infer<typeof manifestEntry>;

export interface ReleasePackage {
  readonly bytes: Buffer;
  readonly sha256: string;
  readonly manifest: ManifestEntry[];
}

const sha256 = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

/** Fixed times and modes: the same record gives the same bytes on any machine at any hour. */
const FIXED = { mtime: new Date(Date.UTC(2000, 0, 1)), mode: 0o100644, forceDosTimestamp: true } as const;

async function zip(files: readonly PackageFile[]): Promise<Buffer> {
  const archive = new ZipFile();
  for (const file of files) archive.addBuffer(file.bytes, file.name, FIXED);
  archive.end();
  return buffer(archive.outputStream);
}

/** The ZIP of a release with its manifest; reproducible byte for byte from the record. */
export async function buildPackage(source: PackageSource): Promise<ReleasePackage> {
  const files = releaseFiles(source);
  const manifest = files.map(({ name, bytes }) => ({
    file: name,
    bytes: bytes.length,
    sha256: sha256(bytes),
  }));
  const body = {
    release: source.letter,
    programme: source.programmeName,
    contentHash: source.contentHash,
    files: manifest,
  };
  const bytes = await zip([
    ...files,
    { name: 'manifest.json', bytes: Buffer.from(`${JSON.stringify(body, null, 2)}\n`, 'utf8') },
  ]);
  return { bytes, sha256: sha256(bytes), manifest };
}

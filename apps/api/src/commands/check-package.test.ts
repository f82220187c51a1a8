import { strToU8, zipSync } from 'fflate';
import { expect, it } from 'vitest';
import { sha256 } from '../../test/bytes.ts';
import { checkPackage } from './check-package.ts';

const table = strToU8('radius_m,chord_m\n1,0.5\n');
const entry = { file: 'stations.csv', bytes: table.length, sha256: sha256(Buffer.from(table)) };
const pack = (files: Record<string, Uint8Array>, entries: object[] = [entry]) =>
  zipSync({ ...files, 'manifest.json': strToU8(JSON.stringify({ schema: 1, files: entries })) });

it('finds nothing wrong with a package that is what its manifest says', () => {
  const zip = pack({ 'stations.csv': table });
  expect(checkPackage(zip)).toEqual({ files: 2, sha256: sha256(Buffer.from(zip)), faults: [] });
});

it.each([
  [
    'an altered file',
    pack({ 'stations.csv': strToU8('radius_m,chord_m\n1,0.6\n') }),
    /stations.csv has SHA-256/u,
  ],
  ['a longer file', pack({ 'stations.csv': strToU8('more than there was before') }), /has 26 bytes, not 23/u],
  ['a missing file', pack({}), /stations.csv is missing/u],
  ['an extra file', pack({ 'stations.csv': table, 'note.txt': table }), /note.txt is not in the manifest/u],
  ['a file named twice', pack({ 'stations.csv': table }, [entry, entry]), /named twice/u],
  ['no manifest', zipSync({ 'stations.csv': table }), /manifest.json is missing/u],
  ['a manifest without files', pack({ 'stations.csv': table }, []), /is no manifest/u],
  ['no ZIP', strToU8('nothing of the kind'), /no readable ZIP/u],
])('tells of %s', (_what, zip, expected) => {
  const { faults } = checkPackage(zip);
  expect(faults).toHaveLength(1);
  expect(faults[0]).toMatch(expected);
});

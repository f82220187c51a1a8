import { readFile } from 'node:fs/promises';
import { ConfigError } from '../config/config-error.ts';
import { checkPackage } from './check-package.ts';
import { runProgram } from './run-program.ts';

/** Checks a downloaded release package. Exit code 0: every file is what the manifest says; 1: not; 2: not readable. */
runProgram(async () => {
  const path = process.argv[2];
  if (path === undefined)
    throw new ConfigError(['the path of a package is missing: verify-release release.zip']);
  const { files, sha256, faults } = checkPackage(await readFile(path));
  process.stdout.write(`SHA-256 of the package: ${sha256}\n`);
  process.stdout.write(
    faults.length === 0
      ? `The package holds: ${files - 1} files are what the manifest says.\n`
      : `The package is NOT what its manifest says:\n${faults.map((fault) => `  - ${fault}\n`).join('')}`,
  );
  return faults.length === 0 ? 0 : 1;
});

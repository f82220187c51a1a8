import { CAUTION } from '@tipward/design-model';
import type { Letter } from '../../services/mail/write-mail.ts';
import { SIGNATURE } from './signature.ts';

interface Given {
  readonly programmeName: string;
  readonly designName: string;
  readonly versionLabel: string;
  readonly letter: string;
  /** Letter of the release it takes the place of, null for the first. */
  readonly supersedes: string | null;
  readonly effectivity: string;
  readonly note: string;
  readonly releasedBy: string;
  readonly packageSha256: string;
  readonly link: string;
}

/** To every member of the programme. */
export function versionReleasedLetter(given: Given): Letter {
  const supersedes = given.supersedes === null ? '' : ` It supersedes release ${given.supersedes}.`;
  return {
    kind: 'version-released',
    subject: `Release ${given.letter}: ${given.programmeName}`,
    text: `${given.releasedBy} released ${given.designName} ${given.versionLabel} as release ${given.letter} of programme ${given.programmeName}.${supersedes}

Effectivity: ${given.effectivity}
${given.note === '' ? '' : `\n${given.note}\n`}
SHA-256 of the package: ${given.packageSha256}

${given.link}

${CAUTION}
${SIGNATURE}`,
  };
}

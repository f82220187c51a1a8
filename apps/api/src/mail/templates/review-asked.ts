import type { Letter } from '../../services/mail/write-mail.ts';
import { SIGNATURE } from './signature.ts';

interface Given {
  readonly programmeName: string;
  readonly designName: string;
  readonly versionLabel: string;
  readonly askedBy: string;
  readonly message: string;
  readonly link: string;
}

/** To the leads of the programme. */
export function reviewAskedLetter(given: Given): Letter {
  return {
    kind: 'review-asked',
    subject: `Review: ${given.designName} ${given.versionLabel} (${given.programmeName})`,
    text: `${given.askedBy} asks for review of ${given.designName} ${given.versionLabel}, programme ${given.programmeName}.
${given.message === '' ? '' : `\n${given.message}\n`}
What changed, the verdicts and the comments:

${given.link}
${SIGNATURE}`,
  };
}

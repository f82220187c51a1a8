import type { Letter } from '../../services/mail/write-mail.ts';
import { SIGNATURE } from './signature.ts';

interface Given {
  readonly programmeName: string;
  readonly designName: string;
  readonly versionLabel: string;
  readonly decidedBy: string;
  readonly outcome: 'approved' | 'changes-requested';
  readonly note: string;
  readonly link: string;
}

/** To the author of the version and to whoever asked for the review. */
export function reviewDecidedLetter(given: Given): Letter {
  const what = `${given.designName} ${given.versionLabel}`;
  const approved = given.outcome === 'approved';
  return {
    kind: 'review-decided',
    subject: `${approved ? 'Approved' : 'Changes requested'}: ${what} (${given.programmeName})`,
    text: `${given.decidedBy} ${approved ? 'approved' : 'asks for changes to'} ${what}, programme ${given.programmeName}.
${given.note === '' ? '' : `\n${given.note}\n`}
${given.link}
${SIGNATURE}`,
  };
}

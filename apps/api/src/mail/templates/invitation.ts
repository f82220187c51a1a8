import type { Letter } from '../../services/mail/write-mail.ts';
import { SIGNATURE } from './signature.ts';

interface Given {
  readonly name: string;
  readonly invitedBy: string;
  readonly link: string;
  /** Programmes and roles, in words. */
  readonly roles: readonly string[];
}

export function invitationLetter(given: Given): Letter {
  const roles = given.roles.map((role) => `  - ${role}\n`).join('');
  return {
    kind: 'invitation',
    subject: 'Invitation to Tipward',
    text: `Hello ${given.name},

${given.invitedBy} invites you to Tipward.
${roles === '' ? '' : `\nYou will be:\n${roles}`}
Open this link within seven days to set your password:

${given.link}
${SIGNATURE}`,
  };
}

import type { Letter } from '../../services/mail/write-mail.ts';
import { SIGNATURE } from './signature.ts';

export function passwordResetLetter(given: { readonly name: string; readonly link: string }): Letter {
  return {
    kind: 'password-reset',
    subject: 'Set a new password',
    text: `Hello ${given.name},

someone asked to set a new password for your account. If it was you, open this link within the hour:

${given.link}

If it was not you, do nothing: your password stays as it is.
${SIGNATURE}`,
  };
}

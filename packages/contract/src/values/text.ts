import { z } from 'zod';

/** Control characters other than tab and line breaks, and the separators that some programs take for line breaks. */
const CONTROL = /[\p{Cc}\u2028\u2029]/u;
const ALLOWED_CONTROL = /[\t\n\r]/gu;
const holdsControl = (text: string) => CONTROL.test(text.replace(ALLOWED_CONTROL, ''));
/** Bidirectional overrides could make a name read as another; marks and isolates of honest right-to-left text stay. */
const OVERRIDE = /[\u202a-\u202e]/u;

function clean(label: string, max: number) {
  const allowed = `allowed: text of 1 to ${max} characters without control characters`;
  return z
    .string({ error: `${label} is missing; ${allowed}` })
    .trim()
    .min(1, `${label} is empty; ${allowed}`)
    .max(max, `${label} is too long; ${allowed}`)
    .refine(
      (text) => !holdsControl(text) && !OVERRIDE.test(text),
      `${label} holds control characters; ${allowed}`,
    );
}

/** A one-line name: quotes, emoji and right-to-left text are welcome, line breaks are not. */
export const nameText = (label: string, max = 120) =>
  clean(label, max).refine(
    (text) => !/[\r\n\t]/u.test(text),
    `${label} holds a line break; allowed: one line`,
  );

/** Text of several lines. */
export const proseText = (label: string, max = 4000) => clean(label, max);

/** Text of several lines that may be left empty. */
export const optionalProse = (label: string, max = 4000) =>
  z
    .string({ error: `${label} must be text` })
    .trim()
    .max(max, `${label} is too long; allowed: at most ${max} characters`)
    .refine(
      (text) => !holdsControl(text) && !OVERRIDE.test(text),
      `${label} holds control characters; allowed: plain text`,
    )
    .default('');

export const idValue = (label: string) => z.uuid(`${label} is not an identifier; allowed: a UUID`);
export const emailAddress = z
  .string({ error: 'E-mail is missing; allowed: an address such as name@example.org' })
  .trim()
  .toLowerCase()
  .max(254, 'E-mail is too long; allowed: at most 254 characters')
  .pipe(z.email('E-mail is not an address; allowed: an address such as name@example.org'));

/** Length in UTF-8, which is what bcrypt counts. */
function bytesOf(text: string): number {
  let bytes = 0;
  for (const mark of text) {
    const code = mark.codePointAt(0) ?? 0;
    bytes += code < 0x80 ? 1 : code < 0x800 ? 2 : code < 0x10000 ? 3 : 4;
  }
  return bytes;
}

export const newPassword = z
  .string({ error: 'Password is missing; allowed: 12 to 72 bytes' })
  .min(12, 'Password is too short; allowed: at least 12 characters')
  .refine((text) => bytesOf(text) <= 72, 'Password is too long; allowed: at most 72 bytes');

export const timestamp = z.iso.datetime({ offset: true });
export const sha256 = z.string().regex(/^[0-9a-f]{64}$/u, 'allowed: 64 hexadecimal digits');

import nodemailer from 'nodemailer';
import type { Config } from '../config/config.ts';

export interface Postman {
  readonly deliver: (message: { to: string; subject: string; text: string; id: string }) => Promise<void>;
  readonly close: () => void;
}

const TIMEOUT_MS = 20_000;

/** Sends over SMTP; null when no mail server is named. */
export function createPostman(config: Config): Postman | null {
  if (config.smtpUrl === null) return null;
  const transport = nodemailer.createTransport({
    url: config.smtpUrl,
    connectionTimeout: TIMEOUT_MS,
    greetingTimeout: TIMEOUT_MS,
    socketTimeout: TIMEOUT_MS,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  const domain = new URL(config.publicUrl).hostname;
  return {
    deliver: async ({ to, subject, text, id }) => {
      await transport.sendMail({
        from: config.mailFrom,
        // As an object, so that a comma or bracket in an address is never read as a second one.
        to: { name: '', address: to },
        subject,
        text,
        messageId: `<${id}@${domain}>`,
      });
    },
    close: () => {
      transport.close();
    },
  };
}

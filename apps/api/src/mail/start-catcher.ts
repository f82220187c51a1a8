import { randomUUID } from 'node:crypto';
import { simpleParser, type AddressObject } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import type { CaughtMail } from './caught-mail.ts';

const MAX_BYTES = 1_000_000;

function addressesOf(to: AddressObject | AddressObject[] | undefined): string[] {
  const objects = to === undefined ? [] : Array.isArray(to) ? to : [to];
  return objects.flatMap(({ value }) =>
    value.flatMap(({ address }) => (address === undefined ? [] : [address])),
  );
}

export interface RunningCatcher {
  readonly port: number;
  readonly stop: () => Promise<void>;
}

/** A mail server on loopback that keeps what it is given and sends nothing on. */
export async function startCatcher(caught: CaughtMail, port: number): Promise<RunningCatcher> {
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: MAX_BYTES,
    logger: false,
    onData: (stream, _session, callback) => {
      simpleParser(stream).then((mail) => {
        caught.add({
          id: randomUUID(),
          to: addressesOf(mail.to),
          subject: mail.subject ?? '',
          text: mail.text ?? '',
          receivedAt: new Date().toISOString(),
        });
        callback();
      }, callback);
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => {
      server.off('error', reject);
      resolve();
    });
  });
  const address = server.server.address();
  return {
    port: typeof address === 'object' && address !== null ? address.port : port,
    stop: () =>
      new Promise((resolve) => {
        server.close(() => {
          resolve();
        });
      }),
  };
}

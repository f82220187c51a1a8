import type { MailMessage } from '@tipward/contract';

const KEPT = 200;

/** The last 200 messages that the loopback mail server took, newest first. In memory of one process. */
export class CaughtMail {
  private messages: MailMessage[] = [];

  add(message: MailMessage): void {
    this.messages = [message, ...this.messages].slice(0, KEPT);
  }

  list(): readonly MailMessage[] {
    return this.messages;
  }
}

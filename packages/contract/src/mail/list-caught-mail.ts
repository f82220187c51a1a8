import { operation } from '../operation.ts';
import { mailMessage } from './mail-message.ts';
import { list } from '../values/page.ts';

export const listCaughtMail = operation({
  id: 'mail.list-caught-mail',
  summary: 'Mail caught on this machine (local demonstration only)',
  method: 'get',
  path: '/dev/mail',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: list(mailMessage),
});

import type { LinkPurpose } from '../src/models/one-time-link.ts';
import type { Person } from '../src/models/person.ts';
import { createLink } from '../src/services/auth/one-time-links.ts';
import type { TestApi } from './test-api.ts';

export function tokenOfLink(text: string): string {
  const token = /#token=(\S+)/u.exec(text)?.[1];
  if (token === undefined) throw new Error(`no link in: ${text}`);
  return token;
}

export async function makeLinkToken(api: TestApi, person: Person, purpose: LinkPurpose): Promise<string> {
  const link = await api.context.db.transaction((transaction) =>
    createLink(api.context, transaction, person.id, purpose),
  );
  return tokenOfLink(link);
}

/** Where to go after entering: a place of ours, never another site's address. */
export function safeNext(next: string | null): string {
  if (next?.startsWith('/') !== true || /^\/[/\\]/u.test(next)) return '/';
  return next;
}

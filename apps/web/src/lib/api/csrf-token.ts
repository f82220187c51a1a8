let token: string | null = null;

/** The token of the session, sent as X-CSRF-Token with every change; it lives as long as the session does. */
export const csrfToken = (): string | null => token;

export function rememberCsrfToken(value: string | null): void {
  token = value;
}

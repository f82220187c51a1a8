import pg from 'pg';

/** @throws Error saying what to set when the tests have no PostgreSQL. */
export function adminUrl(): URL {
  const given = process.env['TIPWARD_TEST_ADMIN_URL'];
  if (given === undefined)
    throw new Error(
      'TIPWARD_TEST_ADMIN_URL is missing: the postgres:// address of a superuser on a throw-away cluster',
    );
  return new URL(given);
}

export async function asAdmin<T>(work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: adminUrl().href });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** The address of a test database for a role: the superuser signs in and at once becomes that role. */
export function urlAs(role: 'tipward_app' | 'tipward_owner', database: string): string {
  const url = adminUrl();
  url.pathname = `/${database}`;
  url.search = new URLSearchParams({ options: `-c role=${role}` }).toString().replaceAll('+', '%20');
  return url.href;
}

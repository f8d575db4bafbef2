/**
 * Points the server at the test database. These tests are worth nothing against a stand-in, so without a database they
 * fail rather than skip; and as they write, the name must say that it is for tests.
 */
export function pointAtTestDatabase(): string {
  const url = process.env.TEST_DATABASE_URL ?? process.env.DATABASE_URL;
  if (!url)
    throw new Error(
      'TEST_DATABASE_URL must name a migrated PostgreSQL database for tests; `npm test` sets one up.',
    );
  const name = new URL(url).pathname.slice(1);
  if (!/test/.test(name))
    throw new Error(`The database '${name}' is not one for tests: its name must contain 'test'.`);
  process.env.DATABASE_URL = url;
  process.env.NEXTAUTH_SECRET ??= 'a secret that only the tests use, long enough';
  process.env.NEXTAUTH_URL = TEST_ORIGIN;
  return url;
}

export const TEST_ORIGIN = 'http://127.0.0.1:3999';

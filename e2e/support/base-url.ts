const LOOPBACK = new Set(['127.0.0.1', 'localhost', '[::1]']);

/** Where the app under test answers. Tests sign up users and delete projects, so only this machine will do. */
export function baseUrl(): string {
  const url = process.env.E2E_BASE_URL;
  if (!url)
    throw new Error('E2E_BASE_URL must name the app under test; `npm test -- --only browser` sets it.');
  if (!LOOPBACK.has(new URL(url).hostname))
    throw new Error(`E2E_BASE_URL must be on this machine, not ${url}`);
  return url;
}

/**
 * Where to go after signing in: `wanted` if it is a path of this site, else the projects. Addresses of other sites
 * (`https://…`, `//…`, `/\…`) are not followed.
 */
export function returnPath(wanted: string | null | undefined): string {
  const isPath = wanted !== null && wanted !== undefined && /^\/(?![/\\])[^\u0000-\u001f\\]*$/.test(wanted);
  return isPath ? wanted : '/projects';
}

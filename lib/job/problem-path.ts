/** A JSON path as people read it: `cuts[2].cutter`, `machine["odd key"]`, `$` for the whole document. */
export function problemPath(keys: readonly PropertyKey[]): string {
  let path = '';
  for (const key of keys) {
    if (typeof key === 'number') path += `[${key}]`;
    else if (/^[A-Za-z_$][\w$]*$/.test(String(key))) path += path === '' ? String(key) : `.${String(key)}`;
    else path += `[${JSON.stringify(String(key))}]`;
  }
  return path === '' ? '$' : path;
}

import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { keptSecret } from '@/scripts/setup/secret.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'secret-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

it('makes a secret once, for its owner alone, and a new one for a file cut short', () => {
  const file = path.join(folder, 'secret');
  const made = keptSecret(file);
  expect(made).toMatch(/^[\w-]{43}$/);
  expect(keptSecret(file)).toBe(made);
  expect(statSync(file).mode & 0o777).toBe(0o600);
  writeFileSync(file, made.slice(0, 10));
  expect(keptSecret(file)).not.toBe(made);
  expect(readFileSync(file, 'utf8')).toHaveLength(43);
});

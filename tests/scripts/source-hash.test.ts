import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { builtFrom, sourceHash } from '@/scripts/setup/source-hash.mjs';

let root: string;

beforeEach(() => {
  root = mkdtempSync(path.join(tmpdir(), 'sources-'));
  put('app/page.tsx', 'one');
  put('package-lock.json', '{}');
});
afterEach(() => rmSync(root, { recursive: true, force: true }));

function put(file: string, text: string): void {
  const place = path.join(root, file);
  mkdirSync(path.dirname(place), { recursive: true });
  writeFileSync(place, text);
}

describe('what a build is made from', () => {
  it('leaves out what no page is built from', () => {
    for (const file of ['.next/x', 'node_modules/a/b.js', 'tests/a.test.ts', 'README.md', '.data/app/log']) {
      put(file, 'x');
    }
    expect(builtFrom(root)).toEqual(['app/page.tsx', 'package-lock.json']);
  });

  it('keeps folders of these names further down', () => {
    put('lib/scripts/a.ts', 'x');
    expect(builtFrom(root)).toContain('lib/scripts/a.ts');
  });

  it('changes with content, name, a new file, and text moved from one file to the next', () => {
    const hashes = [sourceHash(root)];
    expect(sourceHash(root)).toBe(hashes[0]);
    put('app/page.tsx', 'two');
    hashes.push(sourceHash(root));
    put('app/a', '12');
    put('app/b', '3');
    hashes.push(sourceHash(root));
    put('app/a', '1');
    put('app/b', '23');
    hashes.push(sourceHash(root));
    expect(new Set(hashes).size).toBe(hashes.length);
  });
});

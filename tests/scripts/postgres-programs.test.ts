import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { choosePostgres, installedPostgres } from '@/scripts/setup/postgres-programs.mjs';

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'versions-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

function install(version: string, programs: readonly string[]): void {
  const bin = path.join(folder, version, 'bin');
  mkdirSync(bin, { recursive: true });
  for (const program of programs) writeFileSync(path.join(bin, program), '');
}

describe('choosing a PostgreSQL', () => {
  it('takes the newest that has a server, by number and not by letter', () => {
    install('9', ['initdb', 'postgres', 'psql']);
    install('15', ['initdb', 'postgres', 'psql']);
    install('17', ['psql']);
    expect(installedPostgres(folder).map(({ major }) => major)).toEqual([15, 9]);
    expect(installedPostgres(path.join(folder, 'missing'))).toEqual([]);
  });

  it('opens a cluster with the version that made it, or says what to install', () => {
    const installed = [
      { major: 17, bin: '/17' },
      { major: 15, bin: '/15' },
    ];
    expect(choosePostgres(installed, null, '/data').bin).toBe('/17');
    expect(choosePostgres(installed, 15, '/data').bin).toBe('/15');
    expect(() => choosePostgres(installed, 16, '/data')).toThrow(/apt-get install .* postgresql-16/);
  });
});

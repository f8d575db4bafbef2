import { describe, expect, it } from 'vitest';
import { missingPackages } from '@/scripts/setup/npm-packages.mjs';

const LOCKED = {
  '': {},
  'node_modules/board': { version: '1.2.3' },
  'node_modules/for-another-system': { version: '1.0.0', optional: true },
};

describe('packages that are missing', () => {
  it('are none when each is there in its version; optional ones may lack', () => {
    expect(missingPackages(LOCKED, { 'node_modules/board': { version: '1.2.3' } })).toEqual([]);
  });

  it('are those that lack and those of another version', () => {
    expect(missingPackages(LOCKED, {})).toEqual(['node_modules/board']);
    expect(missingPackages(LOCKED, { 'node_modules/board': { version: '1.2.4' } })).toEqual([
      'node_modules/board',
    ]);
  });
});

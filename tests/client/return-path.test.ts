import { expect, it } from 'vitest';
import { returnPath } from '@/lib/client/return-path';

it.each(['/account', '/projects/abc?cut=c1#tabs', '/'])('goes back to %s', (path) => {
  expect(returnPath(path)).toBe(path);
});

it.each([
  'https://elsewhere.test/',
  '//elsewhere.test',
  '/\\elsewhere.test',
  '/ok\\..\\elsewhere',
  'projects',
  'javascript:alert(1)',
  '/\nelsewhere',
  '',
  null,
  undefined,
])('does not follow %j', (path) => {
  expect(returnPath(path)).toBe('/projects');
});

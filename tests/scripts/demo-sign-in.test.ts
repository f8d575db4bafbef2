import { expect, it } from 'vitest';
import { demoSignIn } from '@/scripts/setup/demo-sign-in.mjs';

it('finds the maker’s sign-in in what the seed prints', () => {
  const printed = `Demo accounts, all with the password one-two-3
  steward@quayside.test  (Kim, steward)
  maker@quayside.test  (Robin, maker)
`;
  expect(demoSignIn(printed)).toEqual({ email: 'maker@quayside.test', password: 'one-two-3' });
});

it('finds none where none is printed', () => {
  expect(demoSignIn('')).toBeNull();
  expect(demoSignIn('all with the password one-two-3\n')).toBeNull();
});

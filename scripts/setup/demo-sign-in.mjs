// @ts-check

/**
 * The account that the landing page offers to everybody, read from what the seed prints for the person at the terminal, so
 * that its password stands in the seed alone.
 *
 * @param {string} printed such as `… password abc` and below it a line for each account, its e-mail address first
 * @returns {{ email: string, password: string } | null} the maker's; null when the seed names none
 */
export function demoSignIn(printed) {
  const password = /\bpassword (\S+)/.exec(printed)?.[1];
  const email = /^\s*(maker@\S+)/m.exec(printed)?.[1];
  return password && email ? { email, password } : null;
}

import { test as base, type Page } from '@playwright/test';
import { type Account, signIn, signUp } from './accounts';
import { watchPage } from './page-faults';

/** Somebody with an account and a page on which they are signed in. */
export interface Person {
  readonly account: Account;
  readonly page: Page;
}

interface Fixtures {
  /** A fresh account, signed in on `page`. Each test has its own, so tests may run beside one another in any order. */
  readonly maker: Account;
  /** Makes one more person, signed in on a page (and in a browser context) of their own. */
  readonly anotherPerson: (name: string) => Promise<Person>;
  /** Takes faults that a test brings about on purpose off the list: `expectFault(/412/)`. */
  readonly expectFault: (pattern: RegExp) => void;
}

interface Watch {
  readonly faults: string[];
  readonly expected: RegExp[];
}

/**
 * Playwright's `test` with people. A test fails as well when a page of it threw, logged an error, or got an answer of 500
 * or above, whatever else it looked at.
 */
export const test = base.extend<Fixtures & { readonly watch: Watch }>({
  watch: [
    async ({ page }, provide) => {
      const watch: Watch = { faults: [], expected: [] };
      watchPage(page, watch.faults);
      await provide(watch);
      const faults = watch.faults.filter((fault) => !watch.expected.some((pattern) => pattern.test(fault)));
      if (faults.length > 0) throw new Error(`Faults of the pages:\n${faults.join('\n')}`);
    },
    { auto: true },
  ],
  expectFault: async ({ watch }, provide) => {
    await provide((pattern) => watch.expected.push(pattern));
  },
  maker: async ({ page }, provide) => {
    const account = await signUp(page.request, 'Robin Maker');
    await signIn(page.request, account);
    await provide(account);
  },
  anotherPerson: async ({ browser, watch }, provide) => {
    const pages: Page[] = [];
    await provide(async (name) => {
      const page = await browser.newPage();
      pages.push(page);
      watchPage(page, watch.faults);
      const account = await signUp(page.request, name);
      await signIn(page.request, account);
      return { account, page };
    });
    for (const page of pages) await page.context().close();
  },
});

export { expect } from '@playwright/test';

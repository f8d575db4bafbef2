import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { expect, test } from './support/test';

const schemes = ['light', 'dark'] as const;

/** Everything that axe finds wrong on the page, as `rule: what it was found on`. */
async function faultsOfAccess(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${target.join(' ')}`));
}

for (const colorScheme of schemes) {
  test.describe(`in the ${colorScheme} theme`, () => {
    test.use({ colorScheme });

    for (const path of ['/', '/sign-in', '/sign-up', '/nowhere-at-all']) {
      test(`${path} has no fault of access @phone`, async ({ page, expectFault }) => {
        expectFault(/404|401/);
        await page.goto(path);
        await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
        expect(await faultsOfAccess(page)).toEqual([]);
      });
    }

    test('the account page has no fault of access @phone', async ({ page, maker }) => {
      await page.goto('/account');
      await expect(page.getByText(maker.email)).toBeVisible();
      await expect(page.getByText('this one')).toBeVisible();
      expect(await faultsOfAccess(page)).toEqual([]);
    });
  });
}

test('the section line of the landing page moves by the keyboard and says where it is', async ({ page }) => {
  await page.goto('/');
  const line = page.getByRole('slider', { name: 'Section line A–A' });
  const before = Number(await line.getAttribute('aria-valuenow'));
  await line.press('ArrowUp');
  await expect(line).toHaveAttribute('aria-valuenow', String(before + 1));
  await expect(page.getByText(`A–A at ${before + 1} mm`)).toBeVisible();
});

test('the section of the landing page follows the line when it is dragged', async ({ page }) => {
  await page.goto('/');
  const line = page.getByRole('slider', { name: 'Section line A–A' });
  const before = Number(await line.getAttribute('aria-valuenow'));
  const box = await line.boundingBox();
  if (!box) throw new Error('the section line is not on show');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x, y + 40, { steps: 5 });
  await page.mouse.up();
  expect(Number(await line.getAttribute('aria-valuenow'))).toBeLessThan(before);
});

test('the demo opens from the landing page, where the server has one', async ({ page }) => {
  await page.goto('/');
  const open = page.getByRole('button', { name: 'Open the demo' });
  test.skip((await open.count()) === 0, 'this server has no demo');
  await open.click();
  await expect(page).toHaveURL(/\/projects$/);
  await expect(page.getByRole('heading', { name: 'Hallway rail' })).toBeVisible();
});

test('a chosen theme is there from the first byte, and “as the device asks” takes it back', async ({
  page,
}) => {
  await page.goto('/');
  await page.getByRole('button', { name: 'Light or dark' }).click();
  await page.getByRole('menuitemradio', { name: 'Night shift' }).click();
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
  expect(await (await page.request.get('/')).text()).toMatch(/<html[^>]*data-theme="dark"/);

  await page.getByRole('button', { name: 'Light or dark' }).click();
  await page.getByRole('menuitemradio', { name: 'As the device asks' }).click();
  await expect(page.locator('html')).not.toHaveAttribute('data-theme');
  expect(await (await page.request.get('/')).text()).not.toMatch(/<html[^>]*data-theme/);
});

test('somebody makes an account, signs out, and signs in again to where they were going @phone', async ({
  page,
}) => {
  const email = `${crypto.randomUUID()}@e2e.test`;
  const password = 'a plank, a rail, a peg';
  await page.goto('/sign-up');
  await page.getByLabel('Your name').fill('Lee Turner');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByRole('textbox', { name: 'Password' }).fill('too short');
  await page.getByRole('button', { name: 'Make the account' }).click();
  await expect(page.getByText('Must have at least 12 characters.')).toBeVisible();

  await page.getByRole('textbox', { name: 'Password' }).fill(password);
  await page.getByRole('button', { name: 'Make the account' }).click();
  await expect(page).toHaveURL(/\/projects$/);
  await page.getByRole('button', { name: 'Account of Lee Turner' }).click();
  await page.getByRole('menuitem', { name: 'Sign out' }).click();
  await expect(page.getByRole('link', { name: 'Make an account' })).toBeVisible();

  await page.goto('/account');
  await expect(page).toHaveURL(/\/sign-in\?callbackUrl=/);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByRole('textbox', { name: 'Password' }).fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page).toHaveURL(/\/account$/);
});

test('a wrong password is said in a sentence, and other sites are not returned to', async ({
  page,
  maker,
  expectFault,
}) => {
  expectFault(/401/);
  await page.context().clearCookies();
  await page.goto('/sign-in?callbackUrl=https://elsewhere.test/');
  await page.getByLabel('E-mail address').fill(maker.email);
  await page.getByRole('textbox', { name: 'Password' }).fill('not the one at all');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page.getByRole('alert').filter({ hasText: 'is wrong' })).toBeVisible();

  await page.getByRole('textbox', { name: 'Password' }).fill(maker.password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page).toHaveURL(/\/projects$/);
});

test('a maker changes name and password, and the other device is signed out at once', async ({
  page,
  maker,
  browser,
}) => {
  const other = await browser.newPage();
  await other.goto('/sign-in?callbackUrl=/account');
  await other.getByLabel('E-mail address').fill(maker.email);
  await other.getByRole('textbox', { name: 'Password' }).fill(maker.password);
  await other.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(other).toHaveURL(/\/account$/);

  await page.goto('/account');
  await page.getByLabel('Your name').fill('Robin Joiner');
  await page.getByRole('button', { name: 'Save the name' }).click();
  await expect(page.getByRole('button', { name: 'Account of Robin Joiner' })).toBeVisible();

  await expect(page.getByRole('button', { name: /^Sign out / })).toHaveCount(2);
  await page.getByRole('textbox', { name: 'Present password' }).fill(maker.password);
  await page.getByRole('textbox', { name: 'New password' }).fill('another long one, of oak');
  await page.getByRole('button', { name: 'Change the password' }).click();
  await expect(page.getByText('Password changed.', { exact: false }).first()).toBeVisible();
  await expect(page.getByRole('button', { name: /^Sign out / })).toHaveCount(1);

  await other.reload();
  await expect(other).toHaveURL(/\/sign-in/);
  await other.context().close();
});

test('“sign out everywhere” asks first, and ends this session too', async ({ page, maker }) => {
  await page.goto('/account');
  await expect(page.getByText(maker.email)).toBeVisible();
  await page.getByRole('button', { name: 'Sign out everywhere' }).click();
  const dialog = page.getByRole('alertdialog');
  await expect(dialog.getByRole('button', { name: 'Leave it' })).toBeFocused();
  await dialog.getByRole('button', { name: 'Sign out everywhere' }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  expect((await page.request.get('/api/me')).status()).toBe(401);
});

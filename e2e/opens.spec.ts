import { expect, test } from './support/test';

test('a stranger sees what it is for, and is sent to sign in before any project @phone', async ({ page }) => {
  await page.goto('/');
  await expect(page).toHaveTitle(/Spindleaf/);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();

  await page.goto('/projects');
  await expect(page).toHaveURL(/\/sign-in/);
});

test('a maker who has just signed up has no projects yet @phone', async ({ page, maker }) => {
  await page.goto('/projects');
  await expect(page).toHaveURL(/\/projects$/);
  expect(maker.email).toContain('@');
});

test('two people are signed in side by side', async ({ page, maker, anotherPerson }) => {
  const reviewer = await anotherPerson('Sam Reviewer');
  const [mine, theirs] = await Promise.all(
    [page, reviewer.page].map(async (one): Promise<unknown> => (await one.request.get('/api/me')).json()),
  );
  expect(mine).toMatchObject({ email: maker.email });
  expect(theirs).toMatchObject({ email: reviewer.account.email });
});

import AxeBuilder from '@axe-core/playwright';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callEndpoint } from './support/api';
import { createProject } from './support/projects';
import { expect, test } from './support/test';

test('an empty list offers an example, a file or an empty board @phone', async ({ page, maker }) => {
  await page.goto('/projects');
  await expect(page.getByRole('heading', { name: 'No projects yet' })).toBeVisible();
  await expect(page.getByRole('button', { name: `Account of ${maker.name}` })).toBeVisible();
  await page.getByRole('button', { name: 'Open an example' }).click();
  await page.getByRole('button', { name: 'Begin with Hallway rail' }).click();
  await expect(page).toHaveURL(/\/projects\/[0-9a-f-]{36}$/);
});

test('a board is asked for in inches, with sums, and comes out in millimetres', async ({ page, maker }) => {
  expect(maker.id).toBeTruthy();
  await page.goto('/projects');
  await page.getByRole('button', { name: 'New project' }).click();
  await page.getByLabel('Name of the project').fill('Shelf end');
  await page.getByRole('radio', { name: 'inches' }).click();
  await page.getByLabel('Length').fill('12 + 1/2');
  await expect(page.getByText('= 12.5 in')).toBeVisible();
  await page.getByLabel('Width').fill('nothing like a length');
  await page.getByRole('button', { name: 'Make the project' }).click();
  await expect(page.getByLabel('Width')).toHaveAttribute('aria-invalid', 'true');
  await page.getByLabel('Width').fill('101.6mm');
  await page.getByLabel('Thickness').fill('3/4');
  await page.getByRole('button', { name: 'Make the project' }).click();
  await expect(page).toHaveURL(/\/projects\/[0-9a-f-]{36}$/);

  const { items } = await callEndpoint(page.request, ENDPOINTS.listProjects);
  expect(items.map(({ name, board }) => ({ name, board }))).toEqual([
    // 12.5 in, 4 in and 3/4 in of 25.4 mm each.
    { name: 'Shelf end', board: { x: 317.5, y: 101.6, z: 19.05 } },
  ]);
});

test('projects are found by name and put in order', async ({ page, maker }) => {
  expect(maker.id).toBeTruthy();
  const boards = { 'Peg 2': 90, 'Peg 10': 60, Lid: 200 };
  for (const [name, size] of Object.entries(boards)) {
    await createProject(page.request, { from: 'empty', name, board: { x: size, y: size, z: 12 } });
  }
  await page.goto('/projects');
  const names = page.getByRole('article').getByRole('heading');
  await expect(names).toHaveText(['Lid', 'Peg 10', 'Peg 2']);
  await page.getByLabel('Order').selectOption('by name');
  await expect(names).toHaveText(['Lid', 'Peg 2', 'Peg 10']);
  await page.getByLabel('Search the projects by name').fill('peg');
  await expect(names).toHaveText(['Peg 2', 'Peg 10']);
  await page.getByLabel('Search the projects by name').fill('nothing of that name');
  await page.getByRole('button', { name: 'Show all projects' }).click();
  await expect(names).toHaveCount(3);
});

test('a project is renamed, duplicated, deleted, and fetched back', async ({ page, maker }) => {
  expect(maker.id).toBeTruthy();
  await createProject(page.request, { from: 'empty', name: 'Tray' });
  await page.goto('/projects');
  await page.getByRole('button', { name: 'More for Tray' }).click();
  await page.getByRole('menuitem', { name: 'Rename' }).click();
  await page.getByRole('dialog').getByLabel('Name').fill('Tray with a lip');
  await page.getByRole('button', { name: 'Rename', exact: true }).click();
  const names = page.getByRole('article').getByRole('heading');
  await expect(names).toHaveText(['Tray with a lip']);

  await page.getByRole('button', { name: 'More for Tray with a lip' }).click();
  await page.getByRole('menuitem', { name: 'Duplicate' }).click();
  await expect(names).toHaveText(['Tray with a lip (copy)', 'Tray with a lip']);

  await page.getByRole('button', { name: 'More for Tray with a lip (copy)' }).click();
  await page.getByRole('menuitem', { name: 'Delete' }).click();
  await expect(names).toHaveText(['Tray with a lip']);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(names).toHaveText(['Tray with a lip (copy)', 'Tray with a lip']);

  await page.getByRole('button', { name: 'More for Tray with a lip (copy)' }).click();
  await page.getByRole('menuitem', { name: 'Delete' }).click();
  await expect(names).toHaveText(['Tray with a lip']);
  // Leaving the page does not lose what was asked for.
  await page.goto('/account');
  await expect(async () => {
    const { items } = await callEndpoint(page.request, ENDPOINTS.listProjects);
    expect(items.map(({ name }) => name)).toEqual(['Tray with a lip']);
  }).toPass();
});

test('what is shared says from whom and as what, and offers only what the role may do', async ({
  page,
  maker,
  anotherPerson,
}) => {
  const project = await createProject(page.request, { from: 'empty', name: 'Shared board' });
  const reviewer = await anotherPerson('Sam Reviewer');
  await callEndpoint(page.request, ENDPOINTS.addMember, {
    params: { projectId: project.id },
    body: { email: reviewer.account.email, role: 'reviewer' },
  });
  await reviewer.page.goto('/projects');
  const card = reviewer.page.getByRole('article');
  await expect(card.getByText(`from ${maker.name}`)).toBeVisible();
  await expect(card.getByText('reviewer')).toBeVisible();
  await reviewer.page.getByRole('button', { name: 'More for Shared board' }).click();
  await expect(reviewer.page.getByRole('menuitem')).toHaveText(['Open', 'Duplicate']);
});

test('a server that fails is said, with a way to try again; a session that ended leads to the sign-in', async ({
  page,
  maker,
  expectFault,
}) => {
  expectFault(/50[03]|401|ERR_FAILED/);
  expect(maker.id).toBeTruthy();
  await page.route('**/api/projects?*', (route) => route.abort());
  await page.goto('/projects');
  await expect(page.getByRole('heading', { name: 'The projects could not be read' })).toBeVisible({
    timeout: 20_000,
  });
  await page.unroute('**/api/projects?*');
  await page.getByRole('button', { name: 'Try again' }).click();
  await expect(page.getByRole('heading', { name: 'No projects yet' })).toBeVisible();

  await page.route('**/api/projects?*', (route) =>
    route.fulfill({
      status: 401,
      contentType: 'application/problem+json',
      body: JSON.stringify({
        type: 'about:blank',
        title: 'Not signed in',
        status: 401,
        detail: 'Sign in first.',
        code: 'not-signed-in',
      }),
    }),
  );
  await page.reload();
  await expect(page.getByRole('link', { name: 'Sign in' })).toBeVisible();
});

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(`in the ${colorScheme} theme`, () => {
    test.use({ colorScheme });

    test('the list and the new-project dialog have no fault of access @phone', async ({ page, maker }) => {
      expect(maker.id).toBeTruthy();
      await createProject(page.request, { from: 'example', example: 'hallway-rail' });
      await page.goto('/projects');
      await expect(page.getByRole('article')).toHaveCount(1);
      expect((await new AxeBuilder({ page }).analyze()).violations.map(({ id }) => id)).toEqual([]);

      await page.getByRole('button', { name: 'New project' }).click();
      await expect(page.getByRole('dialog')).toBeVisible();
      for (const way of await page.getByRole('tab').all()) {
        await way.click();
        expect((await new AxeBuilder({ page }).analyze()).violations.map(({ id }) => id)).toEqual([]);
      }
    });
  });
}

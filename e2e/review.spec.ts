import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callEndpoint } from './support/api';
import { openBench } from './support/bench-page';
import { createProject } from './support/projects';
import { expect, test } from './support/test';
import { sampleJob } from '../tests/helpers/sample-job';

test('a reviewer comments on a spot; the maker answers and resolves', async ({
  page,
  maker,
  anotherPerson,
}) => {
  expect(maker.id).toBeTruthy();
  const project = await createProject(page.request, { from: 'job', job: sampleJob(), name: 'For review' });
  const reviewer = await anotherPerson('Kim Reviewer');
  const mine = await openBench(page, project.id);
  await page.getByRole('button', { name: 'People' }).click();
  await page.getByLabel('E-mail address of their account').fill(reviewer.account.email);
  await page.getByRole('button', { name: 'Add to the project' }).click();
  await expect(
    page.getByRole('complementary').getByText('Kim Reviewer', { exact: false }).first(),
  ).toBeVisible();

  const theirs = await openBench(reviewer.page, project.id);
  await expect(reviewer.page.getByText('read only')).toBeVisible();
  await expect(reviewer.page.getByRole('button', { name: 'Rectangle' })).toHaveCount(0);
  await reviewer.page.getByRole('button', { name: 'Comment on a spot' }).first().click();
  await theirs.click(120, 60);
  await reviewer.page
    .getByLabel(/^Comment on face [AB] at 1(19|20|21)/)
    .fill('Is there room for a hand here?');
  await reviewer.page.getByRole('button', { name: 'Comment', exact: true }).click();
  await expect(reviewer.page.getByRole('button', { name: '1 comment' })).toBeVisible();

  await page.getByRole('button', { name: '1 comment' }).click();
  await expect(page.getByText('Is there room for a hand here?')).toBeVisible();
  await page.getByLabel('Answer').fill('Twelve millimetres more, then.');
  await page.getByRole('button', { name: 'Answer' }).click();
  await expect(reviewer.page.getByText('Twelve millimetres more, then.')).toBeVisible();
  await page.getByRole('button', { name: 'Resolve' }).click();
  await expect(page.getByRole('button', { name: '0 comments' })).toBeVisible();
  await mine.saved();

  const { items } = await callEndpoint(page.request, ENDPOINTS.listComments, {
    params: { projectId: project.id },
  });
  expect(items[0]).toMatchObject({
    pin: { kind: 'spot' },
    replies: [{ text: 'Twelve millimetres more, then.' }],
  });
  await openBench(reviewer.page, project.id, `?comment=${items[0]?.id ?? ''}`);
  await expect(reviewer.page.getByRole('checkbox', { name: 'Show resolved (1)' })).toBeVisible();
});

test('a project that is not shared is not there', async ({ page, maker, anotherPerson, expectFault }) => {
  expect(maker.id).toBeTruthy();
  expectFault(/404/);
  const project = await createProject(page.request, { from: 'empty', name: 'Private' });
  const stranger = await anotherPerson('Lee Stranger');
  await stranger.page.goto(`/projects/${project.id}`);
  await expect(stranger.page.getByRole('heading', { name: 'There is no such project here' })).toBeVisible();
});

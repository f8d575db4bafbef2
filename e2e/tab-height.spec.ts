import { readProgram } from '@/lib/gcode/read/read-program';
import type { ProgramEvent } from '@/lib/gcode/read/program-event';
import { openBench, type BenchPage } from './support/bench-page';
import { createProject } from './support/projects';
import { expect, test } from './support/test';
import { sampleJob } from '../tests/helpers/sample-job';

/** A board with two outlines and nothing cut yet: the part on face A, a recess on face B. */
function undecided() {
  return { ...sampleJob(), cuts: [] };
}

async function cutOutline(bench: BenchPage, face: 'A' | 'B', outline: string, kind: string): Promise<void> {
  const { page } = bench;
  await page.getByRole('radio', { name: `Face ${face}` }).click();
  await bench.inspect('Outlines');
  await page
    .getByRole('complementary')
    .getByRole('button', { name: new RegExp(`^${outline}`) })
    .click();
  await bench.inspect('Selected');
  await page
    .getByRole('region', { name: 'New cut' })
    .getByRole('button', { name: kind, exact: true })
    .click();
  await expect(page.getByLabel('Name of the cut')).toHaveValue(new RegExp(kind));
}

test('tabs clear the far face’s chamfer by themselves; a height too low is found and mended, and the programs hold it', async ({
  page,
  maker,
}) => {
  expect(maker.id).toBeTruthy();
  const project = await createProject(page.request, { from: 'job', job: undecided(), name: 'Two faces' });
  const bench = await openBench(page, project.id);
  await cutOutline(bench, 'B', 'Recess', 'Pocket');
  await cutOutline(bench, 'B', 'Part', 'Chamfer');
  await cutOutline(bench, 'A', 'Part', 'Chamfer');
  await cutOutline(bench, 'A', 'Part', 'Cut-out');

  const woods = page.getByRole('table', { name: 'Wood left in each tab' });
  await expect(woods.getByRole('row')).toHaveCount(5);
  await expect(woods.getByText('yes')).toHaveCount(4);
  // The far chamfer of 1.5 mm with a 60° bit goes 1.5 / tan 30° + 0.5 = 3.1 mm deep; 3 mm are to hold.
  await expect(page.getByText(/6\.1 mm: clears what the far face’s cuts take \(3\.1\)/)).toBeVisible();

  await page.getByLabel('Height', { exact: true }).fill('2');
  await page.getByLabel('Height', { exact: true }).press('Enter');
  const findings = page.getByRole('list', { name: 'Findings' });
  await expect(findings.getByText('A tab has no wood').first()).toBeVisible();
  await bench.saved();
  await page.getByRole('button', { name: /^Programs/ }).click();
  await expect(page.getByText('These programs are not handed out yet')).toBeVisible();

  await page
    .getByRole('complementary')
    .getByRole('button', { name: 'Set the height to auto' })
    .first()
    .click();
  await expect(page.getByText('Before you cut')).toBeVisible();
  const links = page.getByRole('link', { name: 'Download', exact: true });
  expect(await links.count()).toBeGreaterThanOrEqual(3);

  const [download] = await Promise.all([page.waitForEvent('download'), links.last().click()]);
  expect(download.suggestedFilename()).toMatch(/^\d\d-A-flat6\.nc$/);
  const chunks: Buffer[] = [];
  for await (const chunk of await download.createReadStream()) chunks.push(chunk as Buffer);
  const events: ProgramEvent[] = [
    ...readProgram(Buffer.concat(chunks).toString('ascii'), { dialect: 'grbl' }),
  ];
  const depths = events.flatMap((event) =>
    event.kind === 'feed' || event.kind === 'arc' ? [event.to.z] : [],
  );
  // 18 mm of board, 0.3 mm beneath it; over the tabs no lower than 6.1 mm above face B.
  expect(Math.min(...depths)).toBeCloseTo(-18.3, 3);
  expect(depths.some((z) => Math.abs(z - (6.1 - 18)) < 0.02)).toBe(true);
});

test('all programs come as one archive', async ({ page, maker }) => {
  expect(maker.id).toBeTruthy();
  const project = await createProject(page.request, { from: 'job', job: sampleJob(), name: 'Archive' });
  await openBench(page, project.id);
  await page.getByRole('button', { name: /^Programs/ }).click();
  const all = page.getByRole('link', { name: /^Download all/ });
  const [download] = await Promise.all([page.waitForEvent('download'), all.click()]);
  expect(download.suggestedFilename()).toMatch(/\.zip$/);
});

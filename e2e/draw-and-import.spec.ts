import { openBench } from './support/bench-page';
import { createProject } from './support/projects';
import { expect, test } from './support/test';

/** As a general drawing program saves it: groups, a transform, a reused shape, CSS, a text; 60 × 40 mm. */
const DRAWING = `<?xml version="1.0" encoding="UTF-8"?>
<svg xmlns="http://www.w3.org/2000/svg" width="60mm" height="40mm" viewBox="0 0 120 80">
  <style>.thin { fill: none; stroke: #000 }</style>
  <defs><circle id="hole" r="4"/></defs>
  <g id="layer1" transform="translate(10 10)">
    <rect id="plate" class="thin" width="100" height="60" rx="6"/>
    <use href="#hole" x="20" y="30"/>
    <text x="50" y="30">not an outline</text>
  </g>
</svg>`;

test('a maker draws an outline by hand and brings in a drawing', async ({ page, maker }) => {
  expect(maker.id).toBeTruthy();
  const project = await createProject(page.request, {
    from: 'empty',
    name: 'Lid',
    board: { x: 200, y: 100, z: 18 },
  });
  const bench = await openBench(page, project.id);
  await expect(page.getByRole('heading', { name: 'An empty board' })).toBeVisible();

  await page.keyboard.press('r');
  await bench.drag([20, 20], [90, 70]);
  await expect(page.getByLabel('Width', { exact: true })).toHaveValue('70');
  await page.getByLabel('Width', { exact: true }).fill('2 3/4 in');
  await page.getByLabel('Width', { exact: true }).press('Enter');
  await expect(page.getByLabel('Width', { exact: true })).toHaveValue('69.85');
  await page.getByLabel('Height', { exact: true }).fill('48,5 + 1');
  await page.getByLabel('Height', { exact: true }).press('Enter');
  await page.getByLabel('X', { exact: true }).fill('nothing');
  await page.getByLabel('X', { exact: true }).press('Enter');
  await expect(page.getByLabel('X', { exact: true })).toHaveAttribute('aria-invalid', 'true');
  await page.getByLabel('X', { exact: true }).press('Escape');
  await bench.saved();
  // 2 3/4 in of 25.4 mm each.
  expect((await bench.job()).outlines[0]?.shape).toMatchObject({
    type: 'rect',
    x: 20,
    y: 20,
    width: 69.85,
    height: 49.5,
  });

  await bench.inspect('Outlines');
  await page.getByRole('button', { name: 'Bring in a drawing' }).click();
  await page.getByLabel('Choose an SVG file, or drop it here').setInputFiles({
    name: 'plate.svg',
    mimeType: 'image/svg+xml',
    buffer: Buffer.from(DRAWING),
  });
  const dialog = page.getByRole('dialog');
  // 100 user units of 0.5 mm are 50 mm; 60 are 30.
  await expect(dialog.getByText('50 mm × 30 mm')).toBeVisible();
  await expect(dialog.getByRole('list', { name: 'What was left out' })).toContainText(/text/i);
  await dialog.getByRole('button', { name: 'Put it on the board' }).click();
  await bench.saved();
  const { outlines } = await bench.job();
  expect(outlines).toHaveLength(3);

  await page.getByRole('button', { name: /^Undo: Bring in a drawing/ }).click();
  await bench.saved();
  expect((await bench.job()).outlines).toHaveLength(1);
});

test('what was drawn while the network was away is kept and saved when it is back', async ({
  page,
  maker,
  context,
  expectFault,
}) => {
  expect(maker.id).toBeTruthy();
  expectFault(/ERR_INTERNET_DISCONNECTED|Failed to load resource/);
  const project = await createProject(page.request, {
    from: 'empty',
    name: 'Offline',
    board: { x: 200, y: 100, z: 18 },
  });
  const bench = await openBench(page, project.id);
  await context.setOffline(true);
  await page.keyboard.press('e');
  await bench.drag([30, 30], [80, 60]);
  await expect(page.getByRole('button', { name: 'only on this device' })).toBeVisible();
  await context.setOffline(false);
  await bench.saved();
  expect((await bench.job()).outlines[0]?.shape.type).toBe('ellipse');
});

test('a change made elsewhere shows as a conflict, and nothing is lost', async ({
  page,
  maker,
  expectFault,
}) => {
  expect(maker.id).toBeTruthy();
  expectFault(/412/);
  const project = await createProject(page.request, {
    from: 'empty',
    name: 'Twice',
    board: { x: 200, y: 100, z: 18 },
  });
  const bench = await openBench(page, project.id);
  const other = await openBench(await page.context().newPage(), project.id);
  await other.page.keyboard.press('r');
  await other.drag([10, 10], [40, 40]);
  await other.saved();
  await other.page.close();

  await page.keyboard.press('e');
  await bench.drag([60, 20], [100, 60]);
  const dialog = page.getByRole('dialog', { name: 'This project was changed elsewhere' });
  await dialog.getByRole('button', { name: 'Keep mine as a copy' }).click();
  await bench.saved();
  expect((await bench.job()).outlines.map(({ shape }) => shape.type)).toEqual(['rect']);
  await page.goto('/projects');
  await expect(page.getByRole('article').getByRole('heading', { name: 'Twice (my copy)' })).toBeVisible();
});

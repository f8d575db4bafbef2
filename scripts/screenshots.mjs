// @ts-check
/**
 * Makes the README's pictures from a running `npm start`: `node scripts/screenshots.mjs [ADDRESS] [PASSWORD]`, with the
 * demo's own address and password where none are given.
 */
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { chromium } from '@playwright/test';

const [address = 'http://127.0.0.1:3000', password = process.env.DEMO_PASSWORD ?? 'quayside-board-27'] =
  process.argv.slice(2);
const docs = fileURLToPath(new URL('../docs/', import.meta.url));

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
  args: ['--no-sandbox'],
});
try {
  const page = await browser.newPage({ viewport: { width: 1440, height: 900 }, colorScheme: 'light' });
  await signIn(page);
  await page.goto(`${address}/projects`);
  await page.getByRole('article').first().waitFor();
  await page.waitForLoadState('networkidle');
  await page.screenshot({ path: path.join(docs, 'projects.png') });

  await page.getByRole('article').filter({ hasText: 'Hallway rail' }).getByRole('link').first().click();
  await page.getByRole('application', { name: /^Plan of face/ }).waitFor();
  await page.getByRole('radio', { name: 'Face A' }).click();
  await page.getByText(/^about \d+ minutes/).waitFor({ timeout: 60_000 });
  await page.getByRole('button', { name: /Cut-out/ }).click();
  await page.waitForTimeout(1500);
  await page.screenshot({ path: path.join(docs, 'bench.png') });

  await page.getByRole('button', { name: /^Programs/ }).click();
  await page.getByText('Before you cut').waitFor({ timeout: 60_000 });
  await page.screenshot({ path: path.join(docs, 'programs.png') });
} finally {
  await browser.close();
}

/** @param {import('@playwright/test').Page} page */
async function signIn(page) {
  const { csrfToken } = await (await page.request.get(`${address}/api/auth/csrf`)).json();
  const answer = await page.request.post(`${address}/api/auth/callback/credentials`, {
    headers: { origin: address },
    form: { csrfToken, email: 'maker@quayside.test', password, json: 'true' },
  });
  if (!answer.ok()) throw new Error(`The demo's sign-in was refused: ${answer.status()}`);
}

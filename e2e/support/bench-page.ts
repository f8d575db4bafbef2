import { expect, type APIRequestContext, type Page } from '@playwright/test';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { Job } from '@/lib/job/job-schema';
import { callEndpoint } from './api';

/** The bench of one project on a page, addressed in millimetres. */
export interface BenchPage {
  readonly page: Page;
  /** Where a place of the face that is up lies on the screen, px. */
  at(x: number, y: number): Promise<{ x: number; y: number }>;
  drag(from: readonly [number, number], to: readonly [number, number]): Promise<void>;
  click(x: number, y: number): Promise<void>;
  /** Opens a page of the inspector. */
  inspect(name: string): Promise<void>;
  /** Waits until the header says that the server has committed everything. */
  saved(): Promise<void>;
  /** The document as the server has it. */
  job(): Promise<Job>;
}

/** Opens a project's bench and waits until its plan is drawn. */
export async function openBench(page: Page, projectId: string, query = ''): Promise<BenchPage> {
  await page.goto(`/projects/${projectId}${query}`);
  const plan = page.getByRole('application', { name: /^Plan of face/ });
  await expect(plan).toHaveAttribute('data-view', /\d/);
  const bench: BenchPage = {
    page,
    async at(x, y) {
      const [scale = 1, left = 0, bottom = 0] = ((await plan.getAttribute('data-view')) ?? '')
        .split(' ')
        .map(Number);
      const box = await plan.boundingBox();
      if (!box) throw new Error('The plan is not on the screen');
      return { x: box.x + left + x * scale, y: box.y + bottom - y * scale };
    },
    async drag(from, to) {
      const a = await bench.at(...from);
      const b = await bench.at(...to);
      await page.mouse.move(a.x, a.y);
      await page.mouse.down();
      await page.mouse.move((a.x + b.x) / 2, (a.y + b.y) / 2);
      await page.mouse.move(b.x, b.y);
      await page.mouse.up();
    },
    async click(x, y) {
      const at = await bench.at(x, y);
      await page.mouse.click(at.x, at.y);
    },
    inspect: (name) =>
      page.getByRole('navigation', { name: 'Pages of the inspector' }).getByRole('button', { name }).click(),
    saved: () => expect(page.getByRole('status').filter({ hasText: /^\s*saved$/ })).toBeVisible(),
    job: async () => (await savedJob(page.request, projectId)).job,
  };
  return bench;
}

export function savedJob(request: APIRequestContext, projectId: string) {
  return callEndpoint(request, ENDPOINTS.getJob, { params: { projectId } });
}

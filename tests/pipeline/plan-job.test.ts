import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { CancelledError } from '@/lib/base/cancel';
import { drawerTray } from '@/lib/job/examples/drawer-tray';
import { drillJig } from '@/lib/job/examples/drill-jig';
import { hallwayRail } from '@/lib/job/examples/hallway-rail';
import { houseNumber } from '@/lib/job/examples/house-number';
import type { JobInput } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';
import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import { planJob } from '@/lib/pipeline/plan-job';
import { planPaths } from '@/lib/pipeline/plan-paths';
import { sampleJob } from '../helpers/sample-job';

const folder = path.resolve(import.meta.dirname, '../../public/fonts');
const fonts = new Map(
  FONT_CATALOGUE.map(({ id, file }) => {
    const bytes = readFileSync(path.join(folder, file));
    return [id, bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength) as ArrayBuffer];
  }),
);

function planned(input: JobInput) {
  const job = parseJob(input);
  if (!job.ok) throw new Error(JSON.stringify(job.error));
  const plan = planJob(job.value, fonts);
  if (!plan.ok) throw new Error(JSON.stringify(plan.error));
  return plan.value;
}

describe('example jobs', () => {
  it.each([
    [
      'Hallway rail',
      hallwayRail,
      ['01-B-flat6.nc', '02-B-v60.nc', '03-A-flat3.nc', '04-A-v60.nc', '05-A-flat6.nc'],
    ],
    ['House number', houseNumber, ['01-A-flat3.nc', '02-A-v60.nc', '03-A-flat3.nc', '04-A-flat6.nc']],
    ['Drawer tray', drawerTray, ['01-A-flat6.nc', '02-A-flat3.nc', '03-A-flat6.nc']],
    ['Drill jig', drillJig, ['01-A-drill3-16.nc', '02-A-flat1-4.nc']],
  ])('%s plans and is proven without a finding', (_, job, files) => {
    const { programs, report } = planned(job);
    expect(programs.map(({ file }) => file)).toEqual(files);
    expect(report.findings).toEqual([]);
    expect(report.cuts.every(({ seconds, removed }) => seconds > 0 && removed > 0)).toBe(true);
  });

  it('the Hallway rail’s tabs stand clear of the back’s chamfer and dado', () => {
    const { report } = planned(hallwayRail);
    const { tabs } = report.cuts.find(({ id }) => id === 'cut-out')!;
    expect(tabs).toHaveLength(6);
    // Width 2 with 60°: 3.4641 + 0.5 beneath + 4 to hold; in the dado 6 + 4.
    for (const { height } of tabs) expect([7.9641, 10].some((h) => Math.abs(h - height) < 0.001)).toBe(true);
    for (const { wood, holds } of tabs) {
      expect(holds).toBe(true);
      expect(wood.height).toBeGreaterThan(3.98);
    }
  });
});

describe('planPaths', () => {
  it('stops soon after it was cancelled', () => {
    const job = parseJob(sampleJob());
    if (!job.ok) throw new Error('sample');
    let asked = 0;
    const control = { isCancelled: () => ++asked > 3 };
    expect(() => planPaths(job.value, fonts, control)).toThrow(CancelledError);
    expect(asked).toBe(4);
  });
});

import { describe, expect, it } from 'vitest';
import { drawerTray } from '@/lib/job/examples/drawer-tray';
import { drillJig } from '@/lib/job/examples/drill-jig';
import { hallwayRail } from '@/lib/job/examples/hallway-rail';
import { houseNumber } from '@/lib/job/examples/house-number';
import { parseJob } from '@/lib/job/parse-job';

const EXAMPLES = { hallwayRail, houseNumber, drawerTray, drillJig };

describe('example jobs', () => {
  it.each(Object.entries(EXAMPLES))('%s is a valid document and plain JSON', (_, job) => {
    expect(parseJob(job)).toMatchObject({ ok: true });
    expect(JSON.parse(JSON.stringify(job))).toEqual(job);
  });
});

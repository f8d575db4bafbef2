import type { ExampleId } from '@/lib/contracts/project';
import { drawerTray } from '@/lib/job/examples/drawer-tray';
import { drillJig } from '@/lib/job/examples/drill-jig';
import { hallwayRail } from '@/lib/job/examples/hallway-rail';
import { houseNumber } from '@/lib/job/examples/house-number';
import type { Job, JobInput } from '@/lib/job/job-schema';
import { parseJob, problemLine } from '@/lib/job/parse-job';

const EXAMPLES: Readonly<Record<ExampleId, JobInput>> = {
  'hallway-rail': hallwayRail,
  'house-number': houseNumber,
  'drawer-tray': drawerTray,
  'drill-jig': drillJig,
};

/** An example's job document, checked like any other. */
export function exampleJob(id: ExampleId): Job {
  const parsed = parseJob(EXAMPLES[id]);
  if (!parsed.ok) throw new Error(`Example ${id}: ${parsed.error.map(problemLine).join('; ')}`);
  return parsed.value;
}

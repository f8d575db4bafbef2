import { parseJob } from '@/lib/job/parse-job';
import { JOB_FORMAT, JOB_VERSION, type Job, type JobInput } from '@/lib/job/job-schema';

/** A job without outlines and cuts on a plain board, for a small router with a Grbl controller. */
export function emptyJob(
  name: string,
  board = { x: 300, y: 200, z: 18 },
  display: Job['display'] = 'mm',
): Job {
  const job: JobInput = {
    format: JOB_FORMAT,
    version: JOB_VERSION,
    name,
    display,
    board,
    order: ['A'],
    setups: {
      A: { zero: { corner: 'front-left', z: 'surface' } },
      B: { zero: { corner: 'back-left', z: 'surface' } },
    },
    machine: {
      name: 'Bench router',
      travel: { x: 800, y: 800, z: 80 },
      rapid: { xy: 5000, z: 1500 },
      feedMax: { xy: 4000, z: 1200 },
      acceleration: { xy: 400, z: 200 },
      spindle: { min: 8000, max: 24000 },
      clearance: 6,
      approach: 1.5,
      controller: { dialect: 'grbl' },
    },
    cutters: [],
    outlines: [],
    cuts: [],
  };
  const parsed = parseJob(job);
  if (!parsed.ok) throw new Error(`The empty job is not valid: ${JSON.stringify(parsed.error)}`);
  return parsed.value;
}

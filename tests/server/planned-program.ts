import type { PlannedJob } from '@/lib/server/planning/planning-task';

/**
 * Puts a finished plan with one program in the place of the planning thread, for tests of what is done with plans.
 * Gives what takes it away again.
 */
export function standInPlan(file: string, text: string, findings: PlannedJob['report']['findings'] = []) {
  const bytes = new TextEncoder().encode(text);
  const program = {
    file,
    face: 'A',
    cutters: ['flat6'],
    cuts: ['c1'],
    seconds: 12,
    lines: text.split('\n').length - 1,
    sha256: '0'.repeat(64),
    bounds: { min: [0, 0, -1], max: [10, 10, 6] },
  } as const;
  const report = { job: '0'.repeat(64), seconds: 12, programs: [program], cuts: [], findings };
  globalThis.spindleafPlanning = {
    plan: async () => ({ report, programs: [{ file, bytes }] }),
    picture: async () => '<svg xmlns="http://www.w3.org/2000/svg"/>',
  };
  return () => {
    globalThis.spindleafPlanning = undefined;
  };
}

import type { Region } from '@/lib/geometry/contour';
import { createDistanceQuery } from '@/lib/geometry/distance-query';
import { regionContains } from '@/lib/geometry/measure';
import { cutFloor, cutterById } from '@/lib/job/cut-values';
import type { CutOf } from '@/lib/job/cut-schema';
import { makeFinding } from '@/lib/report/make-finding';
import type { FaceName, Finding } from '@/lib/report/report';
import { modelPoint } from '../board-model';
import { cutterShape, radiusAtDepth } from '../cutter-shape';
import type { WorkMotion } from '../read-intent';
import { cutById, cutTitle, type Check, type ProofContext } from '../proof-context';

/** A cutter that only brushes along the part's edge does not work on it, mm. */
const BRUSH = 0.05;

/** A part that was cut out, with its outline in the view of its cut's face. */
interface CutOut {
  readonly cut: CutOf<'profile'>;
  readonly region: Region;
  readonly away: ReturnType<typeof createDistanceQuery>;
}

/** Cuts that work on a part after another cut went through the board all round it, tabs or not. */
export const cutOutTooEarly: Check = (context) => {
  const { job, programs } = context;
  const done: CutOut[] = [];
  const findings: Finding[] = [];
  const told = new Set<string>();
  let current: string | null = null;
  for (const { intent, steps } of programs) {
    for (const step of steps) {
      if (step.kind !== 'motion' || step.cut === null) continue;
      if (step.cut !== current) {
        if (current !== null) done.push(...cutOutsOf(context, current));
        current = step.cut;
      }
      if (step.rapid || step.to.z >= 0 || done.length === 0) continue;
      for (const out of done) {
        const key = JSON.stringify([step.cut, out.cut.id]);
        if (step.cut === out.cut.id || told.has(key) || !worksOn(context, step, intent.face, out)) continue;
        told.add(key);
        const cut = cutById(job, step.cut);
        const message = `${cut ? cutTitle(cut) : intent.file} works on a part that ${cutTitle(out.cut)} has cut out before.`;
        findings.push(
          makeFinding('cut-out-too-early', message, {
            cut: step.cut,
            face: intent.face,
            at: [step.to.x, step.to.y],
          }),
        );
      }
    }
  }
  return findings;
};

function cutOutsOf({ job, outlines }: ProofContext, id: string): CutOut[] {
  const cut = cutById(job, id);
  if (cut?.kind !== 'profile' || cut.side !== 'outside') return [];
  if (cutFloor(job, cut) < job.board.z - 1e-6) return [];
  return cut.outlines.flatMap((outline) => {
    const { region } = outlines.get(outline, cut.face);
    return region.length > 0 ? [{ cut, region, away: createDistanceQuery(region) }] : [];
  });
}

function worksOn(
  { job, board }: ProofContext,
  { to, cutter }: WorkMotion,
  face: FaceName,
  { cut, region, away }: CutOut,
): boolean {
  const inModel = modelPoint(board, face, to);
  const p = modelPoint(board, cut.face, inModel);
  if (regionContains(region, p)) return true;
  if (cutter === null) return false;
  const reach = radiusAtDepth(cutterShape(cutterById(job, cutter)), -to.z);
  return away.distance(p) < reach - BRUSH;
}

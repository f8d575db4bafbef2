import { checkCancelled, type WorkControl } from '@/lib/base/cancel';
import type { Cut } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { CutMoves } from '@/lib/moves/cut-moves';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import type { TabPlace } from '@/lib/report/intent';
import type { Finding } from '@/lib/report/report';
import { checkSpeeds } from './check-speeds';
import { followSurface } from './follow-surface';
import { planCut } from './planners';
import { cutWork, type CutPlan, type FarDepth } from './shared/cut-work';
import { farDepthOf } from './tabs/far-depth';

/** All that planning gives: moves in cutting order, where tabs stand, and what was noticed on the way. */
export interface PlannedCuts {
  readonly steps: readonly CutMoves[];
  readonly tabs: readonly TabPlace[];
  readonly findings: readonly Finding[];
}

/**
 * Plans every enabled cut of a resolved job, face by face in `order` and in the document's order within a face.
 * Moves are in the view of their cut's face.
 */
export function planCuts(job: Job, outlines: ResolvedOutlines, control?: WorkControl): PlannedCuts {
  const cuts = job.order.flatMap((face) => enabledCuts(job, face));
  const farDepth = farDepths(job, outlines, control);
  const steps: CutMoves[] = [];
  const tabs: TabPlace[] = [];
  const findings: Finding[] = [];
  cuts.forEach((cut, done) => {
    checkCancelled(control);
    control?.onProgress?.(done / cuts.length, `Planning ${cut.name || cut.id}`);
    const plan = planOne(job, cut, outlines, farDepth(cut), control);
    steps.push(...stepsOf(cut, plan));
    tabs.push(...plan.tabs);
    findings.push(...plan.findings, ...checkSpeeds(job, cut));
  });
  return { steps, tabs, findings };
}

function planOne(
  job: Job,
  cut: Cut,
  outlines: ResolvedOutlines,
  farDepth: FarDepth | null,
  control: WorkControl | undefined,
): CutPlan {
  const plan = planCut(cutWork(job, cut, outlines, farDepth, control));
  const surface = cut.follow === 'surface' ? job.board.surface[cut.face] : null;
  if (!surface) return plan;
  const steps = plan.steps.map((step) => ({
    ...step,
    moves: followSurface(step.moves, surface, job.board),
  }));
  return { ...plan, steps };
}

function stepsOf({ id, face }: Cut, plan: CutPlan): CutMoves[] {
  return plan.steps.map(({ cutter, moves }) => ({ cut: id, cutter, face, moves }));
}

function enabledCuts(job: Job, face: Face): Cut[] {
  return job.cuts.filter((cut) => cut.enabled && cut.face === face);
}

/**
 * What automatic tab heights ask for: how deep the far face's cuts go. Those cuts are planned without tabs of their
 * own, so that two faces with automatic tabs do not wait for each other; a tab of the far face can only leave more wood.
 */
function farDepths(
  job: Job,
  outlines: ResolvedOutlines,
  control: WorkControl | undefined,
): (cut: Cut) => FarDepth | null {
  const known = new Map<Face, FarDepth>();
  return (cut) => {
    if (cut.kind !== 'profile' || !cut.tabs) return null;
    const far = cut.face === 'A' ? 'B' : 'A';
    const ready = known.get(far);
    if (ready) return ready;
    const steps = enabledCuts(job, far).flatMap((other) =>
      stepsOf(other, planOne(job, other, outlines, null, control)),
    );
    const depth = farDepthOf(job, steps);
    known.set(far, depth);
    return depth;
  };
}

import type { Job } from '@/lib/job/job-schema';
import type { CutMoves } from '@/lib/moves/cut-moves';

/** The steps that one program holds. */
export interface ProgramGroup {
  readonly face: 'A' | 'B';
  readonly steps: readonly CutMoves[];
}

/**
 * Divides the steps into programs: with `split` a new one at each change of face or cutter, else one a face. A cut
 * without moves is in none.
 */
export function groupSteps(
  steps: readonly CutMoves[],
  change: Job['machine']['controller']['toolChange'],
): ProgramGroup[] {
  const groups: { face: 'A' | 'B'; steps: CutMoves[] }[] = [];
  for (const step of steps) {
    if (step.moves.length === 0) continue;
    const group = groups.at(-1);
    const goesOn =
      group?.face === step.face && (change !== 'split' || group.steps[0]?.cutter === step.cutter);
    if (goesOn) group.steps.push(step);
    else groups.push({ face: step.face, steps: [step] });
  }
  return groups;
}

/** `01-B-flat6.nc`: number, face and, where the program has one cutter by its nature, that cutter. */
export function programFile(
  index: number,
  group: ProgramGroup,
  change: Job['machine']['controller']['toolChange'],
): string {
  const number = String(index + 1).padStart(2, '0');
  const cutter = change === 'split' ? `-${group.steps[0]?.cutter ?? ''}` : '';
  return `${number}-${group.face}${cutter}.nc`;
}

import { SPOILBOARD_ALLOWANCE } from '@/lib/base/tolerances';
import { cutterById, pointLength } from '@/lib/job/cut-values';
import { makeFinding } from '@/lib/report/make-finding';
import { lowestPlaces } from '../lowest-motion';
import { cutById, cutTitle, mm, type Check } from '../proof-context';

/** Rounding of the programs' last decimal, mm. */
const SLACK = 1e-3;

/** Cuts that go further into the spoilboard than is allowed. Of a drill, the point itself is spared: it must go through. */
export const belowBed: Check = ({ job, programs }) =>
  lowestPlaces(programs).flatMap(({ program, motion, point }) => {
    const spared = motion.cutter === null ? 0 : pointLength(cutterById(job, motion.cutter));
    const below = -point.z - job.board.z;
    if (below - spared <= SPOILBOARD_ALLOWANCE + SLACK) return [];
    const cut = cutById(job, motion.cut);
    const who = cut ? cutTitle(cut) : program.intent.file;
    const message = `${who} goes ${mm(below)} under the board (line ${motion.line}); ${mm(SPOILBOARD_ALLOWANCE)} are allowed.`;
    return [
      makeFinding('below-bed', message, {
        ...(cut && { cut: cut.id }),
        face: program.intent.face,
        at: [point.x, point.y],
      }),
    ];
  });

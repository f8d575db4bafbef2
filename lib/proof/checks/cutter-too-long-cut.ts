import { cutterById } from '@/lib/job/cut-values';
import { makeFinding } from '@/lib/report/make-finding';
import { lowestPlaces } from '../lowest-motion';
import { cutById, cutTitle, mm, type Check } from '../proof-context';

/** Rounding of the programs' last decimal, mm. */
const SLACK = 1e-3;

/** Cuts that go deeper below their face than the cutter's flutes are long, or than it reaches at all. */
export const cutterTooLongCut: Check = ({ job, programs }) =>
  lowestPlaces(programs).flatMap(({ program, motion, point }) => {
    if (motion.cutter === null) return [];
    const cutter = cutterById(job, motion.cutter);
    const depth = -point.z;
    const limit = Math.min(cutter.fluteLength, cutter.reach);
    if (depth <= limit + SLACK) return [];
    const cut = cutById(job, motion.cut);
    const why =
      cutter.reach <= cutter.fluteLength
        ? `reaches ${mm(cutter.reach)}`
        : `has flutes of ${mm(cutter.fluteLength)}`;
    const who = cut ? cutTitle(cut) : program.intent.file;
    const message = `${who} goes ${mm(depth)} deep; ${cutter.name} ${why}.`;
    return [
      makeFinding('cutter-too-long-cut', message, {
        ...(cut && { cut: cut.id }),
        face: program.intent.face,
        at: [point.x, point.y],
      }),
    ];
  });

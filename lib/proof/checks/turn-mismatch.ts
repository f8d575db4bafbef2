import { turnCorner } from '@/lib/job/turn';
import { makeFinding } from '@/lib/report/make-finding';
import { faceTitle, type Check } from '../proof-context';

/** Two set-ups whose zeros are not on the same physical corner of the board. Of jobs that cut both faces. */
export const turnMismatch: Check = ({ job }) => {
  const [first, second] = job.order;
  const zeros = { A: job.setups.A?.zero, B: job.setups.B?.zero };
  if (!first || !second || !zeros.A || !zeros.B) return [];
  const cutsOn = (face: 'A' | 'B') => job.cuts.some((cut) => cut.enabled && cut.face === face);
  if (!cutsOn('A') || !cutsOn('B')) return [];
  const expected = turnCorner(job.turn.axis, zeros[first]!.corner);
  const found = zeros[second]!.corner;
  if (found === expected) return [];
  const message =
    `After turning about ${job.turn.axis}, the ${zeros[first]!.corner} zero of ${faceTitle(first)} is at the ${expected} ` +
    `of ${faceTitle(second)}; its zero is at the ${found}.`;
  return [makeFinding('turn-mismatch', message, { face: second })];
};

import { makeFinding } from '@/lib/report/make-finding';
import { cutById, cutTitle, mm, type Check } from '../proof-context';

/** Rapids through standing wood; the deepest of each cut. */
export const rapidInWood: Check = ({ job, bites }) => {
  const deepest = new Map<string, (typeof bites)[number]>();
  for (const bite of bites) {
    const key = JSON.stringify([bite.face, bite.cut]);
    const before = deepest.get(key);
    if (!before || bite.depth > before.depth) deepest.set(key, bite);
  }
  return [...deepest.values()].map(({ cut: id, face, line, depth, at }) => {
    const cut = cutById(job, id);
    const message = `A rapid${cut ? ` of ${cutTitle(cut)}` : ''} goes ${mm(depth)} into the wood (line ${line}).`;
    return makeFinding('rapid-in-wood', message, { ...(cut && { cut: cut.id }), face, at });
  });
};

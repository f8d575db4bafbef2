import { makeFinding } from '@/lib/report/make-finding';
import { mm, type Check } from '../proof-context';

const AXES = ['x', 'y', 'z'] as const;
/** Binary rounding of a program that just fits, mm. */
const SLACK = 1e-6;

/** Programs that reach further along an axis than the machine travels, wherever its zero stands. */
export const outsideTravel: Check = ({ job, programs }) =>
  programs.flatMap(({ intent, bounds }) =>
    AXES.flatMap((axis, i) => {
      if (!bounds) return [];
      const extent = bounds.max[i]! - bounds.min[i]!;
      const travel = job.machine.travel[axis];
      if (extent <= travel + SLACK) return [];
      const message = `${intent.file} needs ${mm(extent)} along ${axis.toUpperCase()}; ${job.machine.name} travels ${mm(travel)}.`;
      const cut = intent.cuts.length === 1 ? { cut: intent.cuts[0]! } : {};
      return [makeFinding('outside-travel', message, { ...cut, face: intent.face })];
    }),
  );

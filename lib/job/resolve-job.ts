import type { Cut } from './cut-schema';
import type { Job } from './job-schema';

/** Extra depth of a through cut, so that no fibre is left at the far face, mm. */
const DEFAULT_BELOW = 0.3;

/**
 * Fills in the defaults that depend on other fields, so that two documents that ask for the same are the same: below,
 * follow, step-over, pitch and decimals. Speeds stay as they are: leaving one out means the cutter's own.
 */
export function resolveJob(job: Job): Job {
  const { controller } = job.machine;
  const decimals = controller.decimals ?? (controller.units === 'in' ? 5 : 4);
  return {
    ...job,
    machine: { ...job.machine, controller: { ...controller, decimals } },
    cuts: job.cuts.map((cut) => resolveCut(job, cut)),
  };
}

function resolveCut(job: Job, cut: Cut): Cut {
  const cutter = job.cutters.find(({ id }) => id === cut.cutter);
  const follow = cut.follow ?? defaultFollow(job, cut);
  switch (cut.kind) {
    case 'pocket':
      return {
        ...cut,
        follow,
        below: cut.below ?? DEFAULT_BELOW,
        stepover: cut.stepover ?? cutter?.speeds.stepover,
      };
    case 'profile':
      return { ...cut, follow, below: cut.below ?? (cut.skin > 0 ? 0 : DEFAULT_BELOW) };
    case 'bore':
      return {
        ...cut,
        follow,
        below: cut.below ?? DEFAULT_BELOW,
        pitch: cut.pitch ?? cutter?.speeds.stepdown,
      };
    case 'surface':
      return { ...cut, follow, stepover: cut.stepover ?? cutter?.speeds.stepover };
    case 'engrave':
    case 'drill':
      return { ...cut, follow, below: cut.below ?? DEFAULT_BELOW };
    case 'chamfer':
    case 'taper-engrave':
      return { ...cut, follow };
  }
}

/** Shallow cuts follow the surface where one was measured: their width shows every tenth of height. */
function defaultFollow(job: Job, cut: Cut): 'flat' | 'surface' {
  const shallow = cut.kind === 'engrave' || cut.kind === 'taper-engrave' || cut.kind === 'chamfer';
  return shallow && job.board.surface[cut.face] !== null ? 'surface' : 'flat';
}

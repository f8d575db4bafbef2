import type { CutOf } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import { turnCorner } from '@/lib/job/turn';
import type { Finding } from '@/lib/report/report';
import { setCutField } from './edits/edit-cuts';

/** A change that does away with a finding, ready to be made. */
export interface Mend {
  /** What the button says and what the step is called. */
  readonly label: string;
  readonly job: Job;
}

/** The one or two ways to mend a finding that need no further decision; none where a person must think. */
export function mendsFor(job: Job, finding: Finding): readonly Mend[] {
  switch (finding.code) {
    case 'tab-without-wood':
    case 'tab-thin':
      return tabMends(job, finding);
    case 'part-loose':
      return field(job, finding, 'Give it four tabs', 'tabs', {
        length: 8,
        height: 'auto',
        hold: 3,
        placement: { type: 'count', count: 4 },
      });
    case 'cut-out-too-early':
      return cutOutLast(job, finding);
    case 'turn-mismatch':
      return matchingZeros(job);
    case 'shallow-on-cup':
      return field(job, finding, 'Follow the measured surface', 'follow', 'surface');
    case 'no-centre-cut':
      return field(job, finding, 'Enter on a ramp', 'entry', { type: 'ramp', angle: 3 });
    default:
      return [];
  }
}

function tabMends(job: Job, finding: Finding): readonly Mend[] {
  const cut = profileOf(job, finding);
  if (!cut?.tabs) return [];
  if (cut.tabs.height !== 'auto') return field(job, finding, 'Set the height to auto', 'tabs.height', 'auto');
  return field(job, finding, 'Ask for 2 mm of wood', 'tabs.hold', Math.min(2, cut.tabs.hold));
}

function field(job: Job, { cut }: Finding, label: string, key: string, value: unknown): readonly Mend[] {
  if (cut === undefined) return [];
  const changed = setCutField(job, cut, key, value);
  return changed.ok ? [{ label, job: changed.value }] : [];
}

/** Moves the cut-out behind all other cuts of its face. */
function cutOutLast(job: Job, finding: Finding): readonly Mend[] {
  const cut =
    profileOf(job, finding) ?? job.cuts.find(({ kind, face }) => kind === 'profile' && face === finding.face);
  if (!cut || cut === job.cuts.at(-1)) return [];
  return [
    { label: 'Cut it out last', job: { ...job, cuts: [...job.cuts.filter((other) => other !== cut), cut] } },
  ];
}

/** Puts face B's zero on the same physical corner as face A's. */
function matchingZeros(job: Job): readonly Mend[] {
  const { A, B } = job.setups;
  if (!A || !B) return [];
  const corner = turnCorner(job.turn.axis, A.zero.corner);
  const setups = { ...job.setups, B: { ...B, zero: { ...B.zero, corner } } };
  return [{ label: `Zero face B at ${corner}`, job: { ...job, setups } }];
}

function profileOf(job: Job, { cut: id }: Finding): CutOf<'profile'> | null {
  const cut = job.cuts.find((other) => other.id === id);
  return cut?.kind === 'profile' ? cut : null;
}

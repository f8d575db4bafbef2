import type { SectionDrawing, SectionTab } from '@/components/canvas/draw-section';
import type { SectionLine } from '@/lib/editor/session';
import { dot, leftOf, subtract, type Vec } from '@/lib/geometry/vec';
import { cutterOf } from '@/lib/job/cut-values';
import { lengthWithUnit } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import { turnPoint } from '@/lib/job/turn';
import type { Section } from '@/lib/proof/section';
import type { TabPlace } from '@/lib/report/intent';
import type { PlanState } from './use-planning';

/** The section with the tabs that its line crosses; null while the newest one is of another face. */
export function sectionDrawing(
  section: Section,
  job: Job,
  face: Face,
  line: SectionLine,
  plan: Pick<PlanState, 'tabs' | 'report'>,
): SectionDrawing | null {
  if (section.face !== face) return null;
  const counts = new Map<string, number>();
  const tabs = plan.tabs.flatMap((place): SectionTab[] => {
    const index = counts.get(place.cut) ?? 0;
    counts.set(place.cut, index + 1);
    const cut = job.cuts.find(({ id }) => id === place.cut);
    if (!cut) return [];
    const span = crossing(
      placeSeen(place, job, cut.face === face),
      place.length,
      cutterOf(job, cut).diameter,
      line,
    );
    if (!span) return [];
    const proven = plan.report?.cuts.find(({ id }) => id === place.cut)?.tabs[index];
    const { farDepth, height } = place;
    const upright = cut.face === face;
    return [
      {
        ...span,
        bottom: upright ? Math.min(farDepth, height) : job.board.z - height,
        top: upright ? height : job.board.z - Math.min(farDepth, height),
        label: proven
          ? `tab ${index + 1}: ${lengthWithUnit(Number(proven.wood.height.toFixed(1)), job.display)}`
          : `tab ${index + 1}`,
        holds: proven?.holds ?? true,
      },
    ];
  });
  return { length: section.length, thickness: section.thickness, wood: section.wood, tabs };
}

/** A tab's middle and direction in the view of the face that is up. */
function placeSeen(
  { center, along }: TabPlace,
  { board, turn }: Job,
  upright: boolean,
): { center: Vec; along: Vec } {
  const own = { center: { x: center[0], y: center[1] }, along: { x: along[0], y: along[1] } };
  if (upright) return own;
  const { x, y } = own.along;
  return {
    center: turnPoint(board, turn.axis, own.center),
    along: turn.axis === 'x' ? { x, y: -y } : { x: -x, y },
  };
}

/** From where to where along the line a tab's rectangle reaches, mm, or null where the line misses it. */
function crossing(
  { center, along }: { center: Vec; along: Vec },
  length: number,
  width: number,
  { from, to }: SectionLine,
): { from: number; to: number } | null {
  const way = subtract(to, from);
  const size = Math.hypot(way.x, way.y);
  if (size === 0) return null;
  const start = subtract(from, center);
  let low = 0;
  let high = 1;
  for (const [axis, half] of [
    [along, length / 2],
    [leftOf(along), width / 2],
  ] as const) {
    const at = dot(start, axis);
    const speed = dot(way, axis);
    if (Math.abs(speed) < 1e-12) {
      if (Math.abs(at) > half) return null;
      continue;
    }
    const a = (-half - at) / speed;
    const b = (half - at) / speed;
    low = Math.max(low, Math.min(a, b));
    high = Math.min(high, Math.max(a, b));
  }
  return low < high ? { from: low * size, to: high * size } : null;
}

import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { TabPlace } from '@/lib/report/intent';
import type { Problem } from '@/lib/report/problem';
import type { Report } from '@/lib/report/report';
import type { Section } from '@/lib/proof/section';
import type { DrawnPath } from '@/lib/moves/drawn-path';
import type { FacePixels } from '@/lib/proof/face-picture';

/** What the bench asks of its planning worker. `id` comes back with every answer. */
export type PlanningRequest =
  | { readonly type: 'fonts'; readonly fonts: ReadonlyMap<string, ArrayBuffer> }
  | { readonly type: 'plan'; readonly id: number; readonly job: Job }
  /** A section of the board as the last proof left it; `face` says in whose view the line is given. */
  | {
      readonly type: 'section';
      readonly id: number;
      readonly face: Face;
      readonly from: Vec;
      readonly to: Vec;
    };

export type PlanningAnswer =
  | { readonly type: 'progress'; readonly id: number; readonly share: number; readonly what: string }
  /** Cutter paths, as soon as they are known and before they are proven. */
  | {
      readonly type: 'paths';
      readonly id: number;
      readonly paths: readonly DrawnPath[];
      readonly tabs: readonly TabPlace[];
    }
  | {
      readonly type: 'proof';
      readonly id: number;
      readonly report: Report;
      readonly pictures: Readonly<Record<Face, FacePixels | null>>;
    }
  /** The document cannot be planned: what is wrong, by place. */
  | { readonly type: 'problems'; readonly id: number; readonly problems: readonly Problem[] }
  | { readonly type: 'failed'; readonly id: number; readonly message: string }
  | { readonly type: 'section'; readonly id: number; readonly section: Section | null };

import { z } from 'zod';
import { plainName } from './account';
import { moment, person, recordId } from './moment';
import { projectRole } from './roles';

export const PROJECT_STATES = ['draft', 'in-review', 'approved', 'cut'] as const;
export const projectState = z.enum(PROJECT_STATES);
export type ProjectState = (typeof PROJECT_STATES)[number];

const size = z.object({ x: z.number(), y: z.number(), z: z.number() });

/** One card of the list. */
export const projectItem = z.object({
  id: recordId,
  name: z.string(),
  state: projectState,
  /** What the asking person is in it. */
  role: projectRole,
  owner: person,
  /** mm. */
  board: size,
  material: z.string(),
  /** Addresses of SVG pictures of the faces; they change with the document, so they may be cached for good. */
  pictures: z.object({ A: z.string(), B: z.string() }),
  openComments: z.int(),
  createdAt: moment,
  updatedAt: moment,
});
export type ProjectItem = z.infer<typeof projectItem>;

/** A project without its job document, which `/job` gives. */
export const project = projectItem.extend({
  shop: z.object({ id: recordId, name: z.string() }).nullable(),
  /** Version of the job document; the value of its ETag without the quotes. */
  version: z.int(),
  /** SHA-256 of the canonical job document. */
  jobHash: z.string(),
  /** Number of the newest revision, or null. */
  newestRevision: z.int().nullable(),
});
export type Project = z.infer<typeof project>;

export const projectListQuery = z.strictObject({
  /** Words to find in the name, in any order. */
  search: z.string().trim().max(200).default(''),
  state: projectState.optional(),
  /** `nextCursor` of the page before. */
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(24),
});
export type ProjectListQuery = z.input<typeof projectListQuery>;

/** Newest change first. */
export const projectPage = z.object({ items: z.array(projectItem), nextCursor: z.string().nullable() });
export type ProjectPage = z.infer<typeof projectPage>;

/** Example jobs that a project may start from. */
export const EXAMPLE_IDS = ['hallway-rail', 'house-number', 'drawer-tray', 'drill-jig'] as const;
export type ExampleId = (typeof EXAMPLE_IDS)[number];

const millimetres = z.number().positive().max(100_000);

export const createProjectBody = z.discriminatedUnion('from', [
  z.strictObject({
    from: z.literal('empty'),
    name: plainName,
    /** mm; 300 × 200 × 18 where left out. */
    board: z.strictObject({ x: millimetres, y: millimetres, z: millimetres }).optional(),
    display: z.enum(['mm', 'in']).optional(),
  }),
  z.strictObject({ from: z.literal('example'), example: z.enum(EXAMPLE_IDS), name: plainName.optional() }),
  /** A whole job document, as a job file holds it; checked like a saved one. */
  z.strictObject({ from: z.literal('job'), job: z.unknown(), name: plainName.optional() }),
]);
export type CreateProjectBody = z.infer<typeof createProjectBody>;

export const changeProjectBody = z
  .strictObject({ name: plainName.optional(), state: projectState.optional() })
  .refine((body) => body.name !== undefined || body.state !== undefined, 'must change something');
export type ChangeProjectBody = z.infer<typeof changeProjectBody>;

export const duplicateProjectBody = z.strictObject({ name: plainName.optional() });
export type DuplicateProjectBody = z.infer<typeof duplicateProjectBody>;

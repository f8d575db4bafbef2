import { z } from 'zod';
import { FINDING_CODES, type FindingCode } from '@/lib/report/finding-codes';
import { face } from '@/lib/job/numbers';

const point = z.tuple([z.number(), z.number()]).readonly();
const point3 = z.tuple([z.number(), z.number(), z.number()]).readonly();

export const finding = z.object({
  severity: z.enum(['error', 'warning']),
  code: z.enum(Object.keys(FINDING_CODES) as [FindingCode, ...FindingCode[]]),
  cut: z.string().exactOptional(),
  face: face.exactOptional(),
  at: point.exactOptional(),
  message: z.string(),
});

const tabReport = z.object({
  outline: z.string(),
  contour: z.int(),
  fraction: z.number(),
  at: point,
  length: z.number(),
  height: z.number(),
  wood: z.object({ height: z.number(), area: z.number() }),
  holds: z.boolean(),
});

const cutReport = z.object({
  id: z.string(),
  seconds: z.number(),
  cutLength: z.number(),
  travelLength: z.number(),
  removed: z.number(),
  minZ: z.number().nullable(),
  tabs: z.array(tabReport).readonly(),
});

export const programReport = z.object({
  file: z.string(),
  face,
  cutters: z.array(z.string()).readonly(),
  cuts: z.array(z.string()).readonly(),
  seconds: z.number(),
  lines: z.int(),
  sha256: z.string(),
  bounds: z.object({ min: point3, max: point3 }),
});

/** The plan report of the saved job document: what `plan` writes as `report.json`. */
export const planReport = z.object({
  job: z.string(),
  seconds: z.number(),
  programs: z.array(programReport).readonly(),
  cuts: z.array(cutReport).readonly(),
  findings: z.array(finding).readonly(),
});
export type PlanReport = z.infer<typeof planReport>;

export const programItem = programReport.extend({
  /** Size of the text in bytes. */
  bytes: z.int(),
  /** Where it is downloaded. */
  href: z.string(),
});
export type ProgramItem = z.infer<typeof programItem>;

/** The programs of the saved job document, in the order in which they run. */
export const programList = z.object({
  version: z.int(),
  jobHash: z.string(),
  /** Whether a finding is an error; programs are then not handed out. */
  blocked: z.boolean(),
  seconds: z.number(),
  programs: z.array(programItem),
  findings: z.array(finding).readonly(),
  /** Where all of them are downloaded as one archive. */
  archive: z.string(),
});
export type ProgramList = z.infer<typeof programList>;

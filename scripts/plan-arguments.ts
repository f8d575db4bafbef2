import { fail, ok, type Result } from '@/lib/base/result';

export const USAGE = [
  'Usage: npm run --silent plan -- JOB.json --out DIR [--force]',
  '       npm run --silent plan -- --canonical JOB.json',
  '       npm run --silent plan -- --prove PROGRAM.nc [--job JOB.json] [--face A|B]',
].join('\n');

/** What the command line asks for. */
export type PlanRequest =
  | { readonly mode: 'plan'; readonly job: string; readonly out: string; readonly force: boolean }
  | { readonly mode: 'canonical'; readonly job: string }
  | {
      readonly mode: 'prove';
      readonly program: string;
      readonly job: string | null;
      readonly face: 'A' | 'B' | null;
    };

const WITH_VALUE = new Set(['--out', '--job', '--face', '--prove']);
const FLAGS = new Set(['--force', '--canonical']);

/** Reads the command line; options may stand in any order. The error is one plain sentence. */
export function readPlanArguments(args: readonly string[]): Result<PlanRequest, string> {
  const values = new Map<string, string>();
  const flags = new Set<string>();
  const files: string[] = [];
  for (let i = 0; i < args.length; i++) {
    const arg = args[i]!;
    if (WITH_VALUE.has(arg)) {
      const value = args[++i];
      if (value === undefined) return fail(`${arg} needs a value.`);
      values.set(arg, value);
    } else if (FLAGS.has(arg)) flags.add(arg);
    else if (arg.startsWith('-')) return fail(`There is no option ${arg}.`);
    else files.push(arg);
  }
  return requestOf(values, flags, files);
}

function requestOf(
  values: ReadonlyMap<string, string>,
  flags: ReadonlySet<string>,
  files: readonly string[],
): Result<PlanRequest, string> {
  const program = values.get('--prove');
  if (program !== undefined) {
    const face = values.get('--face') ?? null;
    if (files.length > 0) return fail(`With --prove the job is given by --job, not as '${files[0]}'.`);
    if (face !== null && face !== 'A' && face !== 'B') return fail(`--face is A or B, not '${face}'.`);
    return ok({ mode: 'prove', program, job: values.get('--job') ?? null, face });
  }
  const [job, ...more] = files;
  if (job === undefined) return fail('No job document was named.');
  if (more.length > 0) return fail(`One job document at a time; '${more[0]}' is one too many.`);
  if (flags.has('--canonical')) return ok({ mode: 'canonical', job });
  const out = values.get('--out');
  if (out === undefined) return fail('--out DIR says where the programs go; it is missing.');
  return ok({ mode: 'plan', job, out, force: flags.has('--force') });
}

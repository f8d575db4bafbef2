import 'server-only';
import type { z } from 'zod';
import { problemPath } from '@/lib/job/problem-path';
import type { Problem } from '@/lib/report/problem';
import { ApiError } from './api-error';

/** `value` as `schema` has it, or the refusal `invalid` with every problem. Never repeats what was sent: it may be a password. */
export function checkInput<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value, { error: sentence });
  if (parsed.success) return parsed.data;
  throw invalid(parsed.error.issues.flatMap(problemsOf));
}

/** The refusal for these problems; its sentence is the first of them. */
export function invalid(problems: readonly Problem[]): ApiError {
  const first = problems[0] ?? { path: '$', message: 'is not right' };
  const more = problems.length > 1 ? ` (and ${problems.length - 1} more)` : '';
  const detail = `${first.path}: ${first.message.replace(/\.$/, '')}${more}.`;
  return new ApiError('invalid', detail, { problems: [...problems] });
}

/** The query as an object; a key given twice is refused, or a second value could slip past what looks at the first. */
export function queryObject(url: URL): Record<string, string> {
  const query: Record<string, string> = {};
  for (const [key, value] of url.searchParams) {
    if (Object.hasOwn(query, key)) throw invalid([{ path: key, message: 'is given twice' }]);
    Object.defineProperty(query, key, { value, enumerable: true });
  }
  return query;
}

function problemsOf(issue: z.core.$ZodIssue): Problem[] {
  if (issue.code !== 'unrecognized_keys') return [{ path: problemPath(issue.path), message: issue.message }];
  return issue.keys.map((key) => ({ path: problemPath([...issue.path, key]), message: 'is not known here' }));
}

/** What zod says where the schema has no words of its own. */
function sentence(issue: z.core.$ZodRawIssue): string {
  if (issue.input === undefined) return 'is missing';
  switch (issue.code) {
    case 'invalid_type':
      return `must be ${EXPECTED[issue.expected] ?? `a ${issue.expected}`}`;
    case 'invalid_value':
      return `must be ${issue.values.map((value) => JSON.stringify(value)).join(' or ')}`;
    case 'too_small':
      return sized(issue.origin)
        ? `needs at least ${issue.minimum} entries`
        : `must be above ${issue.minimum}`;
    case 'too_big':
      return sized(issue.origin)
        ? `may have at most ${issue.maximum} entries`
        : `must be at most ${issue.maximum}`;
    case 'invalid_format':
      return issue.format === 'uuid' ? 'must be an id' : 'is not written as it should be';
    default:
      return 'is not right';
  }
}

function sized(origin: string): boolean {
  return origin !== 'number' && origin !== 'int';
}

const EXPECTED: Readonly<Record<string, string>> = {
  int: 'a whole number',
  object: 'an object',
  array: 'a list',
  tuple: 'a list',
  string: 'a text',
  boolean: 'true or false',
};

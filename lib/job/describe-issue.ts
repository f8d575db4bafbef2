import type { z } from 'zod';
import type { Problem } from '@/lib/report/problem';
import { problemPath } from './problem-path';

type Issue = z.core.$ZodIssue;

/** Turns what zod found wrong with `document` into problems that name the key itself and say what would be right. */
export function describeIssues(issues: readonly Issue[], document: unknown): Problem[] {
  return issues.flatMap((issue) => describeIssue(issue, document));
}

function describeIssue(issue: Issue, document: unknown): Problem[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      path: problemPath([...issue.path, key]),
      message: `there is no '${key}' here; check its spelling or take it out.`,
    }));
  }
  const value = valueAt(document, issue.path);
  return [{ path: problemPath(issue.path), message: sentence(issue, value) }];
}

function sentence(issue: Issue, value: unknown): string {
  if (value === undefined) return 'is missing.';
  switch (issue.code) {
    case 'invalid_type':
      return `must be ${withArticle(issue.expected)}, not ${show(value)}.`;
    case 'too_small':
      return tooSmall(issue, value);
    case 'too_big':
      return issue.origin === 'number' || issue.origin === 'int'
        ? `must be at most ${issue.maximum}, not ${show(value)}.`
        : `is too long: at most ${issue.maximum} ${unitOf(issue.origin)}.`;
    case 'invalid_value':
      return `must be ${oneOf(issue.values)}, not ${show(value)}.`;
    case 'invalid_format':
      return formatSentence(issue, value);
    case 'invalid_union':
      return unionSentence(issue, value);
    default:
      return `is not right: ${show(value)}.`;
  }
}

function tooSmall(issue: Extract<Issue, { code: 'too_small' }>, value: unknown): string {
  if (issue.origin !== 'number' && issue.origin !== 'int') {
    return `needs at least ${issue.minimum} ${unitOf(issue.origin)}.`;
  }
  return issue.inclusive
    ? `must be at least ${issue.minimum}, not ${show(value)}.`
    : `must be above ${issue.minimum}, not ${show(value)}.`;
}

function formatSentence(issue: Extract<Issue, { code: 'invalid_format' }>, value: unknown): string {
  const isId = 'pattern' in issue && String(issue.pattern).includes('1,40');
  return isId
    ? `must be 1 to 40 letters, digits, - or _, not ${show(value)}.`
    : 'holds characters that cannot be shown; use one line of plain text.';
}

function unionSentence(issue: Extract<Issue, { code: 'invalid_union' }>, value: unknown): string {
  const literals = issue.errors
    .flat()
    .flatMap((inner) => (inner.code === 'invalid_value' ? inner.values : []));
  const number = issue.errors.flat().find((inner) => inner.code === 'too_small' || inner.code === 'too_big');
  if (typeof value === 'number' && number) return sentence(number, value);
  if (literals.length > 0) return `must be a number or ${oneOf(literals)}, not ${show(value)}.`;
  return `is not a known kind: ${show(value)}.`;
}

function withArticle(expected: string): string {
  const names: Record<string, string> = {
    int: 'a whole number',
    object: 'an object',
    record: 'an object',
    array: 'a list',
    tuple: 'a list',
    string: 'a text',
    boolean: 'true or false',
  };
  return names[expected] ?? `a ${expected}`;
}

function unitOf(origin: string): string {
  return origin === 'string' ? 'characters' : 'entries';
}

function oneOf(values: readonly unknown[]): string {
  const shown = values.map((value) => JSON.stringify(value));
  return shown.length === 1 ? shown[0]! : `one of ${shown.join(', ')}`;
}

/** A value short enough for a sentence. */
function show(value: unknown): string {
  if (typeof value === 'number') return String(value);
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'object' && value !== null) return 'an object';
  const text = JSON.stringify(value) ?? String(value);
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}

function valueAt(document: unknown, path: readonly PropertyKey[]): unknown {
  let value = document;
  for (const key of path) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, key)) return undefined;
    value = (value as Record<PropertyKey, unknown>)[key];
  }
  return value;
}

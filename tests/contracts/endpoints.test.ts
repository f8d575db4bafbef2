import { describe, expect, it } from 'vitest';
import { signUpBody } from '@/lib/contracts/account';
import { endpointHref } from '@/lib/contracts/endpoint';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { jobEtag, versionOfEtag } from '@/lib/contracts/job-document';
import { ERROR_CODES } from '@/lib/contracts/problem-details';
import { mayInProject, PROJECT_PERMISSIONS } from '@/lib/contracts/roles';

const id = '00000000-0000-4000-8000-000000000000';

describe('endpoints', () => {
  it('are each their own method and address', () => {
    const all = Object.values(ENDPOINTS).map(({ method, path }) => `${method} ${path}`);
    expect(new Set(all).size).toBe(all.length);
  });

  it.each(Object.entries(ENDPOINTS))(
    '%s names every parameter of its address, and no other',
    (_, endpoint) => {
      const named = [...endpoint.path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name!);
      const filled = Object.fromEntries(named.map((name) => [name, VALUES[name] ?? id]));
      expect(endpoint.params.safeParse(filled).success).toBe(true);
      if (named.length > 0) expect(endpoint.params.safeParse({}).success).toBe(false);
      expect(endpoint.params.safeParse({ ...filled, extra: 'x' }).success).toBe(false);
    },
  );

  it('give addresses with their parameters escaped and empty query values left out', () => {
    const href = endpointHref(
      ENDPOINTS.getProgram,
      { projectId: id, file: 'a b/c' },
      { x: undefined, y: 'ä&' },
    );
    expect(href).toBe(`/api/projects/${id}/programs/a%20b%2Fc?y=%C3%A4%26`);
    expect(() => endpointHref(ENDPOINTS.getProgram, { projectId: id })).toThrow('needs file');
  });
});

const VALUES: Readonly<Record<string, string>> = { number: '3', file: '01-A-flat6.nc', face: 'B' };

describe('entity tags', () => {
  it('name a version and are read back', () => {
    expect(versionOfEtag(jobEtag(12))).toBe(12);
    expect(versionOfEtag('W/"12"')).toBe(12); // a proxy that compresses weakens the tag
  });

  it.each(['*', '12', '"a"', '"1", "2"', '""', '"-1"'])('%s is none', (header) => {
    expect(versionOfEtag(header)).toBeNull();
  });
});

describe('roles', () => {
  it('give outsiders nothing and owners everything', () => {
    for (const permission of Object.keys(PROJECT_PERMISSIONS) as (keyof typeof PROJECT_PERMISSIONS)[]) {
      expect(mayInProject(null, permission)).toBe(false);
      expect(mayInProject('owner', permission)).toBe(true);
    }
  });

  it('let a reviewer read and comment, and change nothing', () => {
    expect(mayInProject('reviewer', 'project.comment')).toBe(true);
    expect(mayInProject('reviewer', 'project.edit')).toBe(false);
    expect(mayInProject('editor', 'project.manage-members')).toBe(false);
  });
});

describe('an account', () => {
  const good = { email: ' Some.One@Example.org ', name: ' Some One ', password: 'a good long password' };

  it('is known by its address in lower case, without spaces around it', () => {
    expect(signUpBody.parse(good)).toMatchObject({ email: 'some.one@example.org', name: 'Some One' });
  });

  it.each([
    ['email', 'not an address'],
    ['name', '   '],
    ['name', 'two\nlines'],
    ['password', 'short'],
  ])('has no %s like %j', (key, value) => {
    expect(signUpBody.safeParse({ ...good, [key]: value }).success).toBe(false);
  });
});

it('every error code has an HTTP status of an error', () => {
  for (const { status } of Object.values(ERROR_CODES)) {
    expect(status).toBeGreaterThanOrEqual(400);
    expect(status).toBeLessThan(600);
  }
});

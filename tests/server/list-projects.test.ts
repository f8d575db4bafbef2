import { beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { ProjectPage, ProjectListQuery, Project } from '@/lib/contracts/project';
import { type Actor, call, makeActor, putInProject } from './api-client';

const NAMES = ['Tray, small', 'Tray, large', 'Rail 100%', 'Rail_A', 'House number'];

let maker: Actor;
let projects: Project[];
beforeAll(async () => {
  maker = await makeActor('Lister');
  projects = [];
  for (const name of NAMES) {
    const made = await call(maker, ENDPOINTS.createProject, { body: { from: 'empty', name } });
    projects.push((await made.json()) as Project);
  }
});

async function list(query: ProjectListQuery = {}, actor = maker): Promise<ProjectPage> {
  const given = query as Record<string, string | number | undefined>;
  return (await (await call(actor, ENDPOINTS.listProjects, { query: given })).json()) as ProjectPage;
}

const names = async (query?: ProjectListQuery) => (await list(query)).items.map(({ name }) => name);

describe('the list of projects', () => {
  it('has the newest change first', async () => {
    expect(await names()).toEqual(NAMES.toReversed());
  });

  it('finds words of the name in any order and case', async () => {
    expect(await names({ search: 'SMALL tray' })).toEqual(['Tray, small']);
    expect(await names({ search: 'nowhere' })).toEqual([]);
  });

  it('takes what means something to SQL as it stands', async () => {
    expect(await names({ search: '%' })).toEqual(['Rail 100%']);
    expect(await names({ search: '_' })).toEqual(['Rail_A']);
    expect(await names({ search: '\\' })).toEqual([]);
    expect(await names({ search: "'; drop table projects; --" })).toEqual([]);
  });

  it('goes on from page to page without gaps or doubles, while something is saved in between', async () => {
    const first = await list({ limit: 2 });
    expect(first.items.map(({ name }) => name)).toEqual(['House number', 'Rail_A']);
    await call(maker, ENDPOINTS.changeProject, {
      params: { projectId: first.items[1]!.id },
      body: { state: 'approved' },
    });
    const second = await list({ limit: 2, cursor: first.nextCursor! });
    const third = await list({ limit: 2, cursor: second.nextCursor! });
    const rest = [...second.items, ...third.items].map(({ name }) => name);
    expect(rest).toEqual(['Rail 100%', 'Tray, large', 'Tray, small']);
    expect(third.nextCursor).toBeNull();
    expect((await list()).items[0]).toMatchObject({ name: 'Rail_A', state: 'approved' });
    expect(await names({ state: 'approved' })).toEqual(['Rail_A']);
  });

  it('shows to each what they are members of, with their own role', async () => {
    const guest = await makeActor('Guest');
    expect((await list({}, guest)).items).toEqual([]);
    await putInProject(guest, projects[0]!.id, 'reviewer');
    expect((await list({}, guest)).items).toMatchObject([
      { name: NAMES[0], role: 'reviewer', openComments: 0 },
    ]);
  });
});

describe('making a project', () => {
  it.each(['hallway-rail', 'house-number', 'drawer-tray', 'drill-jig'])(
    'from the example %s',
    async (example) => {
      const made = await call(maker, ENDPOINTS.createProject, { body: { from: 'example', example } });
      expect(made.status).toBe(201);
    },
  );

  it('from a job document, checked like a saved one', async () => {
    const { job } = (await (
      await call(maker, ENDPOINTS.getJob, { params: { projectId: projects[0]!.id } })
    ).json()) as { job: object };
    const made = await call(maker, ENDPOINTS.createProject, {
      body: { from: 'job', job, name: 'From a file' },
    });
    expect(await made.json()).toMatchObject({ name: 'From a file', version: 1, role: 'owner' });
    const wrong = await call(maker, ENDPOINTS.createProject, {
      body: { from: 'job', job: { ...job, cuts: 1 } },
    });
    expect(wrong.status).toBe(422);
    expect(await wrong.json()).toMatchObject({ problems: [{ path: 'job.cuts' }] });
  });

  it('as a copy that belongs to who makes it', async () => {
    const reviewer = await makeActor('Copier');
    const source = projects[1]!;
    await putInProject(reviewer, source.id, 'reviewer');
    const made = await call(reviewer, ENDPOINTS.duplicateProject, {
      params: { projectId: source.id },
      body: {},
    });
    const copy = (await made.json()) as Project;
    expect(copy).toMatchObject({ name: 'Tray, large (copy)', role: 'owner', version: 1 });
    expect((await call(maker, ENDPOINTS.getProject, { params: { projectId: copy.id } })).status).toBe(404);
  });
});

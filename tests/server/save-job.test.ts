import { beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { JobSaved, SavedJob } from '@/lib/contracts/job-document';
import type { ProblemDetails } from '@/lib/contracts/problem-details';
import type { Project } from '@/lib/contracts/project';
import type { Job } from '@/lib/job/job-schema';
import { type Actor, call, makeActor, putInProject } from './api-client';

let owner: Actor;
beforeAll(async () => {
  owner = await makeActor('Saver');
});

async function newProject(): Promise<{ projectId: string; job: Job }> {
  const made = await call(owner, ENDPOINTS.createProject, { body: { from: 'empty', name: 'Tray' } });
  const { id } = (await made.json()) as Project;
  return { projectId: id, job: (await read(id)).job };
}

async function read(projectId: string): Promise<SavedJob> {
  return (await (await call(owner, ENDPOINTS.getJob, { params: { projectId } })).json()) as SavedJob;
}

function save(
  projectId: string,
  body: unknown,
  ifMatch: string | undefined,
  actor = owner,
): Promise<Response> {
  return call(actor, ENDPOINTS.saveJob, { params: { projectId }, body, headers: { 'if-match': ifMatch } });
}

describe('saving a job document', () => {
  it('answers with the next version as ETag and keeps what was sent', async () => {
    const { projectId, job } = await newProject();
    const response = await save(projectId, { ...job, name: 'Tray, deeper' }, '"1"');
    expect(response.status).toBe(200);
    expect(response.headers.get('etag')).toBe('"2"');
    const { version, hash } = (await response.json()) as JobSaved;
    const saved = await read(projectId);
    expect(saved).toMatchObject({ version, hash, savedBy: { name: 'Saver' } });
    expect(saved.job.name).toBe('Tray, deeper');
  });

  it('shows the new name and board in the project', async () => {
    const { projectId, job } = await newProject();
    await save(projectId, { ...job, name: 'Long tray', board: { ...job.board, x: 777 } }, '"1"');
    const project = await call(owner, ENDPOINTS.getProject, { params: { projectId } });
    expect(await project.json()).toMatchObject({ name: 'Long tray', version: 2, board: { x: 777 } });
  });

  it('wants to know which version it was made from', async () => {
    const { projectId, job } = await newProject();
    expect((await save(projectId, job, undefined)).status).toBe(428);
    expect((await save(projectId, job, '*')).status).toBe(400);
    expect((await read(projectId)).version).toBe(1);
  });

  it('refuses to overwrite a newer version and hands it over', async () => {
    const { projectId, job } = await newProject();
    const editor = await makeActor('Editor');
    await putInProject(editor, projectId, 'editor');
    await save(projectId, { ...job, name: 'Theirs' }, '"1"', editor);
    const late = await save(projectId, { ...job, name: 'Mine' }, '"1"');
    expect(late.status).toBe(412);
    expect(late.headers.get('etag')).toBe('"2"');
    const problem = (await late.json()) as ProblemDetails;
    expect(problem.code).toBe('stale-version');
    expect(problem.current).toMatchObject({
      version: 2,
      job: { name: 'Theirs' },
      savedBy: { name: 'Editor' },
    });
    expect((await read(projectId)).job.name).toBe('Theirs');
  });

  it('refuses an invalid document with the place of each problem and keeps the saved one', async () => {
    const { projectId, job } = await newProject();
    const broken = { ...job, board: { ...job.board, z: -1 }, extra: true };
    const response = await save(projectId, broken, '"1"');
    expect(response.status).toBe(422);
    const { problems } = (await response.json()) as ProblemDetails;
    expect(problems?.map(({ path }) => path).sort()).toEqual(['board.z', 'extra']);
    expect((await read(projectId)).version).toBe(1);
  });

  it('refuses characters that the database cannot keep, with their place', async () => {
    const { projectId, job } = await newProject();
    for (const material of ['a\0b', 'half \ud83d']) {
      const response = await save(projectId, { ...job, board: { ...job.board, material } }, '"1"');
      expect(response.status).toBe(422);
      expect(((await response.json()) as ProblemDetails).problems?.[0]?.path).toBe('board.material');
    }
  });

  it('lets one of twenty simultaneous saves of the same version win and tells the others', async () => {
    const { projectId, job } = await newProject();
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, n) => save(projectId, { ...job, name: `Save ${n}` }, '"1"')),
    );
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 200)).toHaveLength(1);
    expect(statuses.filter((status) => status === 412)).toHaveLength(19);
    const winner = statuses.indexOf(200);
    expect(await read(projectId)).toMatchObject({ version: 2, job: { name: `Save ${winner}` } });
  });

  it('loses no update when writers retry until they succeed', async () => {
    const { projectId } = await newProject();
    const addOutline = async (n: number): Promise<void> => {
      for (;;) {
        const { job, version } = await read(projectId);
        const shape = { type: 'ellipse', cx: n, cy: n, rx: 1, ry: 1 };
        const outlines = [...job.outlines, { id: `o${n}`, face: 'A', shape }];
        if ((await save(projectId, { ...job, outlines }, `"${version}"`)).status === 200) return;
      }
    };
    await Promise.all(Array.from({ length: 6 }, (_, n) => addOutline(n)));
    const { job, version } = await read(projectId);
    expect(job.outlines.map(({ id }) => id).sort()).toEqual(['o0', 'o1', 'o2', 'o3', 'o4', 'o5']);
    expect(version).toBe(7);
  });

  it('answers 304 to a client that holds the version', async () => {
    const { projectId } = await newProject();
    const again = await call(owner, ENDPOINTS.getJob, {
      params: { projectId },
      headers: { 'if-none-match': '"1"' },
    });
    expect(again.status).toBe(304);
    expect(await again.text()).toBe('');
  });

  it('makes a rename a new version of the document', async () => {
    const { projectId } = await newProject();
    await call(owner, ENDPOINTS.changeProject, { params: { projectId }, body: { name: 'Renamed' } });
    expect(await read(projectId)).toMatchObject({ version: 2, job: { name: 'Renamed' } });
  });
});

describe('a deleted project', () => {
  it('is not there any more, for its owner neither, while its row is kept', async () => {
    const { projectId, job } = await newProject();
    expect((await call(owner, ENDPOINTS.deleteProject, { params: { projectId } })).status).toBe(204);
    const params = { projectId };
    const answers = await Promise.all([
      call(owner, ENDPOINTS.getProject, { params }),
      call(owner, ENDPOINTS.getJob, { params }),
      save(projectId, job, '"1"'),
      call(owner, ENDPOINTS.listComments, { params }),
      call(owner, ENDPOINTS.duplicateProject, { params, body: {} }),
      call(owner, ENDPOINTS.deleteProject, { params }),
    ]);
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 404, 404, 404, 404]);
    const list = await (await call(owner, ENDPOINTS.listProjects, { query: { limit: 100 } })).json();
    expect(JSON.stringify(list)).not.toContain(projectId);
    expect(await keptRow(projectId)).toMatchObject({ version: 1 });
  });
});

async function keptRow(id: string) {
  const { Project } = await import('@/entities/project.entity');
  const { entityManager } = await import('@/lib/server/database');
  return (await entityManager()).findOne(Project, { id });
}

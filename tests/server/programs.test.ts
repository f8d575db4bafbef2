import { unzipSync } from 'fflate';
import { afterEach, beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { ProgramList } from '@/lib/contracts/plan';
import type { Project } from '@/lib/contracts/project';
import { makeFinding } from '@/lib/report/make-finding';
import { type Actor, call, makeActor } from './api-client';
import { standInPlan } from './planned-program';

const FILE = '01-A-flat6.nc';
const TEXT = 'G21\nG90\nG1 X10 F600\n'.repeat(20_000); // several slices

let owner: Actor;
let projectId: string;
beforeAll(async () => {
  owner = await makeActor('Planner');
  const body = { from: 'empty', name: 'Löffel / "2"' };
  projectId = ((await (await call(owner, ENDPOINTS.createProject, { body })).json()) as Project).id;
});

let stop = () => {};
afterEach(() => stop());

describe('programs', () => {
  it('are listed with their size and address', async () => {
    stop = standInPlan(FILE, TEXT);
    const response = await call(owner, ENDPOINTS.listPrograms, { params: { projectId } });
    const list = (await response.json()) as ProgramList;
    expect(list).toMatchObject({ version: 1, blocked: false });
    expect(list.programs).toMatchObject([
      { file: FILE, bytes: TEXT.length, href: `/api/projects/${projectId}/programs/${FILE}` },
    ]);
  });

  it('are sent in slices, as a file of their name', async () => {
    stop = standInPlan(FILE, TEXT);
    const response = await call(owner, ENDPOINTS.getProgram, { params: { projectId, file: FILE } });
    expect(response.headers.get('content-disposition')).toBe(`attachment; filename="${FILE}"`);
    const sizes: number[] = [];
    const parts: Uint8Array[] = [];
    for await (const part of response.body!) {
      sizes.push(part.byteLength);
      parts.push(part);
    }
    expect(Math.max(...sizes)).toBeLessThanOrEqual(64 * 1024);
    expect(Buffer.concat(parts).toString()).toBe(TEXT);
  });

  it('come together in one archive, the same bytes each time, under a plain name', async () => {
    stop = standInPlan(FILE, TEXT);
    const archive = () => call(owner, ENDPOINTS.getArchive, { params: { projectId } });
    const [first, second] = [await archive(), await archive()];
    expect(first.headers.get('content-disposition')).toBe('attachment; filename="lo-ffel-2.zip"');
    const bytes = new Uint8Array(await first.arrayBuffer());
    expect(Buffer.from(bytes).equals(Buffer.from(await second.arrayBuffer()))).toBe(true);
    const files = unzipSync(bytes);
    expect(Object.keys(files)).toEqual([FILE, 'report.json']);
    expect(Buffer.from(files[FILE]!).toString()).toBe(TEXT);
  });

  it('are not handed out while a finding is an error; the list says why', async () => {
    stop = standInPlan(FILE, TEXT, [makeFinding('part-loose', 'The part comes loose.', { cut: 'c1' })]);
    const list = await call(owner, ENDPOINTS.listPrograms, { params: { projectId } });
    expect(await list.json()).toMatchObject({ blocked: true, findings: [{ code: 'part-loose' }] });
    for (const response of [
      await call(owner, ENDPOINTS.getProgram, { params: { projectId, file: FILE } }),
      await call(owner, ENDPOINTS.getArchive, { params: { projectId } }),
    ]) {
      expect(response.status).toBe(409);
      expect(await response.json()).toMatchObject({ code: 'programs-blocked', problems: [{ path: 'c1' }] });
    }
  });

  it('are handed out with warnings', async () => {
    stop = standInPlan(FILE, TEXT, [makeFinding('tab-thin', 'A tab is thin.')]);
    expect((await call(owner, ENDPOINTS.getProgram, { params: { projectId, file: FILE } })).status).toBe(200);
  });

  it('that the plan does not have are not there', async () => {
    stop = standInPlan(FILE, TEXT);
    const params = { projectId, file: '02-A-flat6.nc' };
    expect((await call(owner, ENDPOINTS.getProgram, { params })).status).toBe(404);
  });
});

describe('pictures', () => {
  it('may be kept for good only under an address that names the document', async () => {
    stop = standInPlan(FILE, TEXT);
    const project = (await (
      await call(owner, ENDPOINTS.getProject, { params: { projectId } })
    ).json()) as Project;
    const v = new URL(project.pictures.A, 'http://x').searchParams.get('v')!;
    const cacheControl = async (query: { v?: string }) => {
      const picture = await call(owner, ENDPOINTS.getPicture, { params: { projectId, face: 'A' }, query });
      return picture.headers.get('cache-control');
    };
    expect(await cacheControl({ v })).toContain('immutable');
    expect(await cacheControl({ v: '0'.repeat(16) })).toBe('private, no-cache');
    expect(await cacheControl({})).toBe('private, no-cache');
  });
});

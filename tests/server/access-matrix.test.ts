import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS, type EndpointName } from '@/lib/contracts/endpoints';
import type { Project } from '@/lib/contracts/project';
import type { CommentThread } from '@/lib/contracts/comment';
import { type Actor, call, type CallParts, makeActor, makeShop, putInProject } from './api-client';
import { standInPlan } from './planned-program';

type Who = 'stranger' | 'other' | 'reviewer' | 'editor' | 'owner';
const WHO: readonly Who[] = ['stranger', 'other', 'reviewer', 'editor', 'owner'];

/** A fresh project with its people, its comment by the owner and its revision, for one cell of the matrix. */
interface Scene {
  readonly actors: Readonly<Record<Who, Actor | null>>;
  readonly projectId: string;
  readonly commentId: string;
  readonly shopId: string;
  readonly cutterId: string;
}

type Expected = readonly [stranger: number, other: number, reviewer: number, editor: number, owner: number];

const PUBLIC: Expected = [200, 200, 200, 200, 200];
const SIGNED_IN: Expected = [401, 200, 200, 200, 200];
const MEMBERS: Expected = [401, 404, 200, 200, 200];
const MEMBERS_MAKE: Expected = [401, 404, 201, 201, 201];

const cutter = {
  id: 'flat4',
  number: 40,
  name: '4 mm upcut',
  kind: 'flat',
  diameter: 4,
  fluteLength: 15,
  reach: 25,
  shank: 6,
  speeds: { rpm: 18000, feed: 1400, plunge: 400, stepdown: 2, stepover: 0.4 },
};

/** What each endpoint is sent and what it answers to whom; written out by hand, not derived from the declarations. */
const MATRIX: Readonly<Record<EndpointName, [Expected, (scene: Scene, actor: Actor | null) => CallParts]>> = {
  live: [PUBLIC, () => ({})],
  ready: [PUBLIC, () => ({})],
  openapi: [PUBLIC, () => ({})],
  jobJsonSchema: [PUBLIC, () => ({})],
  signUp: [
    [201, 201, 201, 201, 201],
    () => ({
      body: { email: `${randomUUID()}@example.test`, name: 'New', password: 'long enough to be good' },
    }),
  ],
  me: [SIGNED_IN, () => ({})],
  changeAccount: [SIGNED_IN, () => ({ body: { name: 'Renamed' } })],
  // Right to try; the password itself is wrong.
  changePassword: [
    [401, 403, 403, 403, 403],
    () => ({ body: { current: 'not the password', next: 'long enough to be good' } }),
  ],
  listSessions: [SIGNED_IN, () => ({})],
  endSession: [
    [401, 204, 204, 204, 204],
    (_, actor) => ({ params: { sessionId: actor?.sessionId ?? randomUUID() } }),
  ],
  signOutEverywhere: [[401, 204, 204, 204, 204], () => ({})],
  listProjects: [SIGNED_IN, () => ({})],
  createProject: [[401, 201, 201, 201, 201], () => ({ body: { from: 'empty', name: 'New' } })],
  getProject: [MEMBERS, inProject()],
  changeProject: [[401, 404, 403, 200, 200], inProject({ body: { name: 'Renamed' } })],
  deleteProject: [[401, 404, 403, 403, 204], inProject()],
  duplicateProject: [MEMBERS_MAKE, inProject({ body: {} })],
  getJob: [MEMBERS, inProject()],
  // May save; this is not a job document.
  saveJob: [[401, 404, 403, 422, 422], inProject({ body: {}, headers: { 'if-match': '"1"' } })],
  listMembers: [MEMBERS, inProject()],
  addMember: [
    [401, 404, 403, 403, 201],
    ({ projectId, actors }) => ({
      params: { projectId },
      body: { email: actors.other!.email, role: 'reviewer' },
    }),
  ],
  changeMember: [
    [401, 404, 403, 403, 200],
    ({ projectId, actors }) => ({
      params: { projectId, userId: actors.reviewer!.id },
      body: { role: 'editor' },
    }),
  ],
  removeMember: [
    [401, 404, 403, 204, 204],
    ({ projectId, actors }) => ({ params: { projectId, userId: actors.editor!.id } }),
  ],
  listComments: [MEMBERS, inProject()],
  createComment: [
    MEMBERS_MAKE,
    inProject({ body: { pin: { kind: 'spot', face: 'A', x: 1, y: 2 }, text: 'Here?' } }),
  ],
  changeComment: [[401, 404, 403, 200, 200], onComment({ body: { resolved: true } })],
  deleteComment: [[401, 404, 403, 403, 204], onComment()],
  createReply: [MEMBERS_MAKE, onComment({ body: { text: 'Yes.' } })],
  listRevisions: [MEMBERS, inProject()],
  createRevision: [[401, 404, 403, 201, 201], inProject({ body: { note: 'Second' } })],
  getRevision: [MEMBERS, ({ projectId }) => ({ params: { projectId, number: 1 } })],
  listPrograms: [MEMBERS, inProject()],
  getProgram: [MEMBERS, ({ projectId }) => ({ params: { projectId, file: '01-A-flat6.nc' } })],
  getArchive: [MEMBERS, inProject()],
  getReport: [MEMBERS, inProject()],
  getPicture: [MEMBERS, ({ projectId }) => ({ params: { projectId, face: 'A' } })],
  // In the shop: the owner is its steward, the editor a maker, the reviewer a reviewer.
  listShopCutters: [SIGNED_IN, () => ({})],
  createShopCutter: [[401, 404, 403, 403, 201], ({ shopId }) => ({ body: { shop: shopId, cutter } })],
  changeShopCutter: [[401, 404, 403, 403, 200], onCutter({ body: { cutter: { ...cutter, number: 42 } } })],
  deleteShopCutter: [[401, 404, 403, 403, 204], onCutter()],
};

function inProject(parts: CallParts = {}) {
  return ({ projectId }: Scene): CallParts => ({ params: { projectId }, ...parts });
}

function onComment(parts: CallParts = {}) {
  return ({ projectId, commentId }: Scene): CallParts => ({ params: { projectId, commentId }, ...parts });
}

function onCutter(parts: CallParts = {}) {
  return ({ cutterId }: Scene): CallParts => ({ params: { cutterId }, ...parts });
}

async function makeScene(): Promise<Scene> {
  const [owner, editor, reviewer, other] = await Promise.all(
    ['Owner', 'Editor', 'Reviewer', 'Other'].map((name) => makeActor(name)),
  );
  const shopId = await makeShop([
    [owner!, 'steward'],
    [editor!, 'maker'],
    [reviewer!, 'reviewer'],
  ]);
  const made = await call(owner!, ENDPOINTS.createProject, { body: { from: 'empty', name: 'Scene' } });
  const { id: projectId } = (await made.json()) as Project;
  await putInProject(editor!, projectId, 'editor');
  await putInProject(reviewer!, projectId, 'reviewer');
  const pinned = await call(owner!, ENDPOINTS.createComment, {
    params: { projectId },
    body: { pin: { kind: 'cut', cut: 'c1' }, text: 'First' },
  });
  const { id: commentId } = (await pinned.json()) as CommentThread;
  await call(owner!, ENDPOINTS.createRevision, { params: { projectId }, body: {} });
  const added = await call(owner!, ENDPOINTS.createShopCutter, {
    body: { shop: shopId, cutter: { ...cutter, number: 41 } },
  });
  const { id: cutterId } = (await added.json()) as { id: string };
  const actors = { stranger: null, other: other!, reviewer: reviewer!, editor: editor!, owner: owner! };
  return { actors, projectId, commentId, shopId, cutterId };
}

let stopPlanning: () => void;
let untouched: Promise<Scene>;
beforeAll(() => {
  untouched = makeScene();
  stopPlanning = standInPlan('01-A-flat6.nc', 'G21\n');
});
afterAll(() => stopPlanning());

describe('who may do what', () => {
  describe.each(Object.keys(ENDPOINTS) as EndpointName[])('%s', (name) => {
    it.each(WHO.map((who, index) => [who, MATRIX[name][0][index]!] as const))(
      'answers %s with %i',
      async (who, status) => {
        // What is refused leaves the scene as it was, so those cells may share one.
        const scene = await (status < 400 ? makeScene() : untouched);
        const actor = scene.actors[who];
        const response = await call(actor, ENDPOINTS[name], MATRIX[name][1](scene, actor));
        expect(response.status, await response.clone().text()).toBe(status);
        if (status >= 400) {
          expect(response.headers.get('content-type')).toBe('application/problem+json');
        }
      },
    );
  });

  it('tells those outside nothing that tells a project from none', async () => {
    const { actors, projectId } = await makeScene();
    const [there, not] = await Promise.all(
      [projectId, randomUUID()].map((id) =>
        call(actors.other, ENDPOINTS.getProject, { params: { projectId: id } }),
      ),
    );
    expect(await there!.text()).toBe(await not!.text());
  });
});

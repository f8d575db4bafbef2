import { beforeEach, describe, expect, it } from 'vitest';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { CommentReply, CommentThread, CommentThreads } from '@/lib/contracts/comment';
import type { ProjectMembers } from '@/lib/contracts/member';
import type { Project } from '@/lib/contracts/project';
import type { RevisionItem } from '@/lib/contracts/revision';
import { type Actor, call, makeActor, putInProject } from './api-client';

let owner: Actor;
let reviewer: Actor;
let projectId: string;
beforeEach(async () => {
  [owner, reviewer] = [await makeActor('Owner'), await makeActor('Reviewer')];
  const made = await call(owner, ENDPOINTS.createProject, { body: { from: 'empty', name: 'Tray' } });
  projectId = ((await made.json()) as Project).id;
  await putInProject(reviewer, projectId, 'reviewer');
});

const spot = { kind: 'spot', face: 'B', x: 12.5, y: -3 } as const;

async function pin(actor: Actor, text: string): Promise<CommentThread> {
  const made = await call(actor, ENDPOINTS.createComment, {
    params: { projectId },
    body: { pin: spot, text },
  });
  return (await made.json()) as CommentThread;
}

async function reply(actor: Actor, commentId: string, text: string): Promise<CommentReply> {
  const made = await call(actor, ENDPOINTS.createReply, { params: { projectId, commentId }, body: { text } });
  return (await made.json()) as CommentReply;
}

function change(actor: Actor, commentId: string, body: object): Promise<Response> {
  return call(actor, ENDPOINTS.changeComment, { params: { projectId, commentId }, body });
}

async function threads(actor = owner): Promise<CommentThread[]> {
  return (
    (await (await call(actor, ENDPOINTS.listComments, { params: { projectId } })).json()) as CommentThreads
  ).items;
}

async function openComments(): Promise<number> {
  const project = await call(owner, ENDPOINTS.getProject, { params: { projectId } });
  return ((await project.json()) as Project).openComments;
}

describe('comments', () => {
  it('are pinned, answered, resolved and reopened', async () => {
    const thread = await pin(reviewer, 'Deeper here?');
    expect(thread).toMatchObject({ pin: spot, version: 1, mine: true, author: { name: 'Reviewer' } });
    await reply(owner, thread.id, 'By how much?');
    expect(await openComments()).toBe(1);
    await change(owner, thread.id, { resolved: true });
    expect(await openComments()).toBe(0);
    expect(await threads()).toMatchObject([
      {
        text: 'Deeper here?',
        mine: false,
        resolvedBy: { name: 'Owner' },
        replies: [{ text: 'By how much?', mine: true }],
      },
    ]);
    await change(reviewer, thread.id, { resolved: false });
    expect(await threads()).toMatchObject([{ resolvedAt: null, resolvedBy: null }]);
  });

  it('are edited by their author alone', async () => {
    const thread = await pin(reviewer, 'First');
    expect((await change(owner, thread.id, { text: 'Changed by another' })).status).toBe(403);
    expect(await (await change(reviewer, thread.id, { text: 'Second' })).json()).toMatchObject({
      text: 'Second',
    });
    expect((await threads())[0]?.editedAt).not.toBeNull();
  });

  it('go with their replies when deleted; a reply goes alone', async () => {
    const thread = await pin(reviewer, 'First');
    const answer = await reply(owner, thread.id, 'Answer');
    await reply(owner, thread.id, 'Another');
    await call(owner, ENDPOINTS.deleteComment, { params: { projectId, commentId: answer.id } });
    expect((await threads())[0]?.replies.map(({ text }) => text)).toEqual(['Another']);
    await call(reviewer, ENDPOINTS.deleteComment, { params: { projectId, commentId: thread.id } });
    expect(await threads()).toEqual([]);
    const late = { params: { projectId, commentId: thread.id }, body: { text: 'Late' } };
    expect((await call(owner, ENDPOINTS.createReply, late)).status).toBe(404);
  });

  it('have replies of one level, which cannot be resolved', async () => {
    const thread = await pin(reviewer, 'First');
    const answer = await reply(owner, thread.id, 'Answer');
    const nested = { params: { projectId, commentId: answer.id }, body: { text: 'Nested' } };
    expect((await call(owner, ENDPOINTS.createReply, nested)).status).toBe(404);
    expect((await change(owner, answer.id, { resolved: true })).status).toBe(409);
  });

  it('of one project cannot be reached through another', async () => {
    const thread = await pin(owner, 'Mine');
    const other = await call(reviewer, ENDPOINTS.createProject, { body: { from: 'empty', name: 'Theirs' } });
    const { id } = (await other.json()) as Project;
    const params = { projectId: id, commentId: thread.id };
    expect((await call(reviewer, ENDPOINTS.changeComment, { params, body: { resolved: true } })).status).toBe(
      404,
    );
    expect((await call(reviewer, ENDPOINTS.createReply, { params, body: { text: 'x' } })).status).toBe(404);
  });
});

describe('members', () => {
  it('are added by the address of an account, once', async () => {
    const guest = await makeActor('Guest');
    const add = (email: string) =>
      call(owner, ENDPOINTS.addMember, { params: { projectId }, body: { email, role: 'editor' } });
    expect((await add(guest.email.toUpperCase())).status).toBe(201);
    expect((await add(guest.email)).status).toBe(409);
    expect((await add('nobody@example.test')).status).toBe(404);
    expect((await call(guest, ENDPOINTS.getProject, { params: { projectId } })).status).toBe(200);
  });

  it('show their addresses to the owner alone', async () => {
    const list = async (actor: Actor) =>
      ((await (await call(actor, ENDPOINTS.listMembers, { params: { projectId } })).json()) as ProjectMembers)
        .items;
    expect((await list(owner)).map(({ email }) => email)).toEqual([owner.email, reviewer.email]);
    expect((await list(reviewer)).map(({ email }) => email)).toEqual([null, null]);
  });

  it('may leave; from then on the project is not there for them', async () => {
    const params = { projectId, userId: reviewer.id };
    expect((await call(reviewer, ENDPOINTS.removeMember, { params })).status).toBe(204);
    expect((await call(reviewer, ENDPOINTS.getProject, { params: { projectId } })).status).toBe(404);
  });

  it('always have their owner, who cannot be changed or removed', async () => {
    const params = { projectId, userId: owner.id };
    expect((await call(owner, ENDPOINTS.removeMember, { params })).status).toBe(409);
    expect((await call(owner, ENDPOINTS.changeMember, { params, body: { role: 'reviewer' } })).status).toBe(
      409,
    );
  });
});

describe('revisions', () => {
  it('are numbered without gaps and doubles, also when made at the same time, and never change', async () => {
    const make = () =>
      call(owner, ENDPOINTS.createRevision, { params: { projectId }, body: { note: 'Fixed' } });
    const made = await Promise.all(Array.from({ length: 5 }, make));
    const items = (await Promise.all(made.map((response) => response.json()))) as RevisionItem[];
    expect(items.map(({ number }) => number).sort()).toEqual([1, 2, 3, 4, 5]);
    await call(owner, ENDPOINTS.changeProject, { params: { projectId }, body: { name: 'Renamed' } });
    const first = await call(owner, ENDPOINTS.getRevision, { params: { projectId, number: 1 } });
    expect(await first.json()).toMatchObject({ number: 1, note: 'Fixed', job: { name: 'Tray' } });
  });
});

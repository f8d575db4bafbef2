import { z } from 'zod';
import { face } from '@/lib/job/numbers';
import * as account from './account';
import * as comment from './comment';
import { anyJson, endpoint, type Access } from './endpoint';
import { health } from './health';
import { jobSaved, savedJob } from './job-document';
import * as member from './member';
import { recordId } from './moment';
import * as plan from './plan';
import * as project from './project';
import * as revision from './revision';
import type { ProjectPermission } from './roles';
import * as shop from './shop';

const PUBLIC = { kind: 'public' } as const satisfies Access;
const SIGNED_IN = { kind: 'signed-in' } as const satisfies Access;
const MANAGES_CUTTERS = { kind: 'shop', permission: 'shop.manage-cutters' } as const satisfies Access;
const inProject = (permission: ProjectPermission) => ({ kind: 'project', permission }) as const;

const projectParams = z.strictObject({ projectId: recordId });
const memberParams = projectParams.extend({ userId: recordId });
const commentParams = projectParams.extend({ commentId: recordId });
const revisionParams = projectParams.extend({ number: z.coerce.number().int().min(1).max(1_000_000_000) });
const programParams = projectParams.extend({ file: z.string().regex(/^[A-Za-z0-9._-]{1,120}$/) });
const pictureParams = projectParams.extend({ face });
/** Only there so that an address changes with the picture. */
const pictureQuery = z.strictObject({ v: z.string().max(80).optional() });

/** Job documents: 10 MB, far above any that people draw. */
const JOB_LIMIT = 10 * 1024 * 1024;

/** Every endpoint of the API but next-auth's own under `/api/auth`: the one list that routes, client and OpenAPI share. */
export const ENDPOINTS = {
  live: endpoint('GET', '/api/livez', PUBLIC, { summary: 'Whether the process runs', answer: health }),
  ready: endpoint('GET', '/api/readyz', PUBLIC, {
    summary: 'Whether the database answers, is migrated and keeps what it acknowledges',
    answer: health,
  }),
  openapi: endpoint('GET', '/api/openapi.json', PUBLIC, {
    summary: 'This description',
    answer: anyJson,
  }),
  jobJsonSchema: endpoint('GET', '/api/job-schema.json', PUBLIC, {
    summary: 'JSON Schema of the job document',
    answer: anyJson,
    mediaType: 'application/schema+json',
  }),

  signUp: endpoint('POST', '/api/sign-up', PUBLIC, {
    summary: 'Make an account, with a shop of its own; then sign in',
    body: account.signUpBody,
    answer: account.me,
    status: 201,
  }),
  me: endpoint('GET', '/api/me', SIGNED_IN, { summary: 'Who is signed in', answer: account.me }),
  changeAccount: endpoint('PATCH', '/api/account', SIGNED_IN, {
    summary: 'Change one’s name',
    body: account.changeAccountBody,
    answer: account.me,
  }),
  changePassword: endpoint('POST', '/api/account/password', SIGNED_IN, {
    summary: 'Change one’s password; ends every other session',
    body: account.changePasswordBody,
  }),
  listSessions: endpoint('GET', '/api/account/sessions', SIGNED_IN, {
    summary: 'Where one is signed in',
    answer: account.accountSessions,
  }),
  endSession: endpoint('DELETE', '/api/account/sessions/{sessionId}', SIGNED_IN, {
    summary: 'Sign out there',
    params: z.strictObject({ sessionId: recordId }),
  }),
  signOutEverywhere: endpoint('POST', '/api/account/sign-out-everywhere', SIGNED_IN, {
    summary: 'End every session, this one too',
  }),

  listProjects: endpoint('GET', '/api/projects', SIGNED_IN, {
    summary: 'Projects one is a member of, newest change first',
    query: project.projectListQuery,
    answer: project.projectPage,
  }),
  createProject: endpoint('POST', '/api/projects', SIGNED_IN, {
    summary: 'Make a project: empty, from an example, or from a job document',
    body: project.createProjectBody,
    answer: project.project,
    status: 201,
    bodyLimit: JOB_LIMIT,
  }),
  getProject: endpoint('GET', '/api/projects/{projectId}', inProject('project.read'), {
    summary: 'A project without its job document',
    params: projectParams,
    answer: project.project,
  }),
  changeProject: endpoint('PATCH', '/api/projects/{projectId}', inProject('project.edit'), {
    summary: 'Change a project’s name or state; a new name is a new version of the job document',
    params: projectParams,
    body: project.changeProjectBody,
    answer: project.project,
  }),
  deleteProject: endpoint('DELETE', '/api/projects/{projectId}', inProject('project.delete'), {
    summary: 'Delete a project',
    params: projectParams,
  }),
  duplicateProject: endpoint('POST', '/api/projects/{projectId}/duplicate', inProject('project.duplicate'), {
    summary: 'Copy the job document into a project of one’s own',
    params: projectParams,
    body: project.duplicateProjectBody,
    answer: project.project,
    status: 201,
  }),

  getJob: endpoint('GET', '/api/projects/{projectId}/job', inProject('project.read'), {
    summary: 'The job document; its version is the ETag',
    params: projectParams,
    answer: savedJob,
  }),
  saveJob: endpoint('PUT', '/api/projects/{projectId}/job', inProject('project.edit'), {
    summary:
      'Save the job document, which is the body. If-Match names the version it was made from: 428 without, 412 with the newer one in `current`, 422 with `problems` where the document is not valid',
    params: projectParams,
    body: anyJson,
    answer: jobSaved,
    bodyLimit: JOB_LIMIT,
  }),

  listMembers: endpoint('GET', '/api/projects/{projectId}/members', inProject('project.read'), {
    summary: 'Who is in the project',
    params: projectParams,
    answer: member.projectMembers,
  }),
  addMember: endpoint('POST', '/api/projects/{projectId}/members', inProject('project.manage-members'), {
    summary: 'Add somebody by the e-mail address of an account',
    params: projectParams,
    body: member.addMemberBody,
    answer: member.projectMember,
    status: 201,
  }),
  changeMember: endpoint(
    'PATCH',
    '/api/projects/{projectId}/members/{userId}',
    inProject('project.manage-members'),
    {
      summary: 'Change somebody’s role',
      params: memberParams,
      body: member.changeMemberBody,
      answer: member.projectMember,
    },
  ),
  removeMember: endpoint('DELETE', '/api/projects/{projectId}/members/{userId}', inProject('project.read'), {
    summary: 'Remove somebody (the owner), or leave (oneself)',
    params: memberParams,
  }),

  listComments: endpoint('GET', '/api/projects/{projectId}/comments', inProject('project.read'), {
    summary: 'Comment threads, oldest first',
    params: projectParams,
    answer: comment.commentThreads,
  }),
  createComment: endpoint('POST', '/api/projects/{projectId}/comments', inProject('project.comment'), {
    summary: 'Pin a comment to a spot on a face or to a cut',
    params: projectParams,
    body: comment.createCommentBody,
    answer: comment.commentThread,
    status: 201,
  }),
  changeComment: endpoint(
    'PATCH',
    '/api/projects/{projectId}/comments/{commentId}',
    inProject('project.comment'),
    {
      summary: 'Edit one’s own comment or reply; resolve or reopen a thread. Answers the whole thread',
      params: commentParams,
      body: comment.changeCommentBody,
      answer: comment.commentThread,
    },
  ),
  deleteComment: endpoint(
    'DELETE',
    '/api/projects/{projectId}/comments/{commentId}',
    inProject('project.comment'),
    { summary: 'Delete one’s own comment with its replies, or one’s own reply', params: commentParams },
  ),
  createReply: endpoint(
    'POST',
    '/api/projects/{projectId}/comments/{commentId}/replies',
    inProject('project.comment'),
    {
      summary: 'Reply to a comment',
      params: commentParams,
      body: comment.createReplyBody,
      answer: comment.commentReply,
      status: 201,
    },
  ),

  listRevisions: endpoint('GET', '/api/projects/{projectId}/revisions', inProject('project.read'), {
    summary: 'Fixed copies of the job document, newest first',
    params: projectParams,
    answer: revision.revisionList,
  }),
  createRevision: endpoint('POST', '/api/projects/{projectId}/revisions', inProject('project.fix-revision'), {
    summary: 'Fix the job document as it is saved now',
    params: projectParams,
    body: revision.createRevisionBody,
    answer: revision.revisionItem,
    status: 201,
  }),
  getRevision: endpoint('GET', '/api/projects/{projectId}/revisions/{number}', inProject('project.read'), {
    summary: 'A revision with its job document',
    params: revisionParams,
    answer: revision.revision,
  }),

  listPrograms: endpoint('GET', '/api/projects/{projectId}/programs', inProject('project.read'), {
    summary: 'The programs of the saved job document with findings',
    params: projectParams,
    answer: plan.programList,
  }),
  getProgram: endpoint('GET', '/api/projects/{projectId}/programs/{file}', inProject('project.download'), {
    summary: 'Download a program; 409 where findings block it',
    params: programParams,
    mediaType: 'text/plain',
  }),
  getArchive: endpoint('GET', '/api/projects/{projectId}/programs.zip', inProject('project.download'), {
    summary: 'Download all programs with the report; 409 where findings block them',
    params: projectParams,
    mediaType: 'application/zip',
  }),
  getReport: endpoint('GET', '/api/projects/{projectId}/report', inProject('project.read'), {
    summary: 'The plan report of the saved job document',
    params: projectParams,
    answer: plan.planReport,
  }),
  getPicture: endpoint('GET', '/api/projects/{projectId}/picture/{face}', inProject('project.read'), {
    summary: 'A small picture of a face',
    params: pictureParams,
    query: pictureQuery,
    mediaType: 'image/svg+xml',
  }),

  listShopCutters: endpoint('GET', '/api/shop/cutters', SIGNED_IN, {
    summary: 'Cutters of one’s shops',
    answer: shop.shopCutters,
  }),
  createShopCutter: endpoint('POST', '/api/shop/cutters', MANAGES_CUTTERS, {
    summary: 'Add a cutter to a shop’s list',
    body: shop.createShopCutterBody,
    answer: shop.shopCutter,
    status: 201,
  }),
  changeShopCutter: endpoint('PUT', '/api/shop/cutters/{cutterId}', MANAGES_CUTTERS, {
    summary: 'Change a cutter of a shop’s list',
    params: z.strictObject({ cutterId: recordId }),
    body: shop.changeShopCutterBody,
    answer: shop.shopCutter,
  }),
  deleteShopCutter: endpoint('DELETE', '/api/shop/cutters/{cutterId}', MANAGES_CUTTERS, {
    summary: 'Take a cutter off a shop’s list',
    params: z.strictObject({ cutterId: recordId }),
  }),
} as const;

export type EndpointName = keyof typeof ENDPOINTS;

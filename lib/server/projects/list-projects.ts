import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { z } from 'zod';
import type { ProjectPage, projectListQuery } from '@/lib/contracts/project';
import { ProjectMember } from '@/entities/project-member.entity';
import type { Principal } from '../auth/principal';
import { invalid } from '../http/check-input';
import { openCommentCounts, projectItem } from './project-answer';

/** One page of the projects that `principal` is a member of, newest change first. */
export async function listProjects(
  em: EntityManager,
  principal: Principal,
  { search, state, cursor, limit }: z.output<typeof projectListQuery>,
): Promise<ProjectPage> {
  const members = await em.find(
    ProjectMember,
    {
      user: principal.userId,
      project: {
        deletedAt: null,
        ...(state && { state }),
        $and: [...nameHas(search), ...(cursor ? [after(readCursor(cursor))] : [])],
      },
    },
    {
      populate: ['project', 'project.owner'],
      orderBy: { project: { updatedAt: 'desc', id: 'desc' } },
      limit: limit + 1,
    },
  );
  const page = members.slice(0, limit);
  const counts = await openCommentCounts(
    em,
    page.map(({ project }) => project.id),
  );
  const items = page.map(({ project, role }) =>
    projectItem(project.getEntity(), role, counts.get(project.id) ?? 0),
  );
  const last = page.at(-1)?.project.getEntity();
  return { items, nextCursor: members.length > limit && last ? writeCursor(last) : null };
}

function nameHas(search: string) {
  const words = search.split(/\s+/).filter((word) => word !== '');
  return words.map((word) => ({ name: { $ilike: `%${word.replace(/[\\%_]/g, '\\$&')}%` } }));
}

interface Place {
  readonly updatedAt: Date;
  readonly id: string;
}

function after({ updatedAt, id }: Place) {
  return { $or: [{ updatedAt: { $lt: updatedAt } }, { updatedAt, id: { $lt: id } }] };
}

/** The place of the last project shown: unlike an offset it stays right while others are saved. */
function writeCursor({ updatedAt, id }: Place): string {
  return Buffer.from(`${updatedAt.getTime()}.${id}`).toString('base64url');
}

function readCursor(cursor: string): Place {
  const match = /^(\d{1,15})\.([0-9a-f-]{36})$/.exec(Buffer.from(cursor, 'base64url').toString());
  if (!match?.[1] || !match[2]) throw invalid([{ path: 'cursor', message: 'is not one that a list gave' }]);
  return { updatedAt: new Date(Number(match[1])), id: match[2] };
}

import { createHash } from 'node:crypto';
import {
  type EntityManager,
  type EntityName,
  MikroORM,
  type RequiredEntityData,
} from '@mikro-orm/postgresql';
import { Comment } from '@/entities/comment.entity';
import { Membership } from '@/entities/membership.entity';
import { Project } from '@/entities/project.entity';
import { ProjectMember } from '@/entities/project-member.entity';
import { Revision } from '@/entities/revision.entity';
import { Shop } from '@/entities/shop.entity';
import { ShopCutter } from '@/entities/shop-cutter.entity';
import { User } from '@/entities/user.entity';
import { hashPassword, passwordMatches } from '@/lib/server/auth/password';
import { exampleJob } from '@/lib/server/projects/example-jobs';
import { jobColumns } from '@/lib/server/projects/job-columns';
import { STARTER_CUTTERS } from '@/lib/server/shop/starter-cutters';
import { ormOptions } from '@/mikro-orm.config';
import {
  DEMO_PEOPLE,
  DEMO_PROJECTS,
  DEMO_SHOP,
  type DemoComment,
  type DemoPersonId,
  type DemoProject,
} from './demo/demo-scenario';

const DEFAULT_PASSWORD = 'quayside-board-27';
const HOUR = 3_600_000;

/**
 * Puts the demo scenario into the database named by DATABASE_URL. Ids are made from names and what is there is left as
 * it is, so it can run at every start without undoing anybody's work; only the demo passwords follow DEMO_PASSWORD.
 */
async function seed(): Promise<void> {
  const url = process.env.DATABASE_URL;
  if (!url) {
    console.error('DATABASE_URL must name the database, as in postgresql://user@127.0.0.1:5432/spindleaf');
    process.exit(1);
  }
  const password = process.env.DEMO_PASSWORD ?? DEFAULT_PASSWORD;
  const orm = await MikroORM.init(ormOptions(url));
  try {
    await orm.em.fork().transactional(async (em) => {
      await seedPeople(em, password);
      await seedShop(em);
      for (const project of DEMO_PROJECTS) await seedProject(em, project, new Date());
    });
  } finally {
    await orm.close();
  }
  console.log(`Demo accounts, all with the password ${password}`);
  for (const { email, name, role } of Object.values(DEMO_PEOPLE))
    console.log(`  ${email}  (${name}, ${role})`);
}

async function seedPeople(em: EntityManager, password: string): Promise<void> {
  for (const [id, { name, email }] of Object.entries(DEMO_PEOPLE)) {
    const person = await em.findOne(User, { email }, { populate: ['passwordHash'] });
    if (person && (await passwordMatches(person.passwordHash, password))) continue;
    const passwordHash = await hashPassword(password);
    if (person) await em.nativeUpdate(User, { id: person.id }, { passwordHash });
    else
      await addMissing(em, User, [
        { id: demoId('user', id), name, email, passwordHash, createdAt: new Date() },
      ]);
  }
}

async function seedShop(em: EntityManager): Promise<void> {
  const shop = demoId('shop');
  const now = new Date();
  await addMissing(em, Shop, [{ id: shop, name: DEMO_SHOP, createdAt: now }]);
  await addMissing(
    em,
    Membership,
    Object.entries(DEMO_PEOPLE).map(([id, { role }]) => ({
      shop,
      user: demoId('user', id),
      role,
      addedAt: now,
    })),
  );
  await addMissing(
    em,
    ShopCutter,
    STARTER_CUTTERS.map((cutter) => ({
      id: demoId('cutter', cutter.id),
      shop,
      number: cutter.number,
      cutter,
    })),
  );
}

async function seedProject(em: EntityManager, demo: DemoProject, now: Date): Promise<void> {
  const id = demoId('project', demo.example);
  if ((await em.count(Project, { id })) > 0) return;
  const changed = new Date(now.getTime() - demo.hoursAgo * HOUR);
  const owner = demoId('user', demo.owner);
  const columns = jobColumns(exampleJob(demo.example));
  await addMissing(em, Project, [
    {
      id,
      ...columns,
      state: demo.state,
      owner,
      shop: demoId('shop'),
      version: 1,
      savedAt: changed,
      savedBy: owner,
      createdAt: changed,
      updatedAt: changed,
    },
  ]);
  const members = Object.entries({ [demo.owner]: 'owner' as const, ...demo.members });
  await addMissing(
    em,
    ProjectMember,
    members.map(([person, role]) => ({ project: id, user: demoId('user', person), role, addedAt: changed })),
  );
  if (demo.revision !== undefined) {
    const { job, jobHash } = columns;
    const fixed = { id: demoId('revision', id), number: 1, note: demo.revision, job, jobHash };
    await addMissing(em, Revision, [{ ...fixed, project: id, author: owner, createdAt: changed }]);
  }
  for (const [index, comment] of demo.comments.entries()) {
    await seedComment(em, id, demoId('comment', id, String(index)), comment, changed);
  }
}

async function seedComment(
  em: EntityManager,
  project: string,
  id: string,
  { author, pin, text, replies = [], resolvedBy }: DemoComment,
  from: Date,
): Promise<void> {
  const at = (minutes: number) => new Date(from.getTime() + minutes * 60_000);
  const by = (person: DemoPersonId) => ({ project, author: demoId('user', person), jobVersion: 1 });
  const resolved = resolvedBy ? { resolvedAt: at(40), resolvedBy: demoId('user', resolvedBy) } : {};
  await addMissing(em, Comment, [{ id, ...by(author), pin, text, createdAt: at(10), ...resolved }]);
  for (const [index, reply] of replies.entries()) {
    const replyId = demoId('reply', id, String(index));
    await addMissing(em, Comment, [
      { id: replyId, ...by(reply.author), thread: id, text: reply.text, createdAt: at(20 + index) },
    ]);
  }
}

/** Inserts rows and leaves those that are there, in whatever way they clash. */
async function addMissing<T extends object>(
  em: EntityManager,
  entity: EntityName<T>,
  rows: RequiredEntityData<T>[],
): Promise<void> {
  await em.createQueryBuilder(entity).insert(rows).onConflict().ignore().execute();
}

/** The same UUID for the same names at every seed: a hash with the marks of version 8, "custom" (RFC 9562). */
function demoId(...names: string[]): string {
  const hex = createHash('sha256')
    .update(`spindleaf demo/${names.join('/')}`)
    .digest('hex');
  const variant = ((parseInt(hex.charAt(16), 16) & 3) | 8).toString(16);
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    `8${hex.slice(13, 16)}`,
    variant + hex.slice(17, 20),
    hex.slice(20, 32),
  ].join('-');
}

await seed();

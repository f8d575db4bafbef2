import 'server-only';
import { randomUUID } from 'node:crypto';
import { type EntityManager, UniqueConstraintViolationException } from '@mikro-orm/postgresql';
import type { ChangePasswordBody, Me, SignUpBody } from '@/lib/contracts/account';
import { Membership } from '@/entities/membership.entity';
import { Shop } from '@/entities/shop.entity';
import { User } from '@/entities/user.entity';
import { ApiError, notFound } from '../http/api-error';
import { addStarterCutters } from '../shop/starter-cutters';
import { hashPassword, passwordMatches } from './password';
import type { Principal } from './principal';
import { endSessions } from './sessions';
import { clearFailures, recordFailure, secondsToWait } from './sign-in-throttle';

/** Makes an account with a shop of its own, so that its first project has cutters to choose from. */
export async function signUp(em: EntityManager, { email, name, password }: SignUpBody): Promise<Me> {
  const passwordHash = await hashPassword(password);
  const userId = randomUUID();
  const shopId = randomUUID();
  const now = new Date();
  try {
    await em.transactional(async (tx) => {
      await tx.insert(User, { id: userId, email, name, passwordHash, createdAt: now });
      await tx.insert(Shop, { id: shopId, name: `${name}’s shop`.slice(0, 80), createdAt: now });
      await tx.insert(Membership, { shop: shopId, user: userId, role: 'steward', addedAt: now });
      await addStarterCutters(tx, shopId);
    });
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    throw new ApiError('email-taken', 'There is an account with this address already; sign in instead.');
  }
  return readMe(em, userId);
}

/** The account with its shops. */
export async function readMe(em: EntityManager, userId: string): Promise<Me> {
  const user = await em.findOne(User, { id: userId });
  if (!user) throw notFound('The account');
  const memberships = await em.find(
    Membership,
    { user: userId },
    { populate: ['shop'], orderBy: { addedAt: 'asc', shop: { id: 'asc' } } },
  );
  return {
    id: user.id,
    email: user.email,
    name: user.name,
    createdAt: user.createdAt.toISOString(),
    shops: memberships.map(({ shop, role }) => ({
      id: shop.getEntity().id,
      name: shop.getEntity().name,
      role,
    })),
  };
}

export async function changeName(em: EntityManager, { userId }: Principal, name: string): Promise<Me> {
  await em.nativeUpdate(User, { id: userId }, { name });
  return readMe(em, userId);
}

/**
 * Changes the password and ends every other session, in one transaction. Wrong present passwords count like wrong
 * sign-ins of a device of its own, or an open session would be a way to guess without limit.
 */
export async function changePassword(
  em: EntityManager,
  { userId, sessionId, email }: Principal,
  { current, next }: ChangePasswordBody,
): Promise<void> {
  const source = { device: sessionId, address: 'session' };
  const retryAfter = await secondsToWait(em, email, source);
  if (retryAfter > 0) {
    const minutes = Math.ceil(retryAfter / 60);
    throw new ApiError('too-many-requests', `Too many wrong passwords; try again in ${minutes} minutes.`, {
      retryAfter,
    });
  }
  const user = await em.findOneOrFail(User, { id: userId }, { populate: ['passwordHash'] });
  if (!(await passwordMatches(user.passwordHash, current))) {
    await recordFailure(em, email, source);
    throw new ApiError('wrong-password', 'That is not your present password.');
  }
  await clearFailures(em, email, source);
  const passwordHash = await hashPassword(next);
  await em.transactional(async (tx) => {
    await tx.nativeUpdate(User, { id: userId }, { passwordHash });
    await endSessions(tx, userId, sessionId);
  });
}

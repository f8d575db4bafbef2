import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { SignInFields } from '@/lib/contracts/account';
import { User } from '@/entities/user.entity';
import { passwordMatches } from './password';
import type { Principal } from './principal';
import { openSession } from './sessions';
import { clearFailures, recordFailure, secondsToWait, type SignInSource } from './sign-in-throttle';

export type SignInOutcome =
  | { readonly kind: 'signed-in'; readonly principal: Principal }
  | { readonly kind: 'wrong' }
  | { readonly kind: 'wait'; readonly seconds: number };

/** Checks a password and opens a session. Unknown accounts and wrong passwords answer alike and take as long. */
export async function signIn(
  em: EntityManager,
  { email, password }: SignInFields,
  source: SignInSource & { readonly browser: string },
): Promise<SignInOutcome> {
  const seconds = await secondsToWait(em, email, source);
  if (seconds > 0) return { kind: 'wait', seconds };
  const user = await em.findOne(User, { email }, { populate: ['passwordHash'] });
  if (!(await passwordMatches(user?.passwordHash ?? null, password)) || !user) {
    await recordFailure(em, email, source);
    return { kind: 'wrong' };
  }
  await clearFailures(em, email, source);
  const sessionId = await openSession(em, user.id, source.browser);
  return { kind: 'signed-in', principal: { userId: user.id, sessionId, name: user.name, email } };
}

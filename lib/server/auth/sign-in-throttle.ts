import 'server-only';
import { createHash, randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { SignInFailure } from '@/entities/sign-in-failure.entity';

/** Where a try comes from. `device`: this browser has signed in to this very account before; else null. */
export interface SignInSource {
  readonly device: string | null;
  readonly address: string;
}

const WINDOW_SECONDS = 15 * 60;
const PER_ACCOUNT = 10;
const PER_ADDRESS = 100;

/**
 * Seconds to wait before a try on `email` from `source` is looked at, or 0. Failures from unknown browsers are counted
 * together for the account, those of a known browser for itself alone: so whoever guesses at an account shuts out the
 * unknown, but never the owner's own devices (OWASP, "device cookies").
 */
export async function secondsToWait(em: EntityManager, email: string, source: SignInSource): Promise<number> {
  const account = fingerprint(email);
  const [byAccount, byAddress] = await Promise.all([
    waitFor(em, { account, device: source.device }, PER_ACCOUNT),
    source.device === null ? waitFor(em, { address: fingerprint(source.address) }, PER_ADDRESS) : 0,
  ]);
  return Math.max(byAccount, byAddress);
}

/** Counts a wrong password, and drops failures that no longer count for anybody. */
export async function recordFailure(em: EntityManager, email: string, source: SignInSource): Promise<void> {
  await em.insert(SignInFailure, {
    id: randomUUID(),
    account: fingerprint(email),
    device: source.device,
    address: fingerprint(source.address),
    at: new Date(),
  });
  await em.nativeDelete(SignInFailure, { at: { $lt: windowStart() } });
}

/** A right password clears what was counted against that source. */
export async function clearFailures(em: EntityManager, email: string, source: SignInSource): Promise<void> {
  await em.nativeDelete(SignInFailure, { account: fingerprint(email), device: source.device });
}

/** Until the `most`-th last failure leaves the window. */
async function waitFor(
  em: EntityManager,
  where: { account?: string; device?: string | null; address?: string },
  most: number,
): Promise<number> {
  const [nth] = await em.find(
    SignInFailure,
    { ...where, at: { $gt: windowStart() } },
    { orderBy: { at: 'desc' }, offset: most - 1, limit: 1 },
  );
  if (!nth) return 0;
  return Math.max(1, Math.ceil((nth.at.getTime() - windowStart().getTime()) / 1000));
}

function windowStart(): Date {
  return new Date(Date.now() - WINDOW_SECONDS * 1000);
}

/** Addresses are kept as hashes: enough to count by, nothing to read. */
function fingerprint(text: string): string {
  return createHash('sha256').update(text).digest('hex');
}

import { hash, verify } from '@node-rs/argon2';

/** argon2id (the package's default) with 46 MiB and one pass, one of the settings that OWASP's password storage sheet names as equal. */
const SETTINGS = { memoryCost: 47_104, timeCost: 1, parallelism: 1 };

/** Hashes run at most this many at once: each takes 46 MiB and a core. */
const MOST_AT_ONCE = 4;

/** The password as it is stored: argon2id with its salt and settings. */
export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password, SETTINGS));
}

/**
 * Whether `password` made `stored`. With `stored` null (there is no such account) the same work is done, so that the
 * time does not tell who has an account.
 */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  const against = stored ?? (await (nobody ??= hashPassword('nobody has this password')));
  const same = await inTurn(() => verify(against, password));
  return same && stored !== null;
}

let nobody: Promise<string> | undefined;
let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= MOST_AT_ONCE) await new Promise<void>((resolve) => waiting.push(resolve));
  else running++;
  try {
    return await work();
  } finally {
    // The place is handed on rather than freed, so nobody can slip in between.
    const next = waiting.shift();
    if (next) next();
    else running--;
  }
}

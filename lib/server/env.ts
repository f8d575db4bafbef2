import 'server-only';
import { z } from 'zod';

const schema = z.object({
  DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, 'must be a postgresql:// address'),
  /** Signs session cookies; the start script makes one and keeps it. */
  NEXTAUTH_SECRET: z.string().min(32, 'must have at least 32 characters'),
  /** The address that people type, scheme and host only. */
  NEXTAUTH_URL: z.url().optional(),
});

export interface ServerEnv {
  readonly databaseUrl: string;
  readonly secret: string;
  /** `https://shop.example`, or null where none is set: then only loopback is served. */
  readonly origin: string | null;
}

/** The server's settings, read anew at each call, as tests change them. Throws one line for each that is missing or wrong. */
export function serverEnv(source: NodeJS.ProcessEnv = process.env): ServerEnv {
  const parsed = schema.safeParse(source);
  if (!parsed.success) {
    const lines = parsed.error.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);
    throw new Error(`The server cannot start.\n${lines.join('\n')}`);
  }
  const { DATABASE_URL, NEXTAUTH_SECRET, NEXTAUTH_URL } = parsed.data;
  return {
    databaseUrl: DATABASE_URL,
    secret: NEXTAUTH_SECRET,
    origin: NEXTAUTH_URL ? new URL(NEXTAUTH_URL).origin : null,
  };
}

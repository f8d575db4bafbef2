import { z } from 'zod';
import { moment, recordId } from './moment';
import { shopRole } from './roles';

/** Compared and stored in lower case. */
export const email = z
  .string()
  .trim()
  .max(254, 'must have at most 254 characters')
  .pipe(z.email('must be an e-mail address, as in name@example.org'))
  .transform((text) => text.toLowerCase());

/** One line that people know somebody or something by. */
export const plainName = z
  .string()
  .trim()
  .min(1, 'must not be empty')
  .max(80, 'must have at most 80 characters')
  .regex(/^[^\u0000-\u001f\u007f]*$/, 'must be one line without control characters');

/** Length is what makes a password strong; the upper limit keeps hashing cheap to refuse. */
export const newPassword = z
  .string()
  .min(12, 'must have at least 12 characters')
  .max(200, 'must have at most 200 characters');

const presentPassword = z.string().min(1, 'must not be empty').max(200);

export const signUpBody = z.strictObject({ email, name: plainName, password: newPassword });
export type SignUpBody = z.infer<typeof signUpBody>;

/** What the sign-in form sends to next-auth's `credentials` provider. */
export const signInFields = z.object({ email, password: presentPassword });
export type SignInFields = z.infer<typeof signInFields>;

export const myShop = z.object({ id: recordId, name: z.string(), role: shopRole });
export type MyShop = z.infer<typeof myShop>;

/** Who is signed in. */
export const me = z.object({
  id: recordId,
  email: z.string(),
  name: z.string(),
  createdAt: moment,
  shops: z.array(myShop),
});
export type Me = z.infer<typeof me>;

export const changeAccountBody = z.strictObject({ name: plainName });
export type ChangeAccountBody = z.infer<typeof changeAccountBody>;

/** Ends every session but the one that asks. */
export const changePasswordBody = z.strictObject({ current: presentPassword, next: newPassword });
export type ChangePasswordBody = z.infer<typeof changePasswordBody>;

/** One device on which the account is signed in. */
export const accountSession = z.object({
  id: recordId,
  /** What its browser says of itself, shortened. */
  device: z.string(),
  createdAt: moment,
  lastSeenAt: moment,
  expiresAt: moment,
  /** Whether it is the one that asks. */
  current: z.boolean(),
});
export type AccountSession = z.infer<typeof accountSession>;

export const accountSessions = z.object({ items: z.array(accountSession) });
export type AccountSessions = z.infer<typeof accountSessions>;

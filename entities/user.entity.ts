import { defineEntity, type InferEntity, p } from '@mikro-orm/core';

export const User = defineEntity({
  name: 'User',
  tableName: 'users',
  properties: {
    id: p.uuid().primary(),
    /** In lower case. */
    email: p.string().length(254).unique('users_email_unique'),
    name: p.string().length(80),
    /** argon2id in its own encoded form; read only where a password is checked. */
    passwordHash: p.text().hidden().lazy(true, false),
    createdAt: p.datetime(3),
  },
});
export type User = InferEntity<typeof User>;

import { defineEntity, type InferEntity, p } from '@mikro-orm/core';
import { User } from './user.entity';

/** One signed-in device. The cookie only names it; whether it still holds is decided here, at each request. */
export const Session = defineEntity({
  name: 'Session',
  tableName: 'sessions',
  indexes: [{ name: 'sessions_user_index', properties: ['user', 'lastSeenAt'] }],
  properties: {
    id: p.uuid().primary(),
    user: () => p.manyToOne(User).ref().deleteRule('cascade'),
    device: p.string().length(200),
    createdAt: p.datetime(3),
    lastSeenAt: p.datetime(3),
    expiresAt: p.datetime(3),
    revokedAt: p.datetime(3).nullable(),
  },
});
export type Session = InferEntity<typeof Session>;

import { describe, expect, it } from 'vitest';
import { database, entityManager } from '@/lib/server/database';
import { checkReady } from '@/lib/server/readiness';
import { pointAtTestDatabase } from './test-database';

pointAtTestDatabase();

describe('the migrated database', () => {
  it('is what the entities describe', async () => {
    const orm = await database();
    const difference = await orm.schema.getUpdateSchemaSQL({ wrap: false });
    expect(difference.trim()).toBe('');
  });

  it('is ready, and keeps what it acknowledges', async () => {
    expect(await checkReady(await entityManager())).toEqual({ status: 'ok' });
  });

  it('is not ready while a setting could lose acknowledged saves', async () => {
    const em = await entityManager();
    await em.transactional(async (tx) => {
      await tx.execute('set local synchronous_commit = off');
      await expect(checkReady(tx)).rejects.toMatchObject({ code: 'not-ready' });
    });
  });
});

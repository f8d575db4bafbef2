import { Migrator } from '@mikro-orm/migrations';
import { defineConfig, type Options } from '@mikro-orm/postgresql';
import { ALL_ENTITIES } from '@/entities/all-entities';
import { ALL_MIGRATIONS } from '@/migrations/all-migrations';

/** How the database named by `clientUrl` is reached. The schema comes from the migrations alone, never from a sync. */
export function ormOptions(clientUrl: string): Options {
  return defineConfig({
    clientUrl,
    entities: ALL_ENTITIES,
    extensions: [Migrator],
    migrations: {
      tableName: 'schema_migrations',
      migrationsList: ALL_MIGRATIONS,
      path: 'migrations',
      allOrNothing: true,
      snapshot: false,
    },
    pool: { min: 0, max: 10 },
    driverOptions: {
      connection: { connectionTimeoutMillis: 5_000, application_name: 'spindleaf' },
    },
    forceUtcTimezone: true,
    discovery: { checkDuplicateTableNames: true },
  });
}

/** For MikroORM's own command line. */
export default ormOptions(process.env.DATABASE_URL ?? 'postgresql://127.0.0.1:5432/spindleaf');

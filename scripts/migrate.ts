import { MikroORM } from '@mikro-orm/postgresql';
import { ormOptions } from '@/mikro-orm.config';

/** Brings the database named by DATABASE_URL to the newest schema. Runs what is missing, in order, or nothing at all. */
async function migrate(): Promise<void> {
  const url = process.env.DATABASE_URL;
  if (!url) {
    console.error('DATABASE_URL must name the database, as in postgresql://user@127.0.0.1:5432/spindleaf');
    process.exit(1);
  }
  const orm = await MikroORM.init(ormOptions(url));
  try {
    const done = await orm.migrator.up();
    for (const { name } of done) console.log(`Migrated: ${name}`);
  } finally {
    await orm.close();
  }
}

await migrate();

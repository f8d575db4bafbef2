import type { MigrationObject } from '@mikro-orm/core';
import { FirstTables } from './0001-first-tables';

/** Every migration in its order, listed by hand; once released, none is edited. */
export const ALL_MIGRATIONS: MigrationObject[] = [{ name: '0001-first-tables', class: FirstTables }];

import { sql } from 'drizzle-orm';
import { check, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** What the hub knows of itself: exactly one row. */
export const hub = sqliteTable(
  'hub',
  {
    row: integer('row').primaryKey(),
    /** A random UUID given at the first start; devices tell hubs apart by it. */
    id: text('id').notNull().unique(),
    /** Version of the application that made the database. */
    createdVersion: text('created_version').notNull(),
    /** For display only, ISO 8601 in UTC; nothing is ordered by wall clocks. */
    createdAt: text('created_at').notNull(),
  },
  (table) => [check('hub_one_row', sql`${table.row} = 1`)],
);

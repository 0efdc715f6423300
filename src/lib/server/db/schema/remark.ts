import { index, sqliteTable, text, type AnySQLiteColumn } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { link } from './link';
import { person } from './person';
import { report } from './report';

/** Something said about a section of a report, or an answer to it. */
export const remark = sqliteTable(
  'remark',
  {
    id: id(),
    reportId: text('report_id')
      .notNull()
      .references(() => report.id, { onDelete: 'cascade' }),
    /** Section of the report: answer, counts, law, rate, tails, cumulants, flags, method … */
    section: text('section').notNull(),
    /** First remark of the thread; null for the first itself. */
    threadId: text('thread_id').references((): AnySQLiteColumn => remark.id, { onDelete: 'cascade' }),
    body: text('body').notNull(),
    /** Link it came through, when it came from outside. */
    linkId: text('link_id').references(() => link.id, { onDelete: 'set null' }),
    personId: text('person_id').references(() => person.id, { onDelete: 'set null' }),
    /** As signed: kept when the person is gone. */
    signedAs: text('signed_as').notNull(),
    createdAt: createdAt(),
    /** Only on the first of a thread: settled, by whom. */
    settledAt: time('settled_at'),
    settledBy: text('settled_by').references(() => person.id, { onDelete: 'set null' })
  },
  (table) => [index('remark_by_report').on(table.reportId, table.createdAt)]
);

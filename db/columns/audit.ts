import { integer, text, timestamp, uuid } from "drizzle-orm/pg-core";

/** A UTC instant, to the millisecond. */
export const instant = () => timestamp({ withTimezone: true, mode: "date", precision: 3 });

/** Carried by every table that people write. `version` is the optimistic lock: a stale save is refused. */
export const audit = () => ({
  createdAt: instant().notNull().defaultNow(),
  createdBy: uuid(),
  updatedAt: instant().notNull().defaultNow(),
  updatedBy: uuid(),
  version: integer().notNull().default(1),
});

/** A wrong record is struck through with a reason; it stays in history and export. */
export const strike = () => ({
  struckAt: instant(),
  struckBy: uuid(),
  struckReason: text(),
});

/**
 * Digest of the content a create was sent with. The same id sent again with the same digest is a replay
 * and gets the first answer; with another digest it is a conflict. Null for seeded or imported rows.
 */
export const sentDigest = () => ({ digest: text() });

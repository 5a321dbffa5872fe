import type { boltTypes } from "@/db/schema";

/** A type of the catalogue before it has an id. */
export type BoltType = Omit<typeof boltTypes.$inferInsert, "id">;

import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import type { Handle, Tx } from "@/db/client";
import { adhesives, bolts, boltTypes, placements, pullTests } from "@/db/schema";

export type BoltRow = typeof bolts.$inferSelect;
export type NewBolt = typeof bolts.$inferInsert;
export type BoltTypeRow = typeof boltTypes.$inferSelect;
export type AdhesiveRow = typeof adhesives.$inferSelect;

interface By {
  userId: string;
  now: Date;
}

/** A bolt with the anchor and placement it stands in. */
export async function findBolt(db: Handle, id: string) {
  const [row] = await db
    .select({ bolt: bolts, anchorId: placements.anchorId, placementNumber: placements.number })
    .from(bolts)
    .innerJoin(placements, eq(placements.id, bolts.placementId))
    .where(eq(bolts.id, id));
  return row ?? null;
}

export async function findBoltInForce(db: Handle, placementId: string): Promise<BoltRow | null> {
  const [row] = await db
    .select()
    .from(bolts)
    .where(and(eq(bolts.placementId, placementId), isNull(bolts.removedOn), isNull(bolts.struckAt)));
  return row ?? null;
}

export async function findBoltType(db: Handle, id: string): Promise<BoltTypeRow | null> {
  const [row] = await db.select().from(boltTypes).where(eq(boltTypes.id, id));
  return row ?? null;
}

export async function findAdhesive(db: Handle, id: string): Promise<AdhesiveRow | null> {
  const [row] = await db.select().from(adhesives).where(eq(adhesives.id, id));
  return row ?? null;
}

/** @returns false when the id is taken or another bolt is in force in the hole. */
export async function insertBolt(tx: Tx, row: NewBolt): Promise<boolean> {
  const rows = await tx.insert(bolts).values(row).onConflictDoNothing().returning({ id: bolts.id });
  return rows.length === 1;
}

/** Saves a person's change: raises the version. */
export async function updateBoltRow(tx: Tx, id: string, change: Partial<NewBolt>, by: By): Promise<void> {
  await tx
    .update(bolts)
    .set({ ...change, updatedAt: by.now, updatedBy: by.userId, version: sql`${bolts.version} + 1` })
    .where(eq(bolts.id, id));
}

/** What was last seen on it, from a report: raises no version, nobody edited the record. */
export async function setRustGrade(tx: Tx, id: string, rustGrade: number): Promise<void> {
  await tx.update(bolts).set({ rustGrade }).where(eq(bolts.id, id));
}

export async function findPullTestDigest(db: Handle, id: string) {
  const [row] = await db.select({ digest: pullTests.digest }).from(pullTests).where(eq(pullTests.id, id));
  return row ?? null;
}

export async function insertPullTest(tx: Tx, row: typeof pullTests.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(pullTests).values(row).onConflictDoNothing().returning({ id: pullTests.id });
  return rows.length === 1;
}

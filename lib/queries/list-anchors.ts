import "server-only";
import { getDb } from "@/db/client";
import { type AnchorFilter, countAnchors, listAnchorRows } from "@/db/repositories/anchor-list";
import { audience } from "@/lib/policy/audience";
import { summaryView } from "@/lib/queries/anchor-view";
import { readCursor, writeCursor } from "@/lib/queries/cursor";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";
import type { Actor } from "@/lib/shared/actor";

export interface AnchorPage {
  items: AnchorSummary[];
  next: string | null;
  /** How many fit in all. */
  total: number;
}

/** A page of anchors, narrowed to what the actor may know. @throws AppError on a foreign cursor. */
export async function listAnchors(
  actor: Actor,
  filter: AnchorFilter,
  { limit, cursor }: { limit: number; cursor: string | undefined },
): Promise<AnchorPage> {
  const db = getDb();
  const who = audience(actor);
  const [rows, total] = await Promise.all([
    listAnchorRows(db, who, filter, {
      limit: limit + 1,
      after: cursor === undefined ? null : readCursor(cursor),
    }),
    countAnchors(db, who, filter),
  ]);
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return {
    items: shown.map((row) => summaryView(row, actor)),
    next: rows.length > limit && last ? writeCursor({ code: last.code, distanceM: last.distanceM }) : null,
    total,
  };
}

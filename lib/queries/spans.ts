import "server-only";
import { getDb } from "@/db/client";
import { listClosureRows } from "@/db/repositories/area-read";
import { listSpanRows, type SpanRow } from "@/db/repositories/span-read";
import { audience } from "@/lib/policy/audience";
import { closureViewOf } from "@/lib/queries/anchor-view";
import type { ClosureView } from "@/lib/schemas/views/anchor";
import type { SpanView } from "@/lib/schemas/views/register";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** The spans whose two ends the actor may see exactly. */
export async function listSpans(actor: Actor, areaSlug?: string): Promise<SpanView[]> {
  const rows = await listSpanRows(getDb(), audience(actor), areaSlug === undefined ? {} : { areaSlug });
  return rows.map((row) => spanOf(row, []));
}

/** One span with the closures at both ends. @throws AppError `not_found` when absent or hidden. */
export async function getSpan(actor: Actor, id: string): Promise<SpanView> {
  const db = getDb();
  const [row] = await listSpanRows(db, audience(actor), { id });
  if (!row) throw new AppError("not_found", "There is no such span, or it is not shown to you.");
  const found = await Promise.all(
    [row.a, row.b].map((end) =>
      listClosureRows(db, { areaId: end.areaId, siteId: end.siteId, anchorId: end.id }),
    ),
  );
  const closures = new Map(found.flat().map((closure) => [closure.closure.id, closureViewOf(closure)]));
  return spanOf(row, [...closures.values()]);
}

function spanOf(row: SpanRow, closures: ClosureView[]): SpanView {
  const { id, version, areaSlug, name, lengthM, bearingDeg, note, rig, a, b } = row;
  return {
    id,
    version,
    areaSlug,
    name,
    exact: true,
    lengthM,
    bearingDeg,
    heightDifferenceM: a.elevationM === null || b.elevationM === null ? null : b.elevationM - a.elevationM,
    note,
    a: endOf(a),
    b: endOf(b),
    rig,
    closures,
  };
}

function endOf({ id, code, label, siteName, condition, verdict }: SpanRow["a"]) {
  return { id, code, label, siteName, condition, verdict };
}

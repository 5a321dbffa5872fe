import "server-only";
import type { Tx } from "@/db/client";
import { type BoltRow, findAdhesive, findBolt, findBoltType, updateBoltRow } from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import type { CommandContext } from "@/lib/commands/context";
import { dayAt } from "@/lib/commands/evaluation/evaluate-anchors";
import { glueUsableFrom } from "@/lib/commands/install/glue-time";
import { onAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { invalid, invalidField, notFound, refuseStale } from "@/lib/commands/writing/refusals";
import { before, by } from "@/lib/commands/writing/stamp";
import { installProblems, isSetWithGlue } from "@/lib/domain/bolt/draft-install";
import type { BoltChange } from "@/lib/schemas/bolt";

/** Corrects the record of a bolt. What hardware stands in the rock changes only by logging an install. */
export async function updateBolt(
  ctx: CommandContext,
  { id, version, change }: { id: string; version: number; change: BoltChange },
): Promise<{ id: string; version: number }> {
  const known = await findBolt(ctx.db, id);
  return onAnchor(ctx, known?.anchorId ?? null, "bolt.edit", async ({ tx, anchor, person }) => {
    const stored = await findBolt(tx, id);
    if (!stored || stored.bolt.struckAt) throw notFound();
    refuseStale(stored.bolt, version);

    const next = { ...stored.bolt, ...change };
    const today = dayAt(ctx.now, anchor.timeZone);
    const { type, adhesive } = await catalogueOf(tx, next);
    // A type brings its own build; what was seen before a type was known gives way to it.
    const form = change.boltTypeId && type && !change.form ? type.form : next.form;
    const problems = installProblems({ ...next, form }, { type, formerInstalledOn: null, today });
    if (problems.length > 0) throw invalid(problems);
    const cure =
      touchesGlue(change) && isSetWithGlue(form, next.method)
        ? {
            usableFrom: glueUsableFrom(
              { ...next, adhesive, installedAt: hourOf(stored.bolt, next) },
              { ...ctx, today },
            ),
          }
        : {};

    await updateBoltRow(tx, id, { ...change, ...cure, form }, by(person, ctx.now));
    await appendEvents(tx, ctx, [
      {
        areaId: anchor.areaId,
        anchorId: anchor.id,
        subjectType: "bolt",
        subjectId: id,
        kind: "bolt.changed",
        summary: `Placement ${stored.placementNumber}: corrected ${Object.keys(change).join(", ")}`,
        before: before(stored.bolt, change),
        after: change,
      },
    ]);
    await reevaluate(tx, ctx, [anchor.id]);
    return { id, version: version + 1 };
  });
}

async function catalogueOf(tx: Tx, bolt: { boltTypeId: string | null; adhesiveId: string | null }) {
  const type = bolt.boltTypeId ? await findBoltType(tx, bolt.boltTypeId) : null;
  if (bolt.boltTypeId && !type) throw invalidField("boltTypeId", "There is no such type in the catalogue.");
  const adhesive = bolt.adhesiveId ? await findAdhesive(tx, bolt.adhesiveId) : null;
  if (bolt.adhesiveId && !adhesive) throw invalidField("adhesiveId", "There is no such adhesive.");
  return { type, adhesive };
}

/** A corrected temperature or glue gives another cure time. */
function touchesGlue(change: BoltChange): boolean {
  return (["adhesiveId", "glueTempC", "rockTempC", "installedOn", "method"] as const).some(
    (key) => key in change,
  );
}

/** The hour it was set is kept only as the hour it was logged, when that was the same day. */
function hourOf(stored: BoltRow, next: { installedOn: string | null }): Date | null {
  return next.installedOn !== null && stored.createdAt.toISOString().startsWith(next.installedOn)
    ? stored.createdAt
    : null;
}

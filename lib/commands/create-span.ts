import "server-only";
import { inTransaction } from "@/db/client";
import { lockAnchor } from "@/db/repositories/anchors";
import { geodesicM } from "@/db/repositories/coast";
import { appendEvents } from "@/db/repositories/events";
import { findSpan, insertSpan } from "@/db/repositories/spans";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { authorize } from "@/lib/commands/writing/authorize";
import { idTaken, invalidField, isReplay, notFound } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import { audience } from "@/lib/policy/audience";
import type { CreateSpanInput } from "@/lib/schemas/anchor";

/** A line's way between two anchors; the length is the geodesic between their points. */
export async function createSpan(
  ctx: CommandContext,
  input: CreateSpanInput,
): Promise<{ id: string; lengthM: number; replayed: boolean }> {
  const digest = digestOf(input);
  const who = audience(ctx.actor);
  return inTransaction(ctx.db, async (tx) => {
    // In the order of their ids, so that two spans made at once never wait for each other.
    const ends = [];
    for (const id of [input.anchorAId, input.anchorBId].toSorted()) ends.push(await lockAnchor(tx, who, id));
    const a = ends.find((end) => end?.id === input.anchorAId);
    const b = ends.find((end) => end?.id === input.anchorBId);
    if (!a || !b) throw notFound();
    const person = authorize(ctx.actor, "span.create", { areaId: a.areaId });
    const stored = await findSpan(tx, input.id);
    if (stored && isReplay(stored, digest)) return { id: input.id, lengthM: stored.lengthM, replayed: true };
    if (a.areaId !== b.areaId) throw invalidField("anchorBId", "Both anchors have to be in one area.");

    const lengthM = await geodesicM(tx, a.point, b.point);
    const row = { ...input, areaId: a.areaId, lengthM, digest, ...createdBy(person, ctx.now) };
    if (!(await insertSpan(tx, row))) throw idTaken();
    await appendEvents(
      tx,
      ctx,
      [a, b].map((end) => ({
        areaId: end.areaId,
        anchorId: end.id,
        subjectType: "span",
        subjectId: input.id,
        kind: "span.created",
        summary: `Entered the span ${input.name}`,
        after: { name: input.name, anchorAId: a.id, anchorBId: b.id },
      })),
    );
    return { id: input.id, lengthM, replayed: false };
  });
}

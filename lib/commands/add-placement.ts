import "server-only";
import { insertPlacements, listPlacements, listRockBodyIds, findPlacement } from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { onAnchor, type OnAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalidField, isReplay } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import type { AddPlacementInput, NewPlacementInput } from "@/lib/schemas/anchor";

/** One more hole, tree, boulder, thread or removable piece at an anchor. */
export async function addPlacement(
  ctx: CommandContext,
  { anchorId, ...input }: AddPlacementInput,
): Promise<{ id: string; number: number; replayed: boolean }> {
  const digest = digestOf({ anchorId, ...input });
  return onAnchor(ctx, anchorId, "placement.create", async (on) => {
    const stored = await findPlacement(on.tx, input.id);
    if (stored && isReplay(stored, digest)) return { id: input.id, number: stored.number, replayed: true };
    const number = await makePlacement(ctx, on, input, digest);
    await reevaluate(on.tx, ctx, [anchorId]);
    return { id: input.id, number, replayed: false };
  });
}

/** Inserts a placement with the next number; shared with the install that makes its own hole. */
export async function makePlacement(
  ctx: CommandContext,
  { tx, anchor, person }: OnAnchor,
  input: NewPlacementInput,
  digest: string | null,
): Promise<number> {
  const all = await listPlacements(tx, anchor.id);
  const number = input.number ?? Math.max(0, ...all.map((placement) => placement.number)) + 1;
  if (all.some((placement) => placement.number === number)) {
    throw invalidField("number", `There is a placement ${number} already.`);
  }
  if (input.rockBodyId && !(await listRockBodyIds(tx, anchor.id)).includes(input.rockBodyId)) {
    throw invalidField("rockBodyId", "This rock body is not one of this anchor's.");
  }
  const row = { ...input, number, anchorId: anchor.id, digest, ...createdBy(person, ctx.now) };
  if (!(await insertPlacements(tx, [row]))) throw idTaken();
  await appendEvents(tx, ctx, [
    {
      areaId: anchor.areaId,
      anchorId: anchor.id,
      subjectType: "placement",
      subjectId: input.id,
      kind: "placement.added",
      summary: `Added placement ${number}`,
      after: { number, kind: input.kind ?? "bolt", role: input.role ?? "main" },
    },
  ]);
  return number;
}

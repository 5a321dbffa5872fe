import "server-only";
import { inTransaction } from "@/db/client";
import { appendEvents } from "@/db/repositories/events";
import { insertArea } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { createdBy } from "@/lib/commands/writing/stamp";
import type { CreateAreaInput } from "@/lib/schemas/steward";
import { AppError } from "@/lib/shared/errors";

/** A new area, without people or sites yet. */
export async function createArea(ctx: CommandContext, input: CreateAreaInput): Promise<{ id: string }> {
  return inTransaction(ctx.db, async (tx) => {
    const person = authorize(ctx.actor, "area.create", { areaId: null });
    if (!(await insertArea(tx, { ...input, ...createdBy(person, ctx.now) }))) {
      throw new AppError("conflict", "There is an area with this short name already.");
    }
    await appendEvents(tx, ctx, [
      {
        areaId: input.id,
        subjectType: "area",
        subjectId: input.id,
        kind: "area.created",
        summary: `Entered the area ${input.name}`,
        after: input,
      },
    ]);
    return { id: input.id };
  });
}

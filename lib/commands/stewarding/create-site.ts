import "server-only";
import { inTransaction } from "@/db/client";
import { appendEvents } from "@/db/repositories/events";
import { findArea, insertSite } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { authorize } from "@/lib/commands/writing/authorize";
import { notFound } from "@/lib/commands/writing/refusals";
import { createdBy } from "@/lib/commands/writing/stamp";
import { audience, isMember } from "@/lib/policy/audience";
import type { CreateSiteInput } from "@/lib/schemas/steward";
import { AppError } from "@/lib/shared/errors";

/** A new cliff, cleft, quarry or stack of an area. */
export async function createSite(ctx: CommandContext, input: CreateSiteInput): Promise<{ id: string }> {
  return inTransaction(ctx.db, async (tx) => {
    const area = await findArea(tx, input.areaId);
    if (!area || (area.visibility === "members" && !isMember(audience(ctx.actor), area.id))) throw notFound();
    const person = authorize(ctx.actor, "site.edit", { areaId: area.id });
    if (!(await insertSite(tx, { ...input, ...createdBy(person, ctx.now) }))) {
      throw new AppError("conflict", "There is a site with this short name already.");
    }
    await appendEvents(tx, ctx, [
      {
        areaId: area.id,
        subjectType: "site",
        subjectId: input.id,
        kind: "site.created",
        summary: `Entered the site ${input.name}`,
        after: { name: input.name, visibility: input.visibility ?? "public" },
      },
    ]);
    return { id: input.id };
  });
}

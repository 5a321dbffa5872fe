import "server-only";
import { maySeePhoto } from "@/db/repositories/photos";
import type { CommandContext } from "@/lib/commands/context";
import { notFound } from "@/lib/commands/writing/refusals";
import { audience } from "@/lib/policy/audience";
import { photoStore } from "@/lib/storage/photo-store";

/**
 * A public copy of a photo, for those who may see what it shows exactly. A command only because reads of
 * `queries` know no files. @throws AppError `not_found` for everybody else, and for originals.
 */
export async function readPhoto(ctx: CommandContext, key: string): Promise<Uint8Array> {
  const userId = ctx.actor.kind === "person" ? ctx.actor.userId : null;
  if (!(await maySeePhoto(ctx.db, audience(ctx.actor), key, userId))) throw notFound();
  const bytes = await photoStore().get(key);
  if (!bytes) throw notFound();
  return bytes;
}

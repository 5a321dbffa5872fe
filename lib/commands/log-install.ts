import "server-only";
import { findBolt } from "@/db/repositories/bolts";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { type Installed, installBolt } from "@/lib/commands/install/install-bolt";
import { onAnchor, type OnAnchor } from "@/lib/commands/writing/on-anchor";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { invalid, isReplay } from "@/lib/commands/writing/refusals";
import type { InstallFacts, LogInstallInput, LogInstallSeriesInput } from "@/lib/schemas/bolt";
import { AppError } from "@/lib/shared/errors";

/** One bolt goes into one hole and replaces the one that stood there. */
export async function logInstall(
  ctx: CommandContext,
  { anchorId, ...facts }: LogInstallInput,
): Promise<Installed & { replayed: boolean }> {
  return onAnchor(ctx, anchorId, "bolt.install", async (on) => {
    const digest = digestOf({ anchorId, ...facts });
    const stored = await storedInstall(on, facts.id, digest);
    if (stored) return { ...stored, replayed: true };
    const done = await installBolt(ctx, on, facts, digest);
    await reevaluate(on.tx, ctx, [anchorId]);
    return { ...done, replayed: false };
  });
}

/** Several bolts of a row at once: all are stored or none, and the row is judged once. */
export async function logInstallSeries(
  ctx: CommandContext,
  { anchorId, bolts }: LogInstallSeriesInput,
): Promise<{ bolts: Installed[]; replayed: boolean }> {
  return onAnchor(ctx, anchorId, "bolt.install", async (on) => {
    const { done, replayed } = await installAll(ctx, on, bolts);
    await reevaluate(on.tx, ctx, [anchorId]);
    return { bolts: done, replayed };
  });
}

/** Puts several bolts on record in the caller's transaction; problems name the bolt they belong to. */
export async function installAll(
  ctx: CommandContext,
  on: OnAnchor,
  bolts: readonly InstallFacts[],
): Promise<{ done: Installed[]; replayed: boolean }> {
  const done: Installed[] = [];
  let replayed = true;
  for (const [index, facts] of bolts.entries()) {
    if ((facts.placementId === undefined) === (facts.newPlacement === undefined)) {
      const message = "Name the placement, or describe a new one.";
      throw invalid([{ path: `bolts.${index}.placementId`, message }]);
    }
    const digest = digestOf({ anchorId: on.anchor.id, ...facts });
    const stored = await storedInstall(on, facts.id, digest);
    if (!stored) replayed = false;
    done.push(stored ?? (await installBolt(ctx, on, facts, digest).catch(named(`bolts.${index}`))));
  }
  return { done, replayed };
}

/** The first answer again, from what was stored; null when the bolt is new. */
async function storedInstall({ tx }: OnAnchor, id: string, digest: string): Promise<Installed | null> {
  const stored = await findBolt(tx, id);
  if (!stored || !isReplay(stored.bolt, digest)) return null;
  return {
    id,
    placementId: stored.bolt.placementId,
    placementNumber: stored.placementNumber,
    replacedBoltId: stored.bolt.replacesBoltId,
    usableFrom: stored.bolt.usableFrom?.toISOString() ?? null,
  };
}

function named(prefix: string) {
  return (error: unknown): never => {
    if (!(error instanceof AppError) || error.problems.length === 0) throw error;
    const problems = error.problems.map(({ path, message }) => ({ path: `${prefix}.${path}`, message }));
    throw new AppError(error.code, error.message, { problems, cause: error });
  };
}

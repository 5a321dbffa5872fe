import "server-only";
import { inTransaction } from "@/db/client";
import { insertApiToken, revokeApiToken as revoke } from "@/db/repositories/api-tokens";
import { appendEvents } from "@/db/repositories/events";
import { hashSecret, newSecret } from "@/lib/auth/secrets";
import { requireSelf } from "@/lib/commands/account/require-self";
import type { CommandContext } from "@/lib/commands/context";
import { idTaken, notFound } from "@/lib/commands/writing/refusals";
import type { CreateTokenInput } from "@/lib/schemas/account";

const DAY_MS = 86_400_000;
const HINT_LENGTH = 6;

/**
 * Makes a token for a program. It is shown this once; a second send of the same id cannot show it again and
 * is refused as a conflict.
 */
export async function createApiToken(
  ctx: CommandContext,
  input: CreateTokenInput,
): Promise<{ token: string }> {
  const { userId } = requireSelf(ctx.actor);
  const { now } = ctx;
  return inTransaction(ctx.db, async (tx) => {
    const token = newSecret();
    const added = await insertApiToken(tx, {
      id: input.id,
      userId,
      name: input.name,
      tokenHash: hashSecret(token),
      hint: token.slice(0, HINT_LENGTH),
      scopes: input.scopes,
      createdAt: now,
      expiresAt: input.expiresInDays === null ? null : new Date(now.getTime() + input.expiresInDays * DAY_MS),
    });
    if (!added) throw idTaken();
    await appendEvents(tx, ctx, [
      {
        subjectType: "api_token",
        subjectId: input.id,
        kind: "token.created",
        summary: `Made the token “${input.name}”`,
        after: { scopes: input.scopes, expiresInDays: input.expiresInDays },
      },
    ]);
    return { token };
  });
}

/** Ends one of the person's own tokens at once. */
export async function revokeApiToken(ctx: CommandContext, input: { id: string }): Promise<void> {
  const { userId } = requireSelf(ctx.actor);
  return inTransaction(ctx.db, async (tx) => {
    const name = await revoke(tx, input.id, userId, ctx.now);
    if (name === null) throw notFound();
    await appendEvents(tx, ctx, [
      {
        subjectType: "api_token",
        subjectId: input.id,
        kind: "token.revoked",
        summary: `Revoked the token “${name}”`,
      },
    ]);
  });
}

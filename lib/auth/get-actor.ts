import "server-only";
import { getServerSession } from "next-auth";
import { cache } from "react";
import { type Db, getDb } from "@/db/client";
import { findUserById, rolesOf, touchApiToken } from "@/db/repositories/people";
import { authOptions } from "@/lib/auth/options";
import { hashSecret } from "@/lib/auth/secrets";
import { now } from "@/lib/config/clock";
import { type Actor, type TokenScope, VISITOR } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** Who is looking at this page: read from the session cookie, once a request. */
export const getActor = cache(async (): Promise<Actor> => {
  const session = await getServerSession(authOptions());
  if (!session?.userId) return VISITOR;
  return (await loadPerson(getDb(), session.userId, { epoch: session.sessionEpoch })) ?? VISITOR;
});

/**
 * Who sends this API request: a bearer token wins over a cookie.
 * @throws AppError `not_signed_in` when a token is sent that is unknown, revoked or expired.
 */
export async function actorFromRequest(request: Request): Promise<Actor> {
  const header = request.headers.get("authorization");
  if (!header) return getActor();
  const token = /^Bearer ([\w-]{20,200})$/.exec(header)?.[1];
  const db = getDb();
  const row = token ? await touchApiToken(db, hashSecret(token), now()) : null;
  const person = row ? await loadPerson(db, row.userId, { scopes: row.scopes }) : null;
  if (!person) throw new AppError("not_signed_in", "This token is not known, was revoked or has expired.");
  return person;
}

/** The person as an actor; null when gone, disabled, or the session belongs to an earlier epoch. */
export async function loadPerson(
  db: Db,
  userId: string,
  by: { epoch?: number; scopes?: TokenScope[] },
): Promise<Actor | null> {
  const user = await findUserById(db, userId);
  if (!user || user.disabledAt) return null;
  if (by.epoch !== undefined && by.epoch !== user.sessionEpoch) return null;
  return {
    kind: "person",
    userId: user.id,
    name: user.name,
    email: user.email,
    isAdmin: user.isAdmin,
    roles: await rolesOf(db, user.id),
    ...(by.scopes ? { tokenScopes: by.scopes } : {}),
  };
}

import "server-only";
import { getDb } from "@/db/client";
import { findUserByEmail, findUserById, spendOneTimeToken, type UserRow } from "@/db/repositories/people";
import { passwordFits } from "@/lib/auth/password";
import { limitRate } from "@/lib/auth/rate-limit";
import { hashSecret } from "@/lib/auth/secrets";
import { now } from "@/lib/config/clock";

/** What the session keeps of a person. */
export interface SignedIn {
  id: string;
  sessionEpoch: number;
}

/** Null when e-mail or password is wrong; the answer is the same for both and takes the same time. */
export async function signInWithPassword(
  email: string,
  password: string,
  address: string,
): Promise<SignedIn | null> {
  await limitRate("sign-in-address", address);
  await limitRate("sign-in-person", email.trim().toLowerCase());
  const user = await findUserByEmail(getDb(), email.trim());
  const fits = await passwordFits(user?.passwordHash ?? null, password);
  return fits ? signedIn(user) : null;
}

/** Spends a mailed sign-in link; null when it is unknown, used or expired. */
export async function signInWithLink(secret: string, address: string): Promise<SignedIn | null> {
  await limitRate("sign-in-address", address);
  const db = getDb();
  const token = await spendOneTimeToken(db, hashSecret(secret), "sign_in", now());
  if (!token?.userId) return null;
  return signedIn(await findUserById(db, token.userId));
}

function signedIn(user: UserRow | null): SignedIn | null {
  return user && !user.disabledAt ? { id: user.id, sessionEpoch: user.sessionEpoch } : null;
}

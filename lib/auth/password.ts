import "server-only";
import { hash, verify } from "@node-rs/argon2";

/** The library's default algorithm, argon2id, with the parameters OWASP's password storage cheat sheet names first: 19 MiB, 2 passes, 1 lane. */
const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, OPTIONS);
}

let decoy: Promise<string> | undefined;

/**
 * Whether the password fits. An unknown person or one without a password costs the same time as a wrong
 * password, so the answer does not tell who has an account.
 */
export async function passwordFits(stored: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword("nobody has this password");
  const fits = await verify(stored ?? (await decoy), password);
  return stored !== null && fits;
}

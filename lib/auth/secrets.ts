import "server-only";
import { createHash, randomBytes } from "node:crypto";

/** A secret for a link or an API token: 256 bits, URL-safe. It is shown once; only its hash is kept. */
export function newSecret(): string {
  return randomBytes(32).toString("base64url");
}

/** SHA-256 in hex: enough for secrets that are random to begin with. */
export function hashSecret(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}

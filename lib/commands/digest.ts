import "server-only";
import { createHash } from "node:crypto";

/**
 * Digest of what a create was sent with: SHA-256 over JSON with sorted keys, so the order of fields does not
 * matter. The same id with the same digest is a replay; with another digest a conflict.
 */
export function digestOf(input: unknown): string {
  return createHash("sha256").update(JSON.stringify(input, sortKeys)).digest("hex");
}

function sortKeys(_key: string, value: unknown): unknown {
  if (typeof value !== "object" || value === null || Array.isArray(value)) return value;
  return Object.fromEntries(Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : 1)));
}

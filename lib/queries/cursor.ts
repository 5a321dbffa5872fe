import "server-only";
import { AppError } from "@/lib/shared/errors";

/** Where a keyset page ended. Opaque to callers. */
export interface Cursor {
  code: string;
  distanceM: number | null;
}

export function writeCursor(cursor: Cursor): string {
  return Buffer.from(JSON.stringify([cursor.code, cursor.distanceM])).toString("base64url");
}

/** @throws AppError `invalid_input` when it was not made by `writeCursor`. */
export function readCursor(text: string): Cursor {
  try {
    const parsed: unknown = JSON.parse(Buffer.from(text, "base64url").toString("utf8"));
    if (Array.isArray(parsed) && parsed.length === 2) {
      const [code, distanceM]: unknown[] = parsed;
      if (typeof code === "string" && (distanceM === null || typeof distanceM === "number"))
        return { code, distanceM };
    }
  } catch {
    // falls through to the refusal
  }
  throw new AppError("invalid_input", "This cursor was not made here.", {
    problems: [{ path: "cursor", message: "Use the value of `next` of the page before." }],
  });
}

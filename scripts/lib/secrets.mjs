import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";

/** Reads a secret of this installation from a directory, making it on the first call (file mode 0600). */
export function secret(directory, name) {
  const file = path.join(directory, name);
  if (!existsSync(file)) {
    writeFileSync(file, randomBytes(32).toString("base64url") + "\n", { mode: 0o600 });
  }
  return readFileSync(file, "utf8").trim();
}

import "server-only";
import { mkdir, readFile, rename, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { KEY_PATTERN, type StorageDriver } from "@/lib/storage/driver";

/** Files in a folder of this machine. Written beside and renamed, so a half-written file is never read. */
export function localFolder(root: string): StorageDriver {
  const fileOf = (key: string) => {
    if (!KEY_PATTERN.test(key)) throw new Error("not a storage key");
    return path.join(/* turbopackIgnore: true */ root, key);
  };
  return {
    async put(key, bytes) {
      const file = fileOf(key);
      await mkdir(path.dirname(file), { recursive: true });
      await writeFile(`${file}.part`, bytes, { mode: 0o600 });
      await rename(`${file}.part`, file);
    },
    async get(key) {
      if (!KEY_PATTERN.test(key)) return null;
      try {
        return await readFile(fileOf(key));
      } catch (error) {
        if (error instanceof Error && "code" in error && error.code === "ENOENT") return null;
        throw error;
      }
    },
    async remove(key) {
      await rm(fileOf(key), { force: true });
    },
  };
}

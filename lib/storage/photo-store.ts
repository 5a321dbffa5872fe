import "server-only";
import path from "node:path";
import { env } from "@/lib/config/env";
import type { StorageDriver } from "@/lib/storage/driver";
import { localFolder } from "@/lib/storage/local-folder";

let store: StorageDriver | undefined;

/** The process-wide store for photos. */
export function photoStore(): StorageDriver {
  store ??= localFolder(path.resolve(/* turbopackIgnore: true */ env().BYSSUS_DATA_DIR, "photos"));
  return store;
}

import "server-only";

/** Where files live. Keys are made by us, never typed by people. */
export interface StorageDriver {
  put(key: string, bytes: Uint8Array, contentType: string): Promise<void>;
  /** Null when there is no such file. */
  get(key: string): Promise<Uint8Array | null>;
  /** Removing what is not there is no error. */
  remove(key: string): Promise<void>;
}

/** `ab/abcdef….webp`: a random part nobody can guess, the first two characters as a folder. */
export const KEY_PATTERN = /^[0-9a-f]{2}\/[0-9a-f]{48}(-original)?\.(webp|jpg|png)$/;

/** Largest photo taken, bytes. */
export const MAX_PHOTO_BYTES = 20 * 1024 * 1024;

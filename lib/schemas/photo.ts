import { z } from "zod";
import { id, note } from "@/lib/schemas/fields";

/** Largest photo taken, bytes. */
export const MAX_PHOTO_BYTES = 20 * 1024 * 1024;

/** What is sent beside the file. */
export const photoFields = z.strictObject({ id, caption: note(300).default("") });

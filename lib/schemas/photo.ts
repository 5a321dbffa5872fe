import { z } from "zod";
import { id, note } from "@/lib/schemas/fields";

/** What is sent beside the file. */
export const photoFields = z.strictObject({ id, caption: note(300).default("") });

import { PLATED_TYPES, SCREW_TYPES, STUD_TYPES } from "@/db/seed/catalogue/mechanical-types";
import { EYE_TYPES } from "@/db/seed/catalogue/eye-types";
import { GLUED_STUD_TYPES, ROD_TYPES } from "@/db/seed/catalogue/glued-types";
import type { BoltType } from "@/db/seed/catalogue/bolt-type";

/** The hardware found on the island, by generic name. */
export const BOLT_TYPES = {
  ...ROD_TYPES,
  ...EYE_TYPES,
  ...GLUED_STUD_TYPES,
  ...STUD_TYPES,
  ...SCREW_TYPES,
  ...PLATED_TYPES,
} as const;

export type TypeKey = keyof typeof BOLT_TYPES;

/** One type, widened: every column may be read. */
export function boltType(key: TypeKey): BoltType {
  return BOLT_TYPES[key];
}

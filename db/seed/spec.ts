import type { LonLat } from "@/db/columns/point";
import type { anchors, bolts, edges, fittings, placements, rockBodies } from "@/db/schema";
import type { AdhesiveKey } from "@/db/seed/catalogue/adhesives";
import type { TypeKey } from "@/db/seed/catalogue/bolt-types";
import type { Past } from "@/db/seed/dates";
import type { Form, Use } from "@/lib/domain/vocabulary";

/** What the stories of the island are written in: the register's records without ids and bookkeeping. */
export interface BoltSpec {
  /** Null: not in the catalogue; then `form` says what can be seen. */
  type: TypeKey | null;
  form?: Form;
  /** Null: nobody knows. */
  when: Past | null;
  glue?: AdhesiveKey;
  /** The account that set it, when it was one of the demo's. */
  hand?: "bolter" | "steward";
  facts?: Partial<typeof bolts.$inferInsert>;
}

export interface PlacementSpec {
  /** mm from placement 1: right along the face, up it, out of the rock. */
  at?: readonly [xMm: number, yMm: number, zMm: number];
  facts?: Partial<typeof placements.$inferInsert>;
  /** The chain of the hole, oldest first; every one but the last was taken out. */
  bolts?: readonly BoltSpec[];
  /** Index of the rock body it sits in. */
  body?: number;
}

export interface AnchorSpec {
  label: string;
  uses: Use[];
  at: LonLat;
  facts?: Partial<typeof anchors.$inferInsert>;
  placements: readonly PlacementSpec[];
  bodies?: readonly Omit<typeof rockBodies.$inferInsert, "id" | "anchorId">[];
  edges?: readonly Omit<typeof edges.$inferInsert, "id" | "anchorId">[];
  /** `on`: number of the placement it hangs on. */
  fittings?: readonly (Omit<typeof fittings.$inferInsert, "id" | "anchorId"> & { on?: number })[];
}

/** One anchor as it went into the register. */
export interface Entered {
  id: string;
  label: string;
  siteId: string;
  areaId: string;
  uses: readonly Use[];
  placements: readonly {
    id: string;
    number: number;
    /** The bolt in force; null for a tree or boulder, or an empty hole. */
    boltId: string | null;
    /** Everything that was ever in it, oldest first. */
    chain: readonly string[];
  }[];
  fittingIds: readonly string[];
}

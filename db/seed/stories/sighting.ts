import type { Plane } from "@/db/seed/island/frame";
import type { Depth, ReportKind } from "@/lib/domain/vocabulary";

/** What somebody saw, told by the label of the anchor and the number of the placement. */
export interface Sighting {
  anchor: string;
  placement?: number;
  /** About what stood in the hole before the bolt that is there now. */
  formerBolt?: boolean;
  /** About the first fitting of the anchor. */
  fitting?: boolean;
  /** About the line itself. */
  span?: string;
  kind: ReportKind;
  depth: Depth;
  by: "rigger" | "bolter" | "steward" | "visitor";
  daysAgo: number;
  measured?: Readonly<Record<string, number | string | boolean>>;
  grade?: number;
  note: string;
  tookOutOfUse?: boolean;
  /** Days ago it was answered, and how. Absent: open. */
  answered?: readonly [daysAgo: number, how: string];
  /** Metres east and north of the anchor, for what is not in the register. */
  nearby?: Plane;
}

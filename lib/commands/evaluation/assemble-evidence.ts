import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import { closuresAround } from "@/lib/commands/evaluation/closures-around";
import { factsOfBolt, metalsOfBolt } from "@/lib/commands/evaluation/facts-of-bolt";
import { matchWarnings } from "@/lib/commands/evaluation/match-warnings";
import { lastCheckOn, openFacts, type ReportsByBolt } from "@/lib/commands/evaluation/reports-by-bolt";
import type {
  AnchorEvidence,
  BoltEvidence,
  CareFacts,
  GroupFacts,
  PlaceFacts,
  PlacementFacts,
} from "@/lib/domain/finding/evidence";
import type { LoadPolicy } from "@/lib/domain/policy";

type Head = EvidenceRows["heads"][number];
type PlacementRow = EvidenceRows["placements"][number];
type BoltEntry = EvidenceRows["bolts"][number];

/** The rows of one anchor, already picked out of a batch. */
export interface AnchorRows {
  head: Head;
  policy: LoadPolicy;
  placements: readonly PlacementRow[];
  rockBodies: EvidenceRows["rockBodies"];
  /** Those in the rock now. */
  bolts: readonly BoltEntry[];
  fittings: EvidenceRows["fittings"];
  reports: ReportsByBolt;
  fracturedMetals: readonly string[];
  warnings: EvidenceRows["warnings"];
  closures: EvidenceRows["closures"];
  /** Bolts that are out of use: they take no share of a load. */
  outOfUseBoltIds: ReadonlySet<string>;
}

/** All the rules may know about an anchor at an instant. `onDate` is the day it is there. */
export function assembleEvidence(rows: AnchorRows, at: { now: Date; onDate: string }): AnchorEvidence {
  const { anchor, site, area } = rows.head;
  const place = placeOf(rows.head);
  const rock = { ucsMpa: site.ucsMpa };
  const shared = {
    warnings: [],
    fracturedMetals: rows.fracturedMetals,
    closures: closuresAround(rows.closures, {
      areaId: area.id,
      siteId: site.id,
      anchorId: anchor.id,
      onDate: at.onDate,
    }),
  };
  return {
    anchorId: anchor.id,
    uses: anchor.uses,
    onDate: at.onDate,
    place,
    rock,
    group: groupOf(rows, null),
    fittings: rows.fittings.map((fitting) => ({ fittingId: fitting.id, ...fitting })),
    care: { ...shared, openReports: openFacts(rows.reports.ofAnchor), lastCheckOn: null },
    bolts: rows.bolts.flatMap((entry) => {
      const placement = rows.placements.find((one) => one.id === entry.bolt.placementId);
      if (!placement) return [];
      const care = careOf(entry, rows, shared);
      return anchor.uses.map((use) => ({
        boltId: entry.bolt.id,
        placementNumber: placement.number,
        evidence: {
          context: "in_rock",
          use,
          bolt: factsOfBolt(entry, placement),
          place,
          rock,
          demand: {
            workingKn: rows.policy.demand[use].workingKn,
            peakKn: rows.policy.demand[use].peakKn,
            angleFromAxisDeg: 90,
            origin: `area policy, version ${rows.policy.version}`,
          },
          onDate: at.onDate,
          atUtc: at.now.toISOString(),
          placement: placementFacts(placement),
          group: groupOf(rows, entry),
          care,
          textileThroughEye: null,
        } satisfies BoltEvidence,
      }));
    }),
  };
}

function placeOf({ anchor, site, area }: Head): PlaceFacts {
  return {
    seaDistanceM: anchor.seaDistanceM,
    seaDistanceErrorM: anchor.seaDistanceErrorM ?? 0,
    coast: area.coast,
    washing: anchor.washing ?? site.washing,
    so2: site.so2 ?? area.so2,
    saltedRoadDistanceM: site.saltedRoadDistanceM,
    warmDry: site.warmDry,
  };
}

function careOf(
  entry: BoltEntry,
  rows: AnchorRows,
  shared: Pick<CareFacts, "fracturedMetals" | "closures">,
): CareFacts {
  const { bolt } = entry;
  const warned = { ...bolt, areaId: rows.head.area.id, metals: metalsOfBolt(entry) };
  return {
    ...shared,
    openReports: openFacts(rows.reports.ofPlacement(bolt.placementId)),
    warnings: matchWarnings(warned, rows.warnings),
    lastCheckOn: lastCheckOn(bolt.id, rows.reports.all),
  };
}

/** The placements that can take the load; `self` counts for its own evidence even when it is out of use. */
function groupOf(rows: AnchorRows, self: BoltEntry | null): GroupFacts {
  const { anchor } = rows.head;
  const able = rows.placements.filter((placement) => {
    if (placement.kind !== "bolt") return true;
    const current = rows.bolts.find(({ bolt }) => bolt.placementId === placement.id)?.bolt;
    if (!current) return false;
    return current.id === self?.bolt.id || !rows.outOfUseBoltIds.has(current.id);
  });
  const main = able.filter(({ role }) => role === "main");
  return {
    mainCount: main.length,
    backupCount: able.filter(({ role }) => role === "backup").length,
    hasGeometry:
      anchor.masterpointXMm !== null &&
      anchor.masterpointYMm !== null &&
      main.every(({ xMm, yMm }) => xMm !== null && yMm !== null),
    isRow: anchor.rowName !== null,
    rockBodies: rows.rockBodies.map(({ id, attachment, label }) => ({ rockBodyId: id, attachment, label })),
    placements: able.map(placementFacts),
  };
}

function placementFacts(row: PlacementRow): PlacementFacts {
  const { xMm, yMm } = row;
  return {
    placementId: row.id,
    number: row.number,
    kind: row.kind,
    role: row.role,
    xMm,
    yMm,
    zMm: row.zMm,
    edgeDistanceMm: row.edgeDistanceMm,
    edgeSide: row.edgeSide,
    overhang: row.overhang,
    deadHoleDistancesMm:
      xMm === null || yMm === null
        ? []
        : row.deadHoles.map((hole) => Math.hypot(hole.xMm - xMm, hole.yMm - yMm)),
    rockBodyId: row.rockBodyId,
  };
}

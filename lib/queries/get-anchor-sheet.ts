import "server-only";
import { getDb } from "@/db/client";
import { findAnchorHead, isWatched, loadAnchorParts } from "@/db/repositories/anchor-read";
import { listClosureRows, policyOf } from "@/db/repositories/area-read";
import { listSpanRows } from "@/db/repositories/span-read";
import { CAUTION } from "@/lib/domain/finding/engine";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { Use } from "@/lib/domain/vocabulary";
import { audience, isMember, roundedPoint } from "@/lib/policy/audience";
import { boltViewOf, closureViewOf, findingsView, sheetReportOf } from "@/lib/queries/anchor-view";
import { forOutsiders, withoutPlace } from "@/lib/queries/redact";
import { revisionsOf } from "@/lib/queries/revisions";
import {
  type AnchorSheet,
  anchorSheetView,
  type PlacementView,
  placementView,
} from "@/lib/schemas/views/anchor";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

type Head = NonNullable<Awaited<ReturnType<typeof findAnchorHead>>>;
type Parts = Awaited<ReturnType<typeof loadAnchorParts>>;

/** Everything one anchor sheet shows. @throws AppError `not_found` when absent or hidden. */
export async function getAnchorSheet(
  actor: Actor,
  by: { id: string } | { code: string },
): Promise<AnchorSheet> {
  const db = getDb();
  const who = audience(actor);
  const head = await findAnchorHead(db, who, by);
  if (!head) throw new AppError("not_found", "There is no such anchor, or it is not shown to you.");
  const { anchor, site, area } = head;
  const [parts, closures, spans, policy, watched] = await Promise.all([
    loadAnchorParts(db, anchor.id),
    listClosureRows(db, { areaId: area.id, siteId: site.id, anchorId: anchor.id }),
    listSpanRows(db, who, { anchorId: anchor.id }),
    policyOf(db, area.id),
    actor.kind === "person" ? isWatched(db, actor.userId, anchor.id) : false,
  ]);
  const member = isMember(who, area.id);
  const exact = member || site.visibility !== "sensitive";
  const sheet: AnchorSheet = {
    ...headView(head, exact),
    ...partsView(parts),
    policyVersion: policy.version,
    nextCheckDueOn: nextCheckDue(head.lastCheckOn, anchor.uses, policy),
    closures: closures.map(closureViewOf),
    spans: spans.map((span) => {
      const other = span.a.id === anchor.id ? span.b : span.a;
      return {
        id: span.id,
        name: span.name,
        lengthM: span.lengthM,
        otherCode: other.code,
        otherLabel: other.label,
        otherCondition: other.condition,
      };
    }),
    watched,
    caution: CAUTION,
  };
  if (member) return sheet;
  return exact ? forOutsiders(sheet) : withoutPlace(sheet);
}

function headView({ anchor, site, area, evaluation, lastCheckOn }: Head, exact: boolean) {
  const { lon, lat } = exact ? anchor.point : roundedPoint(site.point);
  const { masterpointXMm: xMm, masterpointYMm: yMm, masterpointZMm: zMm } = anchor;
  return {
    id: anchor.id,
    version: anchor.version,
    code: anchor.code,
    label: anchor.label,
    area: { id: area.id, slug: area.slug, name: area.name, timeZone: area.timeZone },
    site: {
      id: site.id,
      slug: site.slug,
      name: site.name,
      visibility: site.visibility,
      rockType: site.rockType,
      ucsMpa: site.ucsMpa,
      ucsBasis: site.ucsBasis,
    },
    uses: anchor.uses,
    point: { type: "Point" as const, coordinates: [lon, lat] satisfies [number, number] },
    exact,
    pointErrorM: anchor.pointErrorM,
    elevationM: anchor.elevationM,
    designAzimuthDeg: anchor.designAzimuthDeg,
    designElevationDeg: anchor.designElevationDeg,
    faceAzimuthDeg: anchor.faceAzimuthDeg,
    faceDipDeg: anchor.faceDipDeg,
    rigging: anchor.rigging,
    masterpoint: xMm === null || yMm === null ? null : { xMm, yMm, zMm: zMm ?? 0 },
    washing: anchor.washing ?? site.washing,
    washingFrom: anchor.washing === null ? ("site" as const) : ("anchor" as const),
    sea: seaView(anchor),
    rowName: anchor.rowName,
    rowLengthM: anchor.rowLengthM,
    note: anchor.note,
    condition: anchor.condition,
    derivedCondition: anchor.derivedCondition,
    decided:
      anchor.decidedCondition && anchor.decidedAt
        ? {
            condition: anchor.decidedCondition,
            reason: anchor.decidedReason ?? "",
            at: anchor.decidedAt.toISOString(),
          }
        : null,
    outOfUseSince: anchor.outOfUseSince?.toISOString() ?? null,
    verdict: evaluation?.verdict ?? null,
    utilisation: evaluation?.utilisation ?? null,
    helpMost: evaluation?.helpMost ?? null,
    placeClass: evaluation?.placeClass ?? null,
    engineVersion: evaluation?.engineVersion ?? null,
    lastCheckOn,
  };
}

function seaView({ seaDistanceM, seaDistanceSource, seaDistanceErrorM, seaDistanceNote }: Head["anchor"]) {
  if (seaDistanceM === null || seaDistanceSource === null) return null;
  return {
    distanceM: seaDistanceM,
    source: seaDistanceSource,
    errorM: seaDistanceErrorM ?? 0,
    note: seaDistanceNote,
  };
}

/** The schemas drop every column a view does not name. */
function partsView(parts: Parts) {
  const numberOf = new Map(parts.placements.map((placement) => [placement.id, placement.number]));
  const { fittings, edges, rockBodies, jobs } = anchorSheetView.shape;
  return {
    placements: parts.placements.map((placement) => withBolts(placement, parts.bolts)),
    fittings: fittings.parse(
      parts.fittings.map((fitting) => ({
        ...fitting,
        placementNumber: fitting.placementId === null ? null : (numberOf.get(fitting.placementId) ?? null),
      })),
    ),
    edges: edges.parse(parts.edges),
    rockBodies: rockBodies.parse(parts.rockBodies),
    findings: findingsView(parts.findings),
    reports: parts.reports.filter(({ report }) => report.state !== "struck").map(sheetReportOf),
    jobs: jobs.parse(parts.jobs),
    revisions: revisionsOf(parts.events),
  };
}

function withBolts(placement: Parts["placements"][number], bolts: Parts["bolts"]): PlacementView {
  const inIt = bolts.filter((row) => row.bolt.placementId === placement.id);
  const inForce = inIt.find((row) => row.bolt.removedOn === null && row.bolt.struckAt === null);
  return placementView.parse({
    ...placement,
    bolt: inForce ? boltViewOf(inForce) : null,
    former: inIt.filter((row) => row !== inForce).map(boltViewOf),
  });
}

/** The shortest interval of the anchor's uses after the last check; null when nobody ever checked. */
function nextCheckDue(lastCheckOn: string | null, uses: readonly Use[], policy: LoadPolicy): string | null {
  if (lastCheckOn === null || uses.length === 0) return null;
  const months = Math.min(...uses.map((use) => policy.checkIntervalMonths[use]));
  const due = new Date(`${lastCheckOn}T00:00:00Z`);
  due.setUTCMonth(due.getUTCMonth() + months);
  return due.toISOString().slice(0, 10);
}

import { v7 } from "uuid";
import type { Db } from "@/db/client";
import {
  adhesives,
  anchors,
  batchWarnings,
  bolts,
  boltTypes,
  closures,
  photos,
  placements,
  reboltJobAssignees,
  reboltJobPlacements,
  reboltJobs,
  reports,
  sites,
} from "@/db/schema";
import { evaluateAnchors } from "@/lib/commands/evaluation/evaluate-anchors";
import type { SiteVisibility } from "@/lib/domain/vocabulary";
import type { Person } from "@/lib/shared/actor";
import { later, NOON } from "@/tests/support/people";

export type Register = Awaited<ReturnType<typeof addRegister>>;

const MINUTES_A_DAY = 24 * 60;

/** A thin bent rod, as it stands in many a sport crag. */
export async function addCatalogue(db: Db) {
  const typeId = v7();
  const adhesiveId = v7();
  await db.insert(boltTypes).values({
    id: typeId,
    name: `8 mm twin-leg bent rod ${typeId}`,
    form: "glued_bent_rod",
    boltMetal: "1.4404",
    rodCount: 2,
    rodDiameterMm: 8,
    leverMm: 20,
    ratedRadialKn: 35,
    ratedAxialKn: 25,
    bendOnsetLowKn: 4,
    bendOnsetHighKn: 4,
    bendOnsetBasis: "tested",
    allowedMethods: ["epoxy", "vinylester"],
  });
  await db.insert(adhesives).values({
    id: adhesiveId,
    name: `Epoxy ${adhesiveId}`,
    kind: "epoxy",
    cureSteps: [
      { minTempC: 5, workMin: 60, cureMin: 1440 },
      { minTempC: 20, workMin: 20, cureMin: 480 },
    ],
  });
  return { typeId, adhesiveId };
}

/** An anchor with placements in a row, a bolt of the type in each, set years before. */
export async function addAnchor(
  db: Db,
  { siteId, typeId, count = 3 }: { siteId: string; typeId: string; count?: number },
) {
  const id = v7();
  await db.insert(anchors).values({
    id,
    siteId,
    label: `Anchor ${id.slice(-4)}`,
    code: `T-${id.slice(-12)}`,
    uses: ["belay"],
    point: { lon: -9.5, lat: 52.1 },
    elevationM: 41,
    seaDistanceM: 4321,
    seaDistanceSource: "measured",
  });
  const placementIds: string[] = [];
  const boltIds: string[] = [];
  for (let number = 1; number <= count; number += 1) {
    const placementId = v7();
    const boltId = v7();
    await db.insert(placements).values({ id: placementId, anchorId: id, number });
    await db.insert(bolts).values({
      id: boltId,
      placementId,
      boltTypeId: typeId,
      form: "glued_bent_rod",
      installedOn: "2020-05-01",
      method: "epoxy",
      embedmentMm: 90,
      createdAt: later(-100 * MINUTES_A_DAY),
    });
    placementIds.push(placementId);
    boltIds.push(boltId);
  }
  await db.transaction((tx) => evaluateAnchors(tx, [id], { now: NOON }));
  return { id, placementIds, boltIds };
}

/** A report that stands open, as somebody filed it the day before. */
export async function addReport(
  db: Db,
  row: Pick<typeof reports.$inferInsert, "areaId" | "siteId" | "anchorId"> &
    Partial<typeof reports.$inferInsert>,
): Promise<string> {
  const id = row.id ?? v7();
  const observedAt = later(-MINUTES_A_DAY);
  await db.insert(reports).values({ kind: "nut_loose", observedAt, receivedAt: observedAt, ...row, id });
  return id;
}

export async function addPhotoRow(
  db: Db,
  to: { reportId?: string; jobId?: string; anchorId?: string; by?: string },
) {
  const id = v7();
  const key = (part: string) => `ab/${id}${part}.webp`;
  await db.insert(photos).values({
    id,
    reportId: to.reportId ?? null,
    jobId: to.jobId ?? null,
    anchorId: to.anchorId ?? null,
    createdBy: to.by ?? null,
    sha256: id,
    originalKey: key("-original"),
    largeKey: key(""),
    thumbKey: key("-thumb"),
    widthPx: 800,
    heightPx: 600,
  });
  return id;
}

/** One of everything that a command may act on, at a site of the given visibility. */
export async function addRegister(
  db: Db,
  { areaId, bolter, steward }: { areaId: string; bolter: Person; steward: Person },
  visibility: SiteVisibility = "public",
) {
  const siteId = v7();
  await db.insert(sites).values({
    id: siteId,
    areaId,
    slug: siteId,
    name: "Gannet Cleft",
    visibility,
    point: { lon: -9.5, lat: 52.1 },
    rockType: "sandstone",
    ucsMpa: 90,
    washing: "rain",
  });
  const catalogue = await addCatalogue(db);
  const anchor = await addAnchor(db, { siteId, typeId: catalogue.typeId });
  const other = await addAnchor(db, { siteId, typeId: catalogue.typeId });
  const about = { areaId, siteId, anchorId: anchor.id };
  const reportId = await addReport(db, {
    ...about,
    placementId: anchor.placementIds[0],
    boltId: anchor.boltIds[0],
  });
  const jobId = await addJob(db, {
    areaId,
    anchorId: anchor.id,
    placementId: anchor.placementIds[1] ?? "",
    bolter,
  });
  const jobPhotoId = await addPhotoRow(db, { jobId, anchorId: anchor.id });
  const warningId = v7();
  await db.insert(batchWarnings).values({
    id: warningId,
    areaId,
    title: "Cracked welds",
    body: "Look at the weld.",
    says: "inspect",
    boltTypeId: catalogue.typeId,
    publishedAt: NOON,
  });
  const closureId = v7();
  await db
    .insert(closures)
    .values({ id: closureId, areaId, siteId, reason: "Nesting", startsOn: "2026-09-01" });
  const ready = await addAnchorReadyToReturn(db, { areaId, siteId, typeId: catalogue.typeId, steward });
  return {
    areaId,
    siteId,
    ...catalogue,
    anchor,
    other,
    reportId,
    jobId,
    jobPhotoId,
    warningId,
    closureId,
    ready,
  };
}

async function addJob(
  db: Db,
  to: { areaId: string; anchorId: string; placementId: string; bolter: Person },
): Promise<string> {
  const id = v7();
  const { areaId, anchorId } = to;
  await db
    .insert(reboltJobs)
    .values({ id, areaId, anchorId, title: "Replace", state: "accepted", waitingSince: NOON });
  await db.insert(reboltJobPlacements).values({ jobId: id, placementId: to.placementId });
  await db.insert(reboltJobAssignees).values({ jobId: id, userId: to.bolter.userId });
  return id;
}

/** One bolt, out of use since the day before, checked by hand this morning with a photo. */
async function addAnchorReadyToReturn(
  db: Db,
  { areaId, siteId, typeId, steward }: { areaId: string; siteId: string; typeId: string; steward: Person },
) {
  const anchor = await addAnchor(db, { siteId, typeId, count: 2 });
  const about = { areaId, siteId, anchorId: anchor.id };
  await addReport(db, { ...about, kind: "deformation", tookOutOfUse: true, state: "handled" });
  await db.transaction((tx) => evaluateAnchors(tx, [anchor.id], { now: NOON }));
  for (const [index, boltId] of anchor.boltIds.entries()) {
    const reportId = await addReport(db, {
      ...about,
      kind: "routine_check",
      depth: "handled",
      grade: 0,
      foundSound: true,
      boltId,
      placementId: anchor.placementIds[index],
      observedAt: later(-120),
      createdBy: steward.userId,
    });
    await addPhotoRow(db, { reportId, anchorId: anchor.id });
  }
  await db.transaction((tx) => evaluateAnchors(tx, [anchor.id], { now: NOON }));
  return anchor;
}

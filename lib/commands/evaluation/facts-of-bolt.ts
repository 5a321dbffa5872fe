import "server-only";
import type { EvidenceRows } from "@/db/repositories/evidence";
import type { BoltFacts } from "@/lib/domain/finding/evidence";

type BoltEntry = EvidenceRows["bolts"][number];

/** What is known of a bolt: its own record first, then its type's. */
export function factsOfBolt(
  { bolt, type, adhesive }: Pick<BoltEntry, "bolt" | "type" | "adhesive">,
  placement: { holeDiameterMm: number | null },
): BoltFacts {
  return {
    form: bolt.form,
    metal: bolt.boltMetal ?? type?.boltMetal ?? null,
    hangerMetal: bolt.hangerMetal ?? type?.hangerMetal ?? null,
    linkMetal: bolt.linkMetal ?? type?.linkMetal ?? null,
    rodCount: type?.rodCount ?? null,
    rodDiameterMm: type?.rodDiameterMm ?? null,
    leverMm: bolt.leverMm ?? type?.leverMm ?? null,
    shankDiameterMm: type?.shankDiameterMm ?? null,
    ratedRadialKn: type?.ratedRadialKn ?? null,
    ratedAxialKn: type?.ratedAxialKn ?? null,
    bendOnsetKn: type?.bendOnsetLowKn ?? null,
    bendOnsetHighKn: type?.bendOnsetHighKn ?? null,
    bendOnsetAxialKn: type?.bendOnsetAxialKn ?? null,
    bendOnsetBasis: type?.bendOnsetBasis ?? "unknown",
    method: bolt.method,
    embedmentMm: bolt.embedmentMm,
    holeDiameterMm: placement.holeDiameterMm ?? type?.holeDiameterMm ?? null,
    eyeRadiusMm: type?.eyeRadiusMm ?? null,
    coatingThicknessUm: type?.coatingThicknessUm ?? null,
    installedOn: bolt.installedOn,
    installedOnPrecision: bolt.installedOnPrecision,
    standard: bolt.claimedStandard ?? type?.standard ?? null,
    batch: bolt.batch,
    adhesiveId: bolt.adhesiveId,
    adhesiveBatch: bolt.adhesiveBatch,
    bondMpa: adhesive?.bondMpa ?? null,
    adhesiveExpiresOn: bolt.adhesiveExpiresOn,
    usableFrom: bolt.usableFrom?.toISOString() ?? null,
    recheckDueOn: bolt.recheckDueOn,
    magnetic: bolt.magnetic,
    rustGrade: bolt.rustGrade,
  };
}

/** The metals of all its parts that are on record. */
export function metalsOfBolt(entry: Pick<BoltEntry, "bolt" | "type">): string[] {
  const { bolt, type } = entry;
  return [
    bolt.boltMetal ?? type?.boltMetal,
    bolt.hangerMetal ?? type?.hangerMetal,
    bolt.linkMetal ?? type?.linkMetal,
  ].filter((metal) => typeof metal === "string");
}

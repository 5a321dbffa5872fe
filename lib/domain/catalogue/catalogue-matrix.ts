import type { LoadPolicy } from "@/lib/domain/policy";
import type { Method, Use, Verdict } from "@/lib/domain/vocabulary";
import { USES } from "@/lib/domain/vocabulary";
import { placeKinds } from "@/lib/domain/catalogue/place-kinds";
import type { WhatIfBolt } from "@/lib/domain/finding/what-if";
import { whatIf } from "@/lib/domain/finding/what-if";
import type { Finding } from "@/lib/domain/finding/types";

/** What the catalogue knows of a type: no hole, no rock, no date. */
export interface CatalogueType extends Omit<WhatIfBolt, "embedmentMm" | "method" | "installedOn"> {
  lengthMm: number | null;
  allowedMethods: readonly Method[];
}

export interface MatrixCell {
  use: Use;
  /** Key of the kind of place. */
  place: string;
  verdict: Verdict;
  findings: readonly Finding[];
}

export interface CatalogueMatrix {
  cells: readonly MatrixCell[];
  /** What holds for every cell. */
  assumed: readonly string[];
}

/** Sound hard rock, in which no rule about rock speaks, MPa. */
const ROCK_MPA = 60;
const GLUED_DEPTH_MM = 70;
const MECHANICAL_DEPTHS = 5;

/** The verdict on a type, placed new and as deep as EN 959 wants, for every use and kind of place. */
export function catalogueMatrix(type: CatalogueType, policy: LoadPolicy, onDate: string): CatalogueMatrix {
  const bolt = placedNew(type, onDate);
  const { embedmentMm = null } = bolt;
  const cells = USES.flatMap((use) =>
    placeKinds.map(({ key, place }): MatrixCell => {
      const { verdict, findings } = whatIf({ use, bolt, place, rock: { ucsMpa: ROCK_MPA }, onDate }, policy);
      return { use, place: key, verdict, findings };
    }),
  );
  return {
    cells,
    assumed: [
      `sound rock of ${ROCK_MPA} MPa`,
      embedmentMm === null ? "the depth is not known" : `set ${embedmentMm} mm deep`,
      "placed new on the date asked for",
      "one bolt carries all",
    ],
  };
}

/** The type as a bolt set on that day, as deep as the standard wants and by the first method it allows. */
export function placedNew(type: CatalogueType, onDate: string): WhatIfBolt {
  return {
    ...type,
    embedmentMm: depthOf(type),
    method: type.allowedMethods[0] ?? null,
    installedOn: onDate,
    installedOnPrecision: "day",
  };
}

/** The depth the standard wants, or the length of a type that cannot reach it; null: neither is known. */
function depthOf(type: CatalogueType): number | null {
  const glued =
    type.form === "glued_bent_rod" || type.form === "glued_eye" || type.form === "glued_stud_hanger";
  const holeMm = type.holeDiameterMm ?? type.shankDiameterMm ?? null;
  const floorMm = glued ? GLUED_DEPTH_MM : holeMm === null ? null : MECHANICAL_DEPTHS * holeMm;
  if (floorMm === null || type.lengthMm === null) return floorMm ?? type.lengthMm;
  return Math.min(floorMm, type.lengthMm);
}

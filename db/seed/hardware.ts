import { ADHESIVES, type AdhesiveKey } from "@/db/seed/catalogue/adhesives";
import { boltType, type TypeKey } from "@/db/seed/catalogue/bolt-types";
import type { Past } from "@/db/seed/dates";
import type { Random } from "@/db/seed/random";
import type { BoltSpec } from "@/db/seed/spec";

export interface InstallOptions {
  /** One of the demo's accounts, or a name as it is remembered. */
  by?: "bolter" | "steward" | { remembered: string };
  glue?: AdhesiveKey;
  facts?: BoltSpec["facts"];
}

/** Torque of wedge bolts by shank diameter, N m: the middle of makers' tables. */
const TORQUE_NM: Readonly<Record<number, number>> = { 8: 15, 10: 38, 12: 55, 16: 100 };

/** A bolt with everything a careful person writes down on the day. */
export function installed(random: Random, type: TypeKey, when: Past, options: InstallOptions = {}): BoltSpec {
  const known = boltType(type);
  const glued = known.form.startsWith("glued");
  const hole = known.holeDiameterMm ?? 12;
  const common: BoltSpec["facts"] = {
    embedmentMm: glued ? (known.lengthMm ?? 100) - 5 : roomFor(known.form, known.lengthMm ?? 90, hole),
    claimedStandard: known.standard ?? null,
    batch: `${String.fromCharCode(65 + random.whole(0, 5))}${when.on.slice(2, 4)}-${random.whole(101, 499)}`,
    magnetic: known.boltMetal === "1.4462" || known.boltMetal === "zinc-plated" ? true : null,
    rustGrade: 0,
  };
  const rockTempC = random.whole(8, 21);
  const held: BoltSpec["facts"] = glued
    ? { ...glueFacts(random, options.glue ?? "slowEpoxy", when), glueTempC: rockTempC + 3, rockTempC }
    : {
        method: "mechanical",
        holeCleaning: "blown",
        torqueNm: TORQUE_NM[known.shankDiameterMm ?? 10] ?? null,
        witnessMark: random.chance(0.6),
      };
  const by = options.by ?? "bolter";
  return {
    type,
    when,
    ...(glued ? { glue: options.glue ?? "slowEpoxy" } : {}),
    ...(typeof by === "string" ? { hand: by } : {}),
    facts: {
      ...common,
      ...held,
      ...(typeof by === "string" ? {} : { installedBy: by.remembered }),
      ...options.facts,
    },
  };
}

/** A bolt of which little is on record. */
export function found(type: TypeKey | null, when: Past | null, facts: BoltSpec["facts"] = {}): BoltSpec {
  return { type, when, facts };
}

/** The same bolt, taken out. */
export function removed(bolt: BoltSpec, on: Past, why: string, by = "Tarrow bolter"): BoltSpec {
  return { ...bolt, facts: { ...bolt.facts, removedOn: on.on, removedBy: by, removedWhy: why } };
}

function glueFacts(random: Random, glue: AdhesiveKey, when: Past): BoltSpec["facts"] {
  const { kind } = ADHESIVES[glue];
  const year = when.on.slice(0, 4);
  return {
    method: kind,
    adhesiveBatch: `${kind.slice(0, 1).toUpperCase()}E-${year.slice(2)}${String(random.whole(1, 12)).padStart(2, "0")}`,
    adhesiveExpiresOn: `${Number(year) + 1}-${String(random.whole(1, 12)).padStart(2, "0")}-28`,
    holeCleaning: "brushed_and_blown",
  };
}

/** Depth that counts: from the tip of the clip for studs, the thread for screws, the sleeve for sleeves. */
function roomFor(form: string, lengthMm: number, holeMm: number): number {
  if (form === "screw_hanger") return lengthMm - 15;
  if (form === "sleeve_hanger") return lengthMm - (lengthMm > 50 ? 10 : 2);
  return Math.max(lengthMm - 30, 5 * holeMm);
}

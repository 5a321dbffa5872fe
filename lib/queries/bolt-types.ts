import "server-only";
import { getDb } from "@/db/client";
import { listAdhesiveRows, listTypeRows } from "@/db/repositories/catalogue-read";
import { catalogueMatrix } from "@/lib/domain/catalogue/catalogue-matrix";
import { placeKinds } from "@/lib/domain/catalogue/place-kinds";
import { CAUTION, ENGINE_VERSION } from "@/lib/domain/finding/engine";
import { DEFAULT_POLICY } from "@/lib/domain/policy";
import { audience } from "@/lib/policy/audience";
import { type BoltTypeView, boltTypeView, type TypeMatrix } from "@/lib/schemas/views/register";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

/** The catalogue. */
export async function listBoltTypes(actor: Actor): Promise<BoltTypeView[]> {
  const rows = await listTypeRows(getDb(), audience(actor));
  return rows.map((row) => boltTypeView.parse(row));
}

/** @throws AppError `not_found`. */
export async function getBoltType(actor: Actor, id: string): Promise<BoltTypeView> {
  const [row] = await listTypeRows(getDb(), audience(actor), id);
  if (!row) throw new AppError("not_found", "There is no such type in the catalogue.");
  return boltTypeView.parse(row);
}

/** The verdict on a type for every use and kind of place, under the built-in policy. */
export function typeMatrix(type: BoltTypeView, onDate: string): TypeMatrix {
  const matrix = catalogueMatrix(
    { ...type, metal: type.boltMetal, bendOnsetKn: type.bendOnsetLowKn },
    DEFAULT_POLICY,
    onDate,
  );
  return {
    places: placeKinds.map(({ key, label }) => ({ key, label })),
    cells: matrix.cells.map((cell) => ({
      ...cell,
      findings: cell.findings.map((finding) => ({
        ...finding,
        numbers: { ...finding.numbers },
        assumed: [...finding.assumed],
      })),
    })),
    assumed: [...matrix.assumed],
    onDate,
    engine: ENGINE_VERSION,
    caution: CAUTION,
  };
}

export interface AdhesiveChoice {
  id: string;
  name: string;
  kind: "epoxy" | "vinylester" | "polyester";
  cureSteps: { minTempC: number; workMin: number; cureMin: number }[];
  sourceNote: string;
}

/** Adhesives for the install form. */
export async function listAdhesives(): Promise<AdhesiveChoice[]> {
  const rows = await listAdhesiveRows(getDb());
  return rows.map(({ id, name, kind, cureSteps, sourceNote }) => ({ id, name, kind, cureSteps, sourceNote }));
}

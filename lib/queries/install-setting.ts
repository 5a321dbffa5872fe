import "server-only";
import { FORM_LABELS } from "@/lib/domain/labels";
import { can } from "@/lib/policy/can";
import { listAdhesives, listBoltTypes } from "@/lib/queries/bolt-types";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import type { Actor } from "@/lib/shared/actor";

/** Everything the install form chooses from; null: the actor may look but not install. @throws AppError `not_found`. */
export async function getInstallSetting(actor: Actor, code: string) {
  const sheet = await getAnchorSheet(actor, { code });
  if (!can(actor, "bolt.install", { areaId: sheet.area.id })) return null;
  const [types, glues] = await Promise.all([listBoltTypes(actor), listAdhesives()]);
  const holes = sheet.placements.filter(({ kind }) => kind === "bolt");
  return {
    sheet,
    anchor: {
      id: sheet.id,
      code: sheet.code,
      label: `${sheet.label}, ${sheet.site.name}`,
      uses: sheet.uses,
      isRow: sheet.rowName !== null,
      nextNumber: Math.max(0, ...sheet.placements.map(({ number }) => number)) + 1,
      placements: holes.map(({ id, number, bolt }) => ({
        id,
        number,
        label: `${number} · ${bolt ? `replaces ${bolt.typeName ?? FORM_LABELS[bolt.form]}` : "empty hole"}`,
        hasBolt: bolt !== null,
      })),
    },
    types: types.map(
      ({
        id,
        name,
        form,
        allowedMethods,
        ratedRadialKn,
        ratedAxialKn,
        bendOnsetLowKn,
        bendOnsetBasis,
        holeDiameterMm,
        status,
      }) => ({
        id,
        name,
        form,
        methods: allowedMethods,
        ratedRadialKn,
        ratedAxialKn,
        bendOnsetLowKn,
        bendOnsetBasis,
        holeDiameterMm,
        discontinued: status === "discontinued",
      }),
    ),
    glues,
  };
}

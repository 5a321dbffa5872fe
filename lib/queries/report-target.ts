import "server-only";
import { FORM_LABELS, PLACEMENT_KIND_LABELS, sentence } from "@/lib/domain/labels";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import type { Actor } from "@/lib/shared/actor";

export interface ReportTarget {
  anchorId: string;
  anchorCode: string;
  anchorLabel: string;
  placements: { id: string; number: number; label: string }[];
  placementId: string | null;
}

/** What a report can be about on one anchor. @throws AppError `not_found`. */
export async function getReportTarget(
  actor: Actor,
  code: string,
  placement: string | undefined,
): Promise<ReportTarget> {
  const sheet = await getAnchorSheet(actor, { code });
  const placements = sheet.placements.map(({ id, number, kind, bolt }) => ({
    id,
    number,
    label: `${number} · ${bolt ? (bolt.typeName ?? FORM_LABELS[bolt.form]) : sentence(PLACEMENT_KIND_LABELS[kind])}`,
  }));
  return {
    anchorId: sheet.id,
    anchorCode: sheet.code,
    anchorLabel: `${sheet.label}, ${sheet.site.name}`,
    placements,
    placementId: placements.find(({ number }) => String(number) === placement)?.id ?? null,
  };
}

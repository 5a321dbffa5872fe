import sharp from "sharp";
import { v7 } from "uuid";
import { later } from "@/tests/support/people";
import type { Register } from "@/tests/support/register";

/** The first of a list that has one. */
export function first<T>(list: readonly T[]): T {
  const [one] = list;
  if (one === undefined) throw new Error("The list is empty.");
  return one;
}

/** A replacement in the first hole of the anchor, set two hours ago. */
export function installOf(r: Register, more: Record<string, unknown> = {}) {
  return {
    id: v7(),
    anchorId: r.anchor.id,
    placementId: first(r.anchor.placementIds),
    boltTypeId: r.typeId,
    method: "epoxy",
    adhesiveId: r.adhesiveId,
    installedOn: "2026-06-01",
    installedAt: later(-120).toISOString(),
    glueTempC: 21,
    rockTempC: 12,
    embedmentMm: 100,
    ...more,
  };
}

/** A rust report on the first bolt; `more` makes another of it. */
export function reportOf(r: Register, more: Record<string, unknown>) {
  return {
    id: v7(),
    anchorId: r.anchor.id,
    placementId: first(r.anchor.placementIds),
    kind: "corrosion",
    depth: "seen",
    observedAt: later(-30).toISOString(),
    measured: { rustGrade: 2 },
    ...more,
  };
}

/** A picture of a few hundred bytes. */
export function smallJpeg(): Promise<Uint8Array> {
  return sharp({ create: { width: 40, height: 30, channels: 3, background: "#886644" } })
    .jpeg()
    .toBuffer();
}

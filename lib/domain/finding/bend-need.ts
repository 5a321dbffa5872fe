import type { BoltEvidence } from "@/lib/domain/finding/evidence";
import type { LoadCase, Loads } from "@/lib/domain/finding/loads";
import { onBolt } from "@/lib/domain/finding/loads";
import { isSerious } from "@/lib/domain/finding/traits";
import { atLeastKn, ratio } from "@/lib/domain/finding/words";

/**
 * Least radial bend onset any bolt should have, kN (common practice): below it ordinary use bends the bolt.
 */
export const LEAST_ONSET_KN = 3;
/** Margin a serious use wants between the peak and bend onset (common practice). */
export const SERIOUS_MARGIN = 1.5;

/** A load case together with the factor by which it must stay under bend onset for nothing to be said. */
export interface BendNeed {
  load: LoadCase;
  factor: number;
}

/**
 * What a bend onset is held against. Serious uses: the peak with margin (and the plain working case for rope
 * access). Others: working case and peaks, except peaks that are about the breaking strength only.
 */
export function bendNeeds(e: BoltEvidence, loads: Loads): readonly BendNeed[] {
  if (isSerious(e.use)) {
    const [peak] = loads.peaks;
    return peak === undefined
      ? []
      : [
          { load: peak, factor: SERIOUS_MARGIN },
          { load: loads.working, factor: 1 },
        ];
  }
  const peaks = loads.peaks.filter((load) => !load.strengthOnly);
  return [loads.working, ...peaks].map((load) => ({ load, factor: 1 }));
}

/**
 * Linear interaction of a case on one bolt with a bend onset: 1 is the onset. A part not known does not
 * count.
 */
export function bendUse(
  load: LoadCase,
  share: number,
  onset: { radialKn: number; axialKn: number | null },
): number {
  const { axialKn, radialKn } = onBolt(load, share);
  return ratio(radialKn, onset.radialKn) + (onset.axialKn === null ? 0 : ratio(axialKn, onset.axialKn));
}

/**
 * The least radial bend onset at which nothing would be said, kN; null when no radial onset helps, because
 * the pull along the axis alone is too much.
 */
function neededOnsetKn(e: BoltEvidence, loads: Loads, axialOnsetKn: number | null): number | null {
  let needed = isSerious(e.use) ? 0 : LEAST_ONSET_KN;
  for (const { load, factor } of bendNeeds(e, loads)) {
    const { axialKn, radialKn } = onBolt(load, 1);
    const left = 1 / factor - (axialOnsetKn === null ? 0 : ratio(axialKn, axialOnsetKn));
    if (left <= 0) return null;
    needed = Math.max(needed, radialKn / left);
  }
  return needed;
}

/** "a bolt with a bend onset of at least 18.0 kN", or its axial sister when no radial onset would do. */
export function neededOnsetInWords(e: BoltEvidence, loads: Loads, axialOnsetKn: number | null): string {
  const needed = neededOnsetKn(e, loads, axialOnsetKn);
  return needed === null
    ? "a bolt that takes more along its axis before it bends"
    : `a bolt with a bend onset of at least ${atLeastKn(needed)}`;
}

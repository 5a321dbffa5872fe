import type { BoltFacts } from "@/lib/domain/finding/evidence";

/** One metal part of a bolt. */
export interface MetalPart {
  part: "bolt" | "hanger" | "link";
  metal: string;
}

/** The parts whose metal is on record. */
export function metalParts(bolt: BoltFacts): readonly MetalPart[] {
  const parts = [
    { part: "bolt", metal: bolt.metal },
    { part: "hanger", metal: bolt.hangerMetal },
    { part: "link", metal: bolt.linkMetal },
  ] as const;
  return parts.flatMap(({ part, metal }) => (metal === null ? [] : [{ part, metal }]));
}

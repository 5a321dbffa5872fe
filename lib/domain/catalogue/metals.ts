import { classOf, isOneOf, PLATED, TITANIUM } from "@/lib/engineering";
import type { SourceMark } from "@/lib/domain/vocabulary";

/** Metals that do not mind touching each other. */
export type MetalFamily = "stainless" | "titanium" | "plated";

/** Least strength of bar or rod, MPa, with where it is written. */
export interface MetalStrength {
  yieldMpa: number;
  ultimateMpa: number;
  source: { mark: SourceMark; name: string };
}

const EN_10088 = { mark: "from_memory", name: "EN 10088-3, bar, Rp0.2 and Rm minimum" } as const;
const B348 = { mark: "published", name: "ASTM B348" } as const;
const B348_MEMORY = { mark: "from_memory", name: "ASTM B348" } as const;

/**
 * Strength of the metals the register has a figure for. A grade that is absent has no figure here, and no
 * estimate is made for it. Where a range is quoted, its low end.
 */
const STRENGTHS: Readonly<Record<string, MetalStrength>> = {
  "1.4301": { yieldMpa: 190, ultimateMpa: 500, source: EN_10088 },
  "1.4307": { yieldMpa: 175, ultimateMpa: 500, source: EN_10088 },
  "1.4401": { yieldMpa: 200, ultimateMpa: 500, source: EN_10088 },
  "1.4404": { yieldMpa: 200, ultimateMpa: 500, source: EN_10088 },
  "1.4571": { yieldMpa: 200, ultimateMpa: 500, source: EN_10088 },
  "1.4462": { yieldMpa: 450, ultimateMpa: 650, source: EN_10088 },
  "1.4539": { yieldMpa: 230, ultimateMpa: 530, source: EN_10088 },
  "1.4529": { yieldMpa: 280, ultimateMpa: 650, source: EN_10088 },
  "1.4547": { yieldMpa: 300, ultimateMpa: 650, source: EN_10088 },
  "1.4565": { yieldMpa: 420, ultimateMpa: 800, source: EN_10088 },
  "ti-1": { yieldMpa: 138, ultimateMpa: 240, source: B348_MEMORY },
  "ti-2": { yieldMpa: 275, ultimateMpa: 345, source: B348 },
  "ti-3": { yieldMpa: 380, ultimateMpa: 450, source: B348_MEMORY },
  "ti-4": { yieldMpa: 483, ultimateMpa: 550, source: B348_MEMORY },
  "ti-5": { yieldMpa: 828, ultimateMpa: 895, source: B348 },
};

/** The designations a form offers, mildest place first; anything else is "not known" to the rules. */
export const METALS = [
  "zinc-plated",
  "hot-dip-galvanised",
  "1.4016",
  "1.4301",
  "1.4307",
  "1.4401",
  "1.4404",
  "1.4571",
  "1.4462",
  "1.4539",
  "1.4529",
  "1.4547",
  "1.4565",
  "ti-1",
  "ti-2",
  "ti-3",
  "ti-4",
  "ti-5",
] as const;

/** The family of a metal; null: not recorded, or not in any table. */
export function familyOf(metal: string | null): MetalFamily | null {
  if (metal === null) return null;
  if (isOneOf(PLATED, metal)) return "plated";
  if (isOneOf(TITANIUM, metal)) return "titanium";
  return classOf(metal) === null ? null : "stainless";
}

/** Least strength of a metal; null: no figure is known. */
export function strengthOf(metal: string | null): MetalStrength | null {
  return metal === null ? null : (STRENGTHS[metal] ?? null);
}

/** How people write a metal: "1.4404", "titanium grade 2", "zinc-plated steel". */
export function metalName(metal: string | null): string {
  if (metal === null) return "metal not known";
  if (isOneOf(TITANIUM, metal)) return `titanium grade ${metal.slice(3)}`;
  if (metal === "zinc-plated") return "zinc-plated steel";
  if (metal === "hot-dip-galvanised") return "hot-dip galvanised steel";
  return metal;
}

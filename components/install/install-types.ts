import type { FaceInput } from "@/components/anchor/face-input";
import type { CureRow } from "@/lib/engineering";
import type { Form, Method, OnsetBasis, Use } from "@/lib/domain/vocabulary";

/** What the install form is given: flat, prepared by the page. */
export interface InstallAnchor {
  id: string;
  code: string;
  label: string;
  uses: readonly Use[];
  face: FaceInput;
  isRow: boolean;
  nextNumber: number;
  placements: readonly { id: string; number: number; label: string; hasBolt: boolean }[];
}

export interface TypeChoice {
  id: string;
  name: string;
  form: Form;
  methods: readonly Method[];
  ratedRadialKn: number | null;
  ratedAxialKn: number | null;
  bendOnsetLowKn: number | null;
  bendOnsetBasis: OnsetBasis;
  holeDiameterMm: number | null;
  discontinued: boolean;
}

export interface GlueChoice {
  id: string;
  name: string;
  kind: "epoxy" | "vinylester" | "polyester";
  cureSteps: readonly CureRow[];
  sourceNote: string;
}

/** Values kept from a draft, by field name. */
export type Kept = Readonly<Record<string, string>>;
export type ErrorOf = (path: string) => string | undefined;

export function isGlued(method: Method | null): boolean {
  return method !== null && method !== "mechanical";
}

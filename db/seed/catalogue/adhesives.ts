import type { adhesives } from "@/db/schema";

type Adhesive = Omit<typeof adhesives.$inferInsert, "id">;

const ILLUSTRATIVE = "Illustrative figures of the demo. Use the table on the maker's cartridge.";

/** Glues by kind. The cure tables look like real ones and are not: marked so wherever they are shown. */
export const ADHESIVES = {
  slowEpoxy: {
    name: "Pure epoxy, slow",
    kind: "epoxy",
    bondMpa: 12,
    cureSteps: [
      { minTempC: 5, workMin: 120, cureMin: 2_880 },
      { minTempC: 10, workMin: 60, cureMin: 1_440 },
      { minTempC: 20, workMin: 30, cureMin: 720 },
      { minTempC: 30, workMin: 15, cureMin: 360 },
    ],
    cartridgeMl: 385,
    sourceNote: ILLUSTRATIVE,
  },
  fastEpoxy: {
    name: "Pure epoxy, fast",
    kind: "epoxy",
    bondMpa: 11,
    cureSteps: [
      { minTempC: 0, workMin: 90, cureMin: 2_160 },
      { minTempC: 5, workMin: 45, cureMin: 960 },
      { minTempC: 15, workMin: 20, cureMin: 480 },
      { minTempC: 25, workMin: 10, cureMin: 240 },
    ],
    cartridgeMl: 440,
    sourceNote: ILLUSTRATIVE,
  },
  vinylester: {
    name: "Vinylester, styrene-free",
    kind: "vinylester",
    bondMpa: 10,
    cureSteps: [
      { minTempC: -5, workMin: 90, cureMin: 360 },
      { minTempC: 5, workMin: 25, cureMin: 120 },
      { minTempC: 10, workMin: 15, cureMin: 80 },
      { minTempC: 20, workMin: 6, cureMin: 45 },
      { minTempC: 30, workMin: 4, cureMin: 25 },
    ],
    cartridgeMl: 300,
    sourceNote: ILLUSTRATIVE,
  },
  vinylesterCapsule: {
    name: "Vinylester in a glass capsule",
    kind: "vinylester",
    bondMpa: 9,
    cureSteps: [
      { minTempC: 0, workMin: 1, cureMin: 300 },
      { minTempC: 10, workMin: 1, cureMin: 60 },
      { minTempC: 20, workMin: 1, cureMin: 20 },
    ],
    cartridgeMl: 10,
    sourceNote: ILLUSTRATIVE,
  },
  polyester: {
    name: "Polyester, grey",
    kind: "polyester",
    bondMpa: 7,
    cureSteps: [
      { minTempC: 5, workMin: 18, cureMin: 120 },
      { minTempC: 15, workMin: 7, cureMin: 60 },
      { minTempC: 25, workMin: 4, cureMin: 30 },
    ],
    cartridgeMl: 300,
    sourceNote: ILLUSTRATIVE,
  },
} as const satisfies Record<string, Adhesive>;

export type AdhesiveKey = keyof typeof ADHESIVES;

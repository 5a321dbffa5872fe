import type { webbings } from "@/db/schema";

type Webbing = Omit<typeof webbings.$inferInsert, "id">;

const ILLUSTRATIVE =
  "Illustrative figures of the demo, typical of the kind. Use the maker's sheet of your own webbing.";

/** Generic webbings; stretch rises a little less than in step with load, as measured curves do. */
export const WEBBINGS = {
  nylonSoft: {
    name: "25 mm tubular polyamide, soft",
    massGPerM: 42,
    widthMm: 25,
    stretch: stretch(2, 5.2, 9.2, 15.5, 21),
    strengthKn: 18,
    sourceNote: ILLUSTRATIVE,
  },
  polyester: {
    name: "25 mm flat polyester",
    massGPerM: 56,
    widthMm: 25,
    stretch: stretch(0.7, 1.5, 2.9, 5.4, 7.6),
    strengthKn: 30,
    sourceNote: ILLUSTRATIVE,
  },
  polyesterTube: {
    name: "26 mm tubular polyester",
    massGPerM: 64,
    widthMm: 26,
    stretch: stretch(0.9, 1.9, 3.6, 6.6, 9.4),
    strengthKn: 32,
    sourceNote: ILLUSTRATIVE,
  },
  blend: {
    name: "25 mm flat polyamide and polyester",
    massGPerM: 52,
    widthMm: 25,
    stretch: stretch(1.4, 3, 5.6, 9.8, 13.4),
    strengthKn: 26,
    sourceNote: ILLUSTRATIVE,
  },
  polyethylene: {
    name: "20 mm flat high-modulus polyethylene",
    massGPerM: 27,
    widthMm: 20,
    stretch: stretch(0.2, 0.4, 0.7, 1.3, 1.8),
    strengthKn: 45,
    sourceNote: ILLUSTRATIVE,
  },
} satisfies Record<string, Webbing>;

export type WebbingKey = keyof typeof WEBBINGS;

/** Percent at 1, 2, 4, 8 and 12 kN. */
function stretch(...percents: readonly [number, number, number, number, number]): Webbing["stretch"] {
  const [at1, at2, at4, at8, at12] = percents;
  return [
    { loadKn: 0, stretchPercent: 0 },
    { loadKn: 1, stretchPercent: at1 },
    { loadKn: 2, stretchPercent: at2 },
    { loadKn: 4, stretchPercent: at4 },
    { loadKn: 8, stretchPercent: at8 },
    { loadKn: 12, stretchPercent: at12 },
  ];
}

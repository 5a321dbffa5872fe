import { describe, expect, it } from "vitest";
import { buildFaceDrawing } from "@/components/anchor/face-drawing-model";
import type { FaceInput, FacePlacement } from "@/components/anchor/face-input";
import type { DrawnPlacement } from "@/components/anchor/face-primitives";
import { faceTwin } from "@/components/anchor/face-twin-words";

const eye = { form: "glued_eye", condition: "in_service", words: "12 mm forged eye, 1.4462" } as const;

const placement = (
  number: number,
  at: readonly [number, number] | null,
  more: Partial<FacePlacement> = {},
): FacePlacement => ({
  number,
  kind: "bolt",
  role: "main",
  xMm: at?.[0] ?? null,
  yMm: at?.[1] ?? null,
  bolt: eye,
  deadHoles: [],
  rockBodyId: null,
  sizeMm: null,
  ...more,
});

const face = (more: Partial<FaceInput>): FaceInput => ({
  placements: [],
  masterpoint: null,
  rigging: null,
  edges: [],
  rockBodies: [],
  faceAzimuthDeg: 180,
  faceDipDeg: 90,
  designAzimuthDeg: null,
  designElevationDeg: null,
  reasons: [],
  isRow: false,
  ...more,
});

const three = [placement(1, [0, 0]), placement(2, [600, 150]), placement(3, [1200, 0])];

function drawn(placements: readonly DrawnPlacement[], number: number): DrawnPlacement {
  const found = placements.find((entry) => entry.number === number);
  if (!found) throw new Error(`placement ${number} is not drawn`);
  return found;
}

describe("a drawing to scale", () => {
  const drawing = buildFaceDrawing(face({ placements: three }));
  const [one, two, last] = [1, 2, 3].map((number) => drawn(drawing.placements, number));

  it("puts x to the right and y up, looking at the rock", () => {
    expect(two?.x).toBeGreaterThan(one?.x ?? Infinity);
    expect(two?.y).toBeLessThan(one?.y ?? -Infinity);
  });

  it("uses one scale for both directions", () => {
    const perMmAcross = ((last?.x ?? 0) - (one?.x ?? 0)) / 1200;
    const perMmUp = ((one?.y ?? 0) - (two?.y ?? 0)) / 150;
    expect(perMmUp).toBeCloseTo(perMmAcross, 9);
  });

  it("has a scale bar as long as it says", () => {
    const perMm = ((last?.x ?? 0) - (one?.x ?? 0)) / 1200;
    const mm = Number(drawing.scaleBar?.label.match(/^\d+(?=\u202fmm)/)?.[0]);
    expect((drawing.scaleBar?.length ?? 0) / perMm).toBeCloseTo(mm, 6);
  });

  it("writes the distances between neighbouring main placements in mm", () => {
    expect(drawing.dimensions.map((dimension) => dimension.label)).toEqual(["600", "600"]);
  });

  it("keeps everything inside the frame, also what lies far out", () => {
    const far = buildFaceDrawing(
      face({
        placements: [...three, placement(4, [1700, 2900], { kind: "thread", bolt: null, role: "backup" })],
        masterpoint: { xMm: 600, yMm: -1500 },
        edges: [
          {
            label: "Lip",
            sharpness: "sharp",
            paddingNeeded: true,
            x1Mm: -500,
            y1Mm: -2900,
            x2Mm: 1900,
            y2Mm: -2780,
          },
        ],
      }),
    );
    const points = [...far.placements, ...far.edges.flatMap(({ from, to }) => [from, to])];
    expect(points.filter(({ x, y }) => x < 8 || x > far.width - 8 || y < 8 || y > far.height - 8)).toEqual(
      [],
    );
    expect(far.edges[0]?.rockSide.y).toBeLessThan(0);
  });

  it("sets a placement nobody has measured aside and says so, instead of guessing where it is", () => {
    const mixed = buildFaceDrawing(face({ placements: [...three, placement(4, null)] }));
    expect(mixed.kind).toBe("scaled");
    expect(mixed.setAside).not.toBeNull();
    expect(drawn(mixed.placements, 4).y).toBeGreaterThan(mixed.setAside?.at.y ?? Infinity);
    expect(mixed.notes.join(" ")).toContain("Not measured, set aside: 4.");
  });

  it("draws legs to main and backup placements, none to gear at an edge and none to a bolt that is gone", () => {
    const gone = { ...eye, condition: "removed" } as const;
    const rigged = buildFaceDrawing(
      face({
        placements: [
          placement(1, [0, 0]),
          placement(2, [600, 0], { bolt: gone }),
          placement(3, [300, 900], { role: "backup" }),
          placement(4, [300, -900], { role: "edge" }),
        ],
        masterpoint: { xMm: 300, yMm: -1200 },
      }),
    );
    expect(rigged.legs.map(({ role }) => role)).toEqual(["main", "backup"]);
  });

  it("draws round a hollow flake what sits in it, and nothing round the cliff itself", () => {
    const inside = { rockBodyId: "flake" };
    const bodies = [
      { id: "flake", label: "Flake", attachment: "hollow" },
      { id: "wall", label: "Wall", attachment: "attached" },
    ] as const;
    const drawing = buildFaceDrawing(
      face({
        placements: [
          placement(1, [0, 0], inside),
          placement(2, [400, 0], inside),
          placement(3, [1200, 0], { rockBodyId: "wall" }),
        ],
        rockBodies: bodies,
      }),
    );
    expect(drawing.bodies.map(({ label }) => label)).toEqual(["Flake (hollow)"]);
    const flake = drawing.bodies[0];
    expect(drawn(drawing.placements, 2).x).toBeLessThan((flake?.at.x ?? 0) + (flake?.width ?? 0));
    expect(drawn(drawing.placements, 3).x).toBeGreaterThan((flake?.at.x ?? 0) + (flake?.width ?? 0));
  });
});

describe("the design load", () => {
  const loaded = (azimuth: number, elevation: number, dip = 90) =>
    buildFaceDrawing(
      face({
        placements: three,
        masterpoint: { xMm: 600, yMm: -800 },
        designAzimuthDeg: azimuth,
        designElevationDeg: elevation,
        faceDipDeg: dip,
      }),
    ).load;

  it("points right when the line leaves to the east of a wall that looks south", () => {
    const load = loaded(90, 0);
    if (!load || "out" in load) throw new Error("no arrow");
    expect(load.to.x - load.from.x).toBeGreaterThan(50);
    expect(load.to.y).toBeCloseTo(load.from.y, 6);
  });

  it("is a ring with a dot when it comes straight out of the rock", () => {
    expect(loaded(180, 0)).toMatchObject({ out: true });
  });

  it("points down a slab when the line leaves the way the slab falls", () => {
    const load = loaded(180, -3, 14);
    if (!load || "out" in load) throw new Error("no arrow");
    expect(load.to.y - load.from.y).toBeGreaterThan(50);
  });

  it("is left out, with a word, when the way the face looks is not recorded", () => {
    const drawing = buildFaceDrawing(face({ placements: three, designAzimuthDeg: 90, faceAzimuthDeg: null }));
    expect(drawing.load).toBeNull();
    expect(drawing.notes.join(" ")).toContain("design load is not drawn");
  });
});

describe("without measurements", () => {
  it("is a scheme that says it is not to scale and has no scale bar", () => {
    const drawing = buildFaceDrawing(face({ placements: [placement(1, null), placement(2, null)] }));
    expect(drawing.kind).toBe("schematic");
    expect(drawing.scaleBar).toBeNull();
    expect(drawing.dimensions).toEqual([]);
    expect(drawing.notes[0]).toBe("Not to scale: positions are not measured.");
    expect(drawing.placements).toHaveLength(2);
  });

  it("is a scheme too when only the origin is known beside others", () => {
    expect(buildFaceDrawing(face({ placements: [placement(1, [0, 0]), placement(2, null)] })).kind).toBe(
      "schematic",
    );
  });
});

describe("a row of protection bolts", () => {
  const row = Array.from({ length: 12 }, (_, index) =>
    placement(index + 1, [index % 2 ? 600 : -600, index * 2200]),
  );
  const drawing = buildFaceDrawing(face({ placements: row, isRow: true }));

  it("keeps neighbours far enough apart to be read", () => {
    const ys = drawing.placements.map(({ y }) => y).sort((a, b) => a - b);
    const gaps = ys.slice(1).map((y, index) => y - (ys[index] ?? y));
    expect(Math.min(...gaps)).toBeGreaterThanOrEqual(28);
  });

  it("says how high each bolt is above the first", () => {
    expect(drawn(drawing.placements, 2).tag).toBe("+2.2\u202fm");
    expect(drawn(drawing.placements, 1).tag).toBe("0.0\u202fm");
  });
});

describe("numbers of reasons", () => {
  const reasons = Array.from({ length: 9 }, (_, index) => ({
    number: index + 1,
    level: "limit" as const,
    placementNumber: index < 8 ? 2 : null,
  }));
  const drawing = buildFaceDrawing(face({ placements: three, reasons }));

  it("stand at their placement; what finds no room is counted, not dropped", () => {
    const two = drawn(drawing.placements, 2);
    expect(two.balloons.map(({ number }) => number)).toEqual([1, 2, 3, 4, 5, 6]);
    expect(two.moreReasons).toBe(2);
  });

  it("stand in the corner when they are about the whole anchor", () => {
    expect(drawing.anchorBalloons.map(({ number }) => number)).toEqual([9]);
  });

  it("never lie on top of each other", () => {
    const { balloons } = drawn(drawing.placements, 2);
    const distances = balloons.flatMap((a, i) =>
      balloons.slice(i + 1).map((b) => Math.hypot(a.x - b.x, a.y - b.y)),
    );
    expect(Math.min(...distances)).toBeGreaterThanOrEqual(19);
  });
});

describe("the list in words", () => {
  it("says everything that is drawn", () => {
    const lines = faceTwin(
      face({
        placements: [
          placement(1, [0, 0]),
          placement(2, [610, -140], { bolt: { ...eye, condition: "out_of_use" } }),
          placement(3, null, { kind: "tree", role: "backup", bolt: null, sizeMm: 340 }),
        ],
        masterpoint: { xMm: 300, yMm: -1500 },
        reasons: [{ number: 1, level: "stop", placementNumber: 2 }],
      }),
    );
    expect(lines.map(({ name }) => name)).toEqual(["bolt 1", "bolt 2", "tree 3", "masterpoint", "view"]);
    expect(lines[1]?.words).toBe(
      "main; 12 mm forged eye, 1.4462; out of use; 610\u202fmm right, 140\u202fmm below; reasons 1.",
    );
    expect(lines[2]?.words).toBe("backup; position not measured; 340\u202fmm across.");
  });
});

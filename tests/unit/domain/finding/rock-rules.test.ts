import { describe, expect, it } from "vitest";
import type { BoltFacts, GroupFacts, PlacementFacts } from "@/lib/domain/finding/evidence";
import { rockOneBody } from "@/lib/domain/finding/rules/rock-one-body";
import type { Attachment, Use } from "@/lib/domain/vocabulary";
import { anchor, BENT_ROD, found, group, inRock, levelOf, placement } from "@/tests/support/evidence";

describe("rock.embedment", () => {
  const level = (bolt: Partial<BoltFacts>, ucsMpa: number | null = 120, use: Use = "protection") =>
    levelOf(inRock(use, { bolt, rock: { ucsMpa } }), "rock.embedment");
  const glued = (embedmentMm: number | null): Partial<BoltFacts> => ({ ...BENT_ROD, embedmentMm });

  // EN 959:2018, 4.2.6: glued length at least 70 mm, mechanical at least 5 hole diameters. Stop under 70 %
  // of it: common practice.
  it.each([
    [48.9, "stop"],
    [49, "limit"],
    [69.9, "limit"],
    [70, null],
  ])("glued %d mm deep in hard rock: %s", (embedmentMm, expected) => {
    expect(level(glued(embedmentMm))).toBe(expected);
  });

  it.each([
    [34.9, "stop"],
    [35, "limit"],
    [49.9, "limit"],
    [50, null],
  ])("mechanical %d mm deep in a 10 mm hole: %s", (embedmentMm, expected) => {
    expect(level({ embedmentMm })).toBe(expected);
    expect(level({ embedmentMm, holeDiameterMm: null })).toBe(expected);
  });

  // Depth by rock strength, lower ends (common practice): 5-25 MPa 120 mm, 25-50 MPa 90 mm.
  it.each([
    [24.9, 119.9, "limit"],
    [24.9, 120, null],
    [25, 89.9, "note"],
    [25, 90, null],
    [49.9, 89.9, "note"],
    [50, 70, null],
  ])("in rock of %d MPa, glued %d mm deep: %s", (ucsMpa, embedmentMm, expected) => {
    expect(level(glued(embedmentMm), ucsMpa)).toBe(expected);
  });

  it("asks for a depth that is not recorded where people hang or belay, and notes it elsewhere", () => {
    expect(level(glued(null), 120, "highline")).toBe("ask");
    expect(level(glued(null), 120, "rope_access")).toBe("ask");
    expect(level(glued(null), 120, "belay")).toBe("ask");
    expect(level(glued(null), 120, "protection")).toBe("note");
  });

  it("does not pass a mechanical bolt whose diameter is not recorded and could be too large", () => {
    const unsized = { holeDiameterMm: null, shankDiameterMm: null };
    expect(level({ ...unsized, embedmentMm: 45 }, 120, "belay")).toBe("ask");
    expect(level({ ...unsized, embedmentMm: 45 })).toBe("note");
    expect(level({ ...unsized, embedmentMm: 60 }, 120, "belay")).toBeNull();
    expect(level({ ...unsized, embedmentMm: 20 })).toBe("stop");
  });

  it("holds a bolt both expanded and glued to the higher floor", () => {
    const both = { method: "mechanical_and_glue", holeDiameterMm: 16 } as const;
    expect(level({ ...both, embedmentMm: 79 })).toBe("limit");
    expect(level({ ...both, embedmentMm: 80 })).toBeNull();
  });
});

describe("rock.method", () => {
  const level = (bolt: Partial<BoltFacts>, ucsMpa: number | null, use: Use = "protection") =>
    levelOf(inRock(use, { bolt, rock: { ucsMpa } }), "rock.method");

  // ISRM grades: R0-R1 under 5 MPa, R2 to 25. 40 MPa for mechanical bolts: common practice.
  it.each([
    [4.9, "stop", "stop", "stop"],
    [5, "stop", "limit", null],
    [24.9, "stop", "limit", null],
    [25, "limit", "limit", null],
    [40, "limit", "limit", null],
    [40.1, null, null, null],
  ])("in rock of %d MPa: stud %s, screw %s, glued %s", (ucsMpa, stud, screw, glued) => {
    expect(level({ form: "expansion_stud_hanger" }, ucsMpa)).toBe(stud);
    expect(level({ form: "screw_hanger" }, ucsMpa)).toBe(screw);
    expect(level({ form: "sleeve_hanger" }, ucsMpa)).toBe(screw);
    expect(level({ ...BENT_ROD }, ucsMpa)).toBe(glued);
  });

  it("asks for the rock in serious uses and notes it elsewhere", () => {
    expect(level({}, null, "highline")).toBe("ask");
    expect(level({ ...BENT_ROD }, null, "rope_access")).toBe("ask");
    expect(level({}, null, "belay")).toBe("note");
  });
});

describe("rock.edge", () => {
  const level = (use: Use, over: Partial<PlacementFacts>, bolt: Partial<BoltFacts> = {}) =>
    levelOf(inRock(use, { bolt, placement: placement(over) }), "rock.edge");

  it.each<[Use, number, string | null]>([
    ["highline", 199, "stop"],
    ["highline", 200, "limit"],
    ["highline", 499, "limit"],
    ["highline", 500, null],
    ["rope_access", 199, "stop"],
    ["protection", 97.4, "limit"],
    ["protection", 97.5, null],
  ])("%s, edge at %d mm below: %s", (use, edgeDistanceMm, expected) => {
    expect(level(use, { edgeDistanceMm, edgeSide: "below" })).toBe(expected);
  });

  it("does not hold an edge above against a hanging load, but does against a highline", () => {
    expect(level("belay", { edgeDistanceMm: 50, edgeSide: "above" })).toBeNull();
    expect(level("highline", { edgeDistanceMm: 50, edgeSide: "above" })).toBe("stop");
  });

  it("takes an edge on a side that is not recorded for one it is pulled to", () => {
    expect(level("protection", { edgeDistanceMm: 50, edgeSide: null })).toBe("limit");
  });
});

describe("rock.spacing", () => {
  const pair = (apartMm: number, over: Partial<GroupFacts> = {}) =>
    group({
      mainCount: 2,
      placements: [
        placement({ xMm: 0, yMm: 0 }),
        placement({ placementId: "p2", number: 2, xMm: apartMm, yMm: 0 }),
      ],
      ...over,
    });
  const demand = { workingKn: 3, peakKn: 6, angleFromAxisDeg: 60, origin: "typed" };
  const level = (
    groupFacts: GroupFacts,
    over: Partial<PlacementFacts> = {},
    angle = 60,
    use: Use = "abseil",
  ) =>
    levelOf(
      inRock(use, {
        bolt: { embedmentMm: 100 },
        group: groupFacts,
        placement: placement({ xMm: 0, yMm: 0, ...over }),
        demand: { ...demand, angleFromAxisDeg: angle },
      }),
      "rock.spacing",
    );

  // Pair at spacing s: (3 h + s) / (6 h), arithmetic on the projected areas of ACI 318-19; h 100 mm.
  it.each([
    [59, "limit"],
    [61, "note"],
    [239, "note"],
    [241, null],
  ])("two bolts %d mm apart, 100 mm deep: %s", (apartMm, expected) => {
    expect(level(pair(apartMm))).toBe(expected);
  });

  it("says nothing of a pull square across, of one bolt that carries all, or of positions not measured", () => {
    expect(level(pair(30), {}, 90)).toBeNull();
    expect(level(pair(30), {}, 60, "protection")).toBeNull();
    expect(level(pair(30, { mainCount: 1 }))).toBeNull();
    expect(level(group({ mainCount: 2, placements: [placement(), placement({ number: 2 })] }))).toBeNull();
  });

  it("counts dead holes", () => {
    expect(level(pair(400), { deadHoleDistancesMm: [30] })).toBe("limit");
    expect(level(pair(400), { deadHoleDistancesMm: [400] })).toBeNull();
  });
});

describe("rock.hold", () => {
  const level = (bolt: Partial<BoltFacts>, peakKn: number, angleFromAxisDeg = 0) =>
    levelOf(
      inRock("abseil", {
        bolt: { ...BENT_ROD, ...bolt },
        demand: { workingKn: 1, peakKn, angleFromAxisDeg, origin: "typed" },
      }),
      "rock.hold",
    );

  // Bond π d h τ with 5 and 12 MPa (common practice): a 10 mm hole 70 mm deep holds 11.0 to 26.4 kN.
  it("notes a pull above the low estimate and limits one above the high", () => {
    const hole = { holeDiameterMm: 10, embedmentMm: 70 };
    // The cone's low end is 0.5·7.7·√55·70^1.5·0.5 N = 8.4 kN in strong rock: it is lower and decides.
    expect(level(hole, 8.3)).toBeNull();
    expect(level(hole, 8.5)).toBe("note");
    expect(level(hole, 26.3)).toBe("note");
    expect(level(hole, 26.5)).toBe("limit");
  });

  it("uses the bond strength of the glue where its sheet is known", () => {
    expect(level({ holeDiameterMm: 10, embedmentMm: 70, bondMpa: 2 }, 5)).toBe("limit");
  });

  it("says nothing of a pull square across or without a depth", () => {
    expect(level({ holeDiameterMm: 10, embedmentMm: 70 }, 100, 90)).toBeNull();
    expect(level({ embedmentMm: null }, 100)).toBeNull();
  });
});

describe("rock.one-body", () => {
  const level = (
    use: Use,
    attachment: Attachment,
    bodies: readonly (string | null)[],
    backup: string | null,
  ) =>
    rockOneBody({
      ...anchor({
        group: group({
          mainCount: bodies.length,
          backupCount: 1,
          rockBodies: [{ rockBodyId: "flake", attachment, label: "The flake" }],
          placements: [
            ...bodies.map((rockBodyId, index) => placement({ number: index + 1, rockBodyId })),
            placement({ number: 9, role: "backup", rockBodyId: backup }),
          ],
        }),
      }),
      use,
    })?.level ?? null;

  it("stops main and backup in one detached or hollow block in serious uses and limits it in others", () => {
    expect(level("highline", "detached", ["flake", null], "flake")).toBe("stop");
    expect(level("rope_access", "hollow", ["flake"], "flake")).toBe("stop");
    expect(level("belay", "hollow", ["flake"], "flake")).toBe("limit");
  });

  it("asks when the attachment is recorded as not known, in serious uses", () => {
    expect(level("highline", "unknown", ["flake"], "flake")).toBe("ask");
    expect(level("belay", "unknown", ["flake"], "flake")).toBeNull();
  });

  it("says nothing when the backup sits elsewhere or the block is attached", () => {
    expect(level("highline", "detached", ["flake", null], null)).toBeNull();
    expect(level("highline", "attached", ["flake"], "flake")).toBeNull();
  });

  it("sees everything in one loose block as no better, backup or not", () => {
    const alone = anchor({
      group: group({
        mainCount: 2,
        rockBodies: [{ rockBodyId: "flake", attachment: "hollow", label: "The flake" }],
        placements: [placement({ rockBodyId: "flake" }), placement({ number: 2, rockBodyId: "flake" })],
      }),
    });
    expect(rockOneBody({ ...alone, use: "highline" })?.level).toBe("stop");
  });
});

describe("eye.radius", () => {
  const level = (use: Use, bolt: Partial<BoltFacts>, textileThroughEye: boolean | null = null) =>
    levelOf(inRock(use, { bolt, textileThroughEye }), "eye.radius");

  it("stops textile or a lowered rope straight through a plate, and says nothing until that is recorded", () => {
    expect(level("lower_off", {}, true)).toBe("stop");
    expect(level("highline", { form: "glued_stud_hanger" }, true)).toBe("stop");
    expect(level("lower_off", {}, null)).toBeNull();
    expect(level("lower_off", {}, false)).toBeNull();
  });

  it.each([
    [9.9, "limit"],
    [10, "note"],
    [11.9, "note"],
    [12, null],
  ])("on a highline, textile on a glued rod of %d mm: %s", (rodDiameterMm, expected) => {
    expect(level("highline", { ...BENT_ROD, rodDiameterMm })).toBe(expected);
    expect(level("highline", { ...BENT_ROD, rodDiameterMm }, false)).toBeNull();
    expect(level("belay", { ...BENT_ROD, rodDiameterMm })).toBeNull();
  });

  it("reads an edge radius as half a thickness, and takes an eye of which neither is known for a thin one", () => {
    const eye = { ...BENT_ROD, form: "glued_eye", rodDiameterMm: null } as const;
    expect(level("highline", { ...eye, eyeRadiusMm: 4.9 })).toBe("limit");
    expect(level("highline", { ...eye, eyeRadiusMm: 6 })).toBeNull();
    expect(level("highline", { ...eye, eyeRadiusMm: null })).toBe("limit");
  });
});

describe("what rock rules name as the remedy", () => {
  it("names a depth that clears rock.embedment", () => {
    const finding = found(
      inRock("protection", { bolt: { embedmentMm: 30 }, rock: { ucsMpa: 30 } }),
      "rock.embedment",
    );
    expect(finding?.clearsWhen).toContain("at least 90 mm");
    expect(
      levelOf(inRock("protection", { bolt: { embedmentMm: 90 }, rock: { ucsMpa: 30 } }), "rock.embedment"),
    ).toBeNull();
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { PriorityInput } from "@/lib/domain/rebolt/priority";
import { byPriority, reboltPriority } from "@/lib/domain/rebolt/priority";
import { LEVELS, USES } from "@/lib/domain/vocabulary";

const BASE: PriorityInput = {
  utilisation: 0.5,
  worstGrade: 0,
  outOfUse: false,
  findings: [],
  uses: ["protection"],
  visitsPerYear: 0,
  waitingSince: "2026-06-01T00:00:00.000Z",
  now: "2026-06-01T00:00:00.000Z",
};
const points = (over: Partial<PriorityInput>, key: string) =>
  reboltPriority({ ...BASE, ...over }).parts.find((part) => part.key === key)?.points;

describe("reboltPriority", () => {
  it("has the six named parts with their greatest values, 100 together", () => {
    expect(reboltPriority(BASE).parts.map((part) => [part.key, part.max])).toEqual([
      ["load", 40],
      ["grade", 20],
      ["corrosion", 15],
      ["people", 15],
      ["one_lost", 5],
      ["waiting", 5],
    ]);
  });

  it("reaches 100 for the worst there is and stays a plain sum of its parts", () => {
    const worst = reboltPriority({
      utilisation: 3,
      worstGrade: 4,
      outOfUse: true,
      findings: [
        { code: "metal.stress-corrosion", level: "stop" },
        { code: "load.one-lost", level: "stop" },
      ],
      uses: ["highline"],
      visitsPerYear: 5000,
      waitingSince: "2020-01-01T00:00:00.000Z",
      now: "2026-06-01T00:00:00.000Z",
    });
    expect(worst.total).toBe(100);
    expect(worst.parts.every((part) => part.points === part.max)).toBe(true);
  });

  it("counts what is not known part of the way, never as nothing", () => {
    expect(points({ utilisation: null }, "load")).toBe(20);
    expect(points({ worstGrade: null }, "grade")).toBe(5);
    expect(points({ visitsPerYear: null }, "people")).toBeGreaterThan(
      points({ visitsPerYear: 0 }, "people") ?? 99,
    );
    expect(points({ findings: [{ code: "metal.unknown", level: "ask" }] }, "corrosion")).toBe(7);
  });

  it("puts a bolt that a report took out of use at full damage whatever its grade", () => {
    expect(points({ outOfUse: true, worstGrade: 1 }, "grade")).toBe(20);
    expect(points({ worstGrade: 3 }, "grade")).toBe(15);
  });

  it("ranks cracking above a short class, and a short class above none", () => {
    const by = (
      code: "metal.stress-corrosion" | "metal.class" | "metal.plated",
      level: "stop" | "limit" | "note",
    ) => points({ findings: [{ code, level }] }, "corrosion") ?? NaN;
    expect(by("metal.stress-corrosion", "stop")).toBe(15);
    expect(by("metal.plated", "stop")).toBe(12);
    expect(by("metal.stress-corrosion", "limit")).toBe(8);
    expect(by("metal.class", "limit")).toBe(5);
    expect(by("metal.class", "note")).toBe(0);
  });

  it("never leaves a part above its greatest value or below 0, and gives each its words", () => {
    fc.assert(
      fc.property(
        fc.record({
          utilisation: fc.option(fc.double({ min: 0, max: 99, noNaN: true }), { nil: null }),
          worstGrade: fc.option(fc.integer({ min: 0, max: 4 }), { nil: null }),
          outOfUse: fc.boolean(),
          findings: fc.array(
            fc.record({
              code: fc.constantFrom(
                "metal.class" as const,
                "metal.stress-corrosion" as const,
                "load.one-lost" as const,
              ),
              level: fc.constantFrom(...LEVELS),
            }),
          ),
          uses: fc.array(fc.constantFrom(...USES)),
          visitsPerYear: fc.option(fc.integer({ min: 0, max: 1e6 }), { nil: null }),
          waitingSince: fc.constantFrom("2019-01-01T00:00:00.000Z", "2027-01-01T00:00:00.000Z"),
          now: fc.constant("2026-06-01T00:00:00.000Z"),
        }),
        (input) => {
          const { parts, total } = reboltPriority(input);
          for (const part of parts) {
            expect(part.points).toBeGreaterThanOrEqual(0);
            expect(part.points).toBeLessThanOrEqual(part.max);
            expect(part.why).toMatch(/\.$/);
          }
          expect(total).toBeCloseTo(
            parts.reduce((sum, part) => sum + part.points, 0),
            9,
          );
        },
      ),
    );
  });

  it("puts the older report first among equals", () => {
    const entries = [
      { total: 50, waitingSince: "2026-05-01T00:00:00.000Z" },
      { total: 50, waitingSince: "2026-01-01T00:00:00.000Z" },
      { total: 60, waitingSince: "2026-06-01T00:00:00.000Z" },
    ];
    expect([...entries].sort(byPriority).map((entry) => entry.waitingSince.slice(5, 7))).toEqual([
      "06",
      "01",
      "05",
    ]);
  });
});

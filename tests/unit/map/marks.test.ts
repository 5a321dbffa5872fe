import { describe, expect, it } from "vitest";
import { MARK_LABELS, MARK_SHAPES, MARKS, markOf, VERDICT_MARKS, worstMark } from "@/lib/map/marks";

/** The end of every drawing command that has absolute coordinates. */
function extremes(d: string): number[] {
  return [...d.matchAll(/[MLHV]\s?(-?[\d.]+)/g)].map((match) => Number(match[1]));
}

describe("the five marks", () => {
  it("differ in shape, not only in colour", () => {
    const shapes = MARKS.map((mark) => JSON.stringify([MARK_SHAPES[mark].d, MARK_SHAPES[mark].stroke]));
    expect(new Set(shapes).size).toBe(5);
  });

  it("differ in colour and in words too", () => {
    expect(new Set(MARKS.map((mark) => MARK_SHAPES[mark].tone)).size).toBe(5);
    expect(new Set(MARKS.map((mark) => MARK_LABELS[mark])).size).toBe(5);
  });

  it("stay inside their box", () => {
    const values = MARKS.flatMap((mark) => extremes(MARK_SHAPES[mark].d));
    expect(Math.min(...values)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...values)).toBeLessThanOrEqual(24);
  });

  it("close the dashed ring without a half dash: dashes and gaps fill the circumference", () => {
    const dash = MARK_SHAPES.not_enough_known.stroke?.dash;
    const rounds = (2 * Math.PI * 8) / ((dash?.[0] ?? 0) + (dash?.[1] ?? 0));
    expect(rounds).toBeCloseTo(Math.round(rounds), 2);
  });

  it("bite lies on both circles it is cut from", () => {
    for (const [x, y] of [
      [14.22, 3.28],
      [20.96, 11.14],
    ] as const) {
      expect(Math.hypot(x - 12, y - 12)).toBeCloseTo(9, 1);
      expect(Math.hypot(x - 19, y - 6)).toBeCloseTo(5.5, 1);
    }
  });
});

describe("which mark is shown", () => {
  it("lets nothing hide a condition that is worse than in service", () => {
    expect(markOf("out_of_use", "nothing_against")).toBe("out_of_use");
    expect(markOf("check_first", "not_enough_known")).toBe("check_first");
    expect(markOf("removed", null)).toBe("removed");
  });

  it("does not call in service what not enough is known about", () => {
    expect(markOf("in_service", "not_enough_known")).toBe("not_enough_known");
    expect(markOf("in_service", null)).toBe("in_service");
  });

  it("shows the worst of a group", () => {
    expect(worstMark(["in_service", "check_first", "out_of_use"])).toBe("out_of_use");
    expect(worstMark(["in_service", "not_enough_known", "removed"])).toBe("not_enough_known");
    expect(worstMark([])).toBeNull();
  });

  it("gives each verdict a mark of its own", () => {
    expect(new Set(Object.values(VERDICT_MARKS)).size).toBe(4);
  });
});

import { describe, expect, it } from "vitest";
import { reasonNumbers } from "@/lib/domain/finding/reason-numbers";
import type { Finding } from "@/lib/domain/finding/types";

const thin: Finding = {
  code: "eye.radius",
  level: "limit",
  title: "Thin eye under textile",
  text: "Textile on the eye lies on 8 mm.",
  clearsWhen: "a steel connector is used",
  numbers: {},
  assumed: [],
  source: { mark: "common_practice", name: "Thin rods cut textile" },
};

describe("the number of a reason in drawing and list", () => {
  it("is shared by findings that say the same of several bolts, and counts on without gaps", () => {
    const other: Finding = { ...thin, text: "Textile on the eye lies on 9 mm." };
    expect(reasonNumbers([thin, other, thin])).toEqual([1, 2, 1]);
  });

  it("differs as soon as anything a person reads differs", () => {
    const variants: Finding[] = [
      { ...thin, level: "note" },
      { ...thin, code: "rock.edge" },
      { ...thin, title: "Thin eye" },
      { ...thin, clearsWhen: null },
      { ...thin, assumed: ["textile lies straight on the eye"] },
      { ...thin, source: { mark: "published", name: "Thin rods cut textile" } },
      { ...thin, source: { mark: "common_practice", name: "Edges cut textile" } },
    ];
    expect(reasonNumbers([thin, ...variants])).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
  });

  it("does not care about the numbers behind equal words", () => {
    expect(reasonNumbers([thin, { ...thin, numbers: { thicknessMm: 8.01 } }])).toEqual([1, 1]);
  });
});

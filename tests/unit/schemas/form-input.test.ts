import { describe, expect, it } from "vitest";
import { z } from "zod";
import { createAnchorInput } from "@/lib/schemas/anchor";
import { number, text, whole, yesNo } from "@/lib/schemas/fields";
import { formInput } from "@/lib/schemas/form-input";

const schema = z.strictObject({
  depthMm: number(0, 100).nullable().default(null),
  count: whole(1, 9),
  ticked: yesNo.default(false),
  note: text(20).nullable().optional(),
  uses: z.array(z.string()).default([]),
});
const parse = (values: unknown) => formInput(schema).safeParse(values);

describe("a form's values", () => {
  it("never turn an empty field into zero", () => {
    expect(parse({ depthMm: "", count: "2" }).data).toMatchObject({ depthMm: null });
    expect(parse({ depthMm: "0", count: "2" }).data).toMatchObject({ depthMm: 0 });
    expect(parse({ count: "" }).success).toBe(false);
  });

  it("take a decimal comma and a true minus", () => {
    expect(parse({ depthMm: "12,5", count: "2" }).data?.depthMm).toBe(12.5);
    expect(parse({ depthMm: "−3", count: "2" }).error?.issues[0]?.path).toEqual(["depthMm"]);
  });

  it.each(["12 mm", "1e3", "0x1f", "Infinity", "1,2,3"])("refuse %s in the field's own words", (typed) => {
    expect(parse({ depthMm: typed, count: "2" }).error?.issues[0]).toMatchObject({
      path: ["depthMm"],
      message: "A number from 0 to 100 is wanted here.",
    });
  });

  it("know ticks, lists of one, and leave out what the schema does not know", () => {
    expect(parse({ count: "2", ticked: "on", uses: "belay", save: "Save" }).data).toEqual({
      depthMm: null,
      count: 2,
      ticked: true,
      uses: ["belay"],
    });
  });

  it("turn numbered names into a list in their order", () => {
    const id = "0190a0c0-0000-7000-8000-000000000001";
    const made = formInput(createAnchorInput).safeParse({
      id,
      siteId: id,
      label: "North",
      uses: ["belay"],
      point: { lon: "-9.5", lat: "52,1" },
      placements: { "0": { id, xMm: "0" }, "1": { id, xMm: "-350" } },
    });
    expect(made.data?.point).toEqual({ lon: -9.5, lat: 52.1 });
    expect(made.data?.placements.map((placement) => placement.xMm)).toEqual([0, -350]);
  });
});

import { describe, expect, it } from "vitest";
import { choicesFor, filterInWords, fits, type MapFilter, NO_FILTER, spansBetween } from "@/lib/map/filter";
import { countMarks, type MapAnchor, mapMark, splitInWords, worstOf } from "@/lib/map/map-anchor";

const anchor = (change: Partial<MapAnchor> = {}): MapAnchor => ({
  code: "GC-01",
  label: "North rim",
  siteSlug: "gannet-cleft",
  siteName: "Gannet Cleft",
  rowName: null,
  uses: ["highline"],
  condition: "in_service",
  verdict: "nothing_against",
  exact: true,
  point: { coordinates: [-34.48, 46.9] },
  seaDistanceM: 120,
  hardware: [{ form: "glued_bent_rod", metal: "1.4401" }],
  ...change,
});
const only = (change: Partial<MapFilter>): MapFilter => ({ ...NO_FILTER, ...change });

describe("the mark on the map", () => {
  it("is never milder than a verdict that says do not use", () => {
    expect(mapMark({ condition: "in_service", verdict: "do_not_use" })).toBe("out_of_use");
    expect(mapMark({ condition: "check_first", verdict: "do_not_use" })).toBe("out_of_use");
  });

  it("is never milder than the condition", () => {
    expect(mapMark({ condition: "out_of_use", verdict: "nothing_against" })).toBe("out_of_use");
    expect(mapMark({ condition: "check_first", verdict: "nothing_against" })).toBe("check_first");
  });

  it("of a removed anchor stays a hollow ring, whatever was once found against it", () => {
    expect(mapMark({ condition: "removed", verdict: "do_not_use" })).toBe("removed");
  });
});

describe("a group of anchors", () => {
  const group = [
    anchor(),
    anchor({ verdict: "not_enough_known" }),
    anchor({ condition: "check_first" }),
    anchor({ condition: "removed" }),
  ];

  it("shows its worst member, however many better ones stand around it", () => {
    expect(worstOf(countMarks(group))).toBe("check_first");
    expect(worstOf(countMarks([...group, anchor({ condition: "out_of_use" })]))).toBe("out_of_use");
    expect(worstOf(countMarks([]))).toBeNull();
  });

  it("is split in words, worst first", () => {
    expect(splitInWords(countMarks(group))).toBe(
      "1 check first, 1 not enough known, 1 in service, 1 removed",
    );
  });
});

describe("the filter sentence", () => {
  it("with nothing chosen leaves every anchor", () => {
    expect(fits(anchor({ seaDistanceM: null, verdict: null, hardware: [] }), NO_FILTER)).toBe(true);
  });

  it("“check first or worse” takes what is drawn so, and not what merely lacks facts", () => {
    const worse = only({ state: "check_first_or_worse" });
    expect(fits(anchor({ condition: "check_first" }), worse)).toBe(true);
    expect(fits(anchor({ verdict: "do_not_use" }), worse)).toBe(true);
    expect(fits(anchor({ verdict: "not_enough_known" }), worse)).toBe(false);
    expect(fits(anchor({ verdict: "not_enough_known" }), only({ state: "not_enough_known_or_worse" }))).toBe(
      true,
    );
    expect(fits(anchor(), worse)).toBe(false);
  });

  it("asks fixing and metal of the same bolt", () => {
    const mixed = anchor({
      hardware: [
        { form: "glued_eye", metal: "ti-2" },
        { form: "expansion_stud_hanger", metal: "1.4301" },
      ],
    });
    expect(fits(mixed, only({ fixing: "glued" }))).toBe(true);
    expect(fits(mixed, only({ metal: "stainless" }))).toBe(true);
    expect(fits(mixed, only({ fixing: "glued", metal: "stainless" }))).toBe(false);
    expect(fits(mixed, only({ fixing: "glued", metal: "titanium" }))).toBe(true);
  });

  it("finds bolts whose metal nobody recorded only under their own word", () => {
    const unknown = anchor({ hardware: [{ form: "glued_eye", metal: null }] });
    expect(fits(unknown, only({ metal: "not_known" }))).toBe(true);
    expect(fits(unknown, only({ metal: "stainless" }))).toBe(false);
    expect(fits(anchor({ hardware: [] }), only({ metal: "not_known" }))).toBe(false);
  });

  it("an unknown distance from the sea fits no limit; the limit itself does", () => {
    expect(fits(anchor({ seaDistanceM: null }), only({ sea: "3000" }))).toBe(false);
    expect(fits(anchor({ seaDistanceM: 250 }), only({ sea: "250" }))).toBe(true);
    expect(fits(anchor({ seaDistanceM: 250.1 }), only({ sea: "250" }))).toBe(false);
  });

  it("wants every word, in any order and case, in code, name, row or site", () => {
    expect(fits(anchor(), only({ q: "RIM gannet" }))).toBe(true);
    expect(fits(anchor(), only({ q: "rim quarry" }))).toBe(false);
  });

  it("counts what each word would leave, the rest of the sentence unchanged", () => {
    const all = [
      anchor(),
      anchor({ seaDistanceM: 5000 }),
      anchor({ uses: ["belay"], condition: "out_of_use" }),
    ];
    const choices = choicesFor(all, only({ sea: "250" }));
    expect(choices.use).toEqual([
      { value: "highline", label: "highline", count: 1 },
      { value: "belay", label: "belay", count: 1 },
    ]);
    expect(choices.state.map(({ value, count }) => [value, count])).toEqual([
      ["out_of_use", 1],
      ["check_first_or_worse", 1],
      ["not_enough_known_or_worse", 1],
      ["in_service", 1],
    ]);
  });

  it("keeps a chosen word on offer even when nothing fits it", () => {
    const choices = choicesFor([anchor()], only({ metal: "plated" }));
    expect(choices.metal.find((choice) => choice.value === "plated")?.count).toBe(0);
  });

  it("says itself in short", () => {
    expect(filterInWords(NO_FILTER, null)).toBe("every anchor");
    expect(filterInWords(only({ state: "check_first_or_worse", use: "highline" }), "Pillar Stack")).toBe(
      "check first or worse, for highline, in Pillar Stack",
    );
  });
});

it("a span is shown while one of its ends is", () => {
  const spans = [
    { aCode: "A", bCode: "B" },
    { aCode: "C", bCode: "D" },
  ];
  expect(spansBetween(spans, [{ code: "B" }])).toEqual([spans[0]]);
  expect(spansBetween(spans, [])).toEqual([]);
});

import { describe, expect, it } from "vitest";
import { localPath } from "@/lib/shared/local-path";

describe("where to go after signing in", () => {
  it("is a path of this site", () => {
    expect(localPath("/anchors/gc-04?tab=bolts#reasons")).toBe("/anchors/gc-04?tab=bolts#reasons");
  });

  it.each([
    undefined,
    "",
    "anchors",
    "https://elsewhere.example/",
    "//elsewhere.example",
    "/\\elsewhere.example",
    "/\t/elsewhere.example",
    "javascript:alert(1)",
    "/\n//elsewhere.example",
  ])("is never another site: %j", (value) => {
    expect(localPath(value, "/start")).toBe("/start");
  });
});

import { readFileSync } from "node:fs";

/**
 * The worked cases of tests/fixtures/cases.json: each was computed by two independent methods before the
 * code was written (their names and the agreement stand in the file).
 */
const file: unknown = JSON.parse(readFileSync(new URL("../fixtures/cases.json", import.meta.url), "utf8"));

/** The inputs and outputs of one case; asking for a value it does not hold fails the test. */
export function workedCase(id: string): {
  title: string;
  input: (key: string) => number;
  output: (key: string) => number;
  raw: unknown;
} {
  const found = Object.values(record(record(file)["modules"]))
    .flatMap((cases) => (Array.isArray(cases) ? cases.map(record) : []))
    .find((one) => one["id"] === id);
  if (found === undefined) throw new Error(`cases.json holds no case ${id}`);
  const pick = (part: string) => (key: string) => {
    const value = record(found[part])[key];
    if (typeof value !== "number") throw new Error(`case ${id} holds no number ${part}.${key}`);
    return value;
  };
  return {
    title: String(found["title"]),
    input: pick("inputs"),
    output: pick("outputs"),
    raw: found["inputs"],
  };
}

export function record(value: unknown): Record<string, unknown> {
  if (typeof value !== "object" || value === null) throw new Error("not an object");
  return Object.fromEntries(Object.entries(value));
}

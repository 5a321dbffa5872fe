/**
 * A nested value as the names and texts a form sends: `{ a: { b: 1 } }` → `{ "a.b": "1" }`. Nothing becomes an
 * empty text.
 */
export function flatValues(value: unknown, prefix = ""): Record<string, string> {
  if (value === null || value === undefined) return prefix === "" ? {} : { [prefix]: "" };
  if (value instanceof Date) return { [prefix]: value.toISOString() };
  if (typeof value === "object") {
    const parts = Object.entries(value).map(([key, inner]) =>
      flatValues(inner, prefix === "" ? key : `${prefix}.${key}`),
    );
    return Object.fromEntries(parts.flatMap((part) => Object.entries(part)));
  }
  return typeof value === "string" || typeof value === "number" || typeof value === "boolean"
    ? { [prefix]: String(value) }
    : {};
}

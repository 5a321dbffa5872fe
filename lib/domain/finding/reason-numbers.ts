import type { Finding } from "@/lib/domain/finding/types";

/** What decides whether two findings say the same thing. */
type Said = Pick<Finding, "code" | "level" | "title" | "text" | "clearsWhen" | "assumed" | "source">;

/**
 * The key of each finding in drawing and list, 1 upward in the order given. Findings that say the same of several
 * bolts share one: a row of eight equal bolts has one reason, drawn eight times.
 */
export function reasonNumbers(findings: readonly Said[]): number[] {
  const numbers = new Map<string, number>();
  return findings.map(({ code, level, title, text, clearsWhen, assumed, source }) => {
    const key = JSON.stringify([code, level, title, text, clearsWhen, assumed, source.mark, source.name]);
    const number = numbers.get(key) ?? numbers.size + 1;
    numbers.set(key, number);
    return number;
  });
}

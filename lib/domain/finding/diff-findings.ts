import type { Finding } from "@/lib/domain/finding/types";

/** What a change of the evidence did to the reasons. */
export interface FindingsDiff {
  appeared: readonly Finding[];
  cleared: readonly Finding[];
  /** Same code, another level. */
  changed: readonly { before: Finding; after: Finding }[];
}

/** Compares by code, and by text where one code stands more than once. */
export function diffFindings(before: readonly Finding[], after: readonly Finding[]): FindingsDiff {
  const same = (a: Finding, b: Finding) => a.code === b.code && a.level === b.level && a.text === b.text;
  const gone = before.filter((b) => !after.some((a) => same(a, b)));
  const fresh = after.filter((a) => !before.some((b) => same(a, b)));
  const changed: { before: Finding; after: Finding }[] = [];
  const appeared: Finding[] = [];
  for (const one of fresh) {
    const index = gone.findIndex((b) => b.code === one.code);
    const [was] = index < 0 ? [] : gone.splice(index, 1);
    if (was === undefined) appeared.push(one);
    else if (was.level !== one.level) changed.push({ before: was, after: one });
  }
  return { appeared, cleared: gone, changed };
}

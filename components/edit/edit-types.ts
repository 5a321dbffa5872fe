/** Values a form starts with, by field name: from a draft, or as they are stored. */
export type Kept = Readonly<Record<string, string>>;
export type ErrorOf = (path: string) => string | undefined;

/** What every part of a form about an anchor is given. */
export interface PartProps {
  kept: Kept;
  errorOf: ErrorOf;
}

/** Ids of the repeated parts a draft held, in order: sent again they are the same parts. */
export function keptIds(kept: Kept, list: string): string[] {
  const ids: string[] = [];
  for (let id = kept[`${list}.0.id`]; id; id = kept[`${list}.${ids.length}.id`]) ids.push(id);
  return ids;
}

/**
 * Who is looking, reduced to what decides visibility. Lists and single reads narrow by it in SQL:
 * - an area or site with visibility `members` exists only for its members;
 * - a `sensitive` site shows outsiders its name and a rounded point, and nothing it could be found by.
 */
export interface Audience {
  /** Sees everything everywhere. */
  everything: boolean;
  /** Areas whose hidden and sensitive parts are visible. */
  memberAreaIds: readonly string[];
  /** Stable key for caches: the same key sees the same things. */
  key: string;
}

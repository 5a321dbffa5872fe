import type { FieldProblem } from "@/lib/shared/errors";

/** One bolt that is in the rock, as it stands at the question whether its anchor may come back. */
export interface BoltForReturn {
  placementNumber: number;
  /** Out of use itself: it does not count and needs no check now. */
  outOfUse: boolean;
  /** Set after the event: it did not carry it. */
  newerThanEvent: boolean;
  /** The last check by hand after the event; null: none. */
  check: { byUserId: string | null; hasPhoto: boolean } | null;
}

/**
 * What is still missing before an anchor may be used again after an event: each bolt that carried it checked
 * by hand, with a photo, and where the area asks for two people, by somebody else than the one who puts it back.
 */
export function missingForReturn(
  bolts: readonly BoltForReturn[],
  rule: { secondPerson: boolean; returnedBy: string; anchorReportsOpen: number },
): FieldProblem[] {
  const missing = bolts
    .filter((bolt) => !bolt.outOfUse && !bolt.newerThanEvent)
    .flatMap(({ placementNumber, check }) => {
      const path = `placements.${placementNumber}`;
      const name = `Placement ${placementNumber}`;
      if (check === null) return [{ path, message: `${name} was not checked by hand since.` }];
      return [
        ...(check.hasPhoto ? [] : [{ path, message: `${name}: the check by hand has no photo.` }]),
        ...(rule.secondPerson && check.byUserId === rule.returnedBy
          ? [{ path, message: `${name} was checked by you: this area asks for a second person.` }]
          : []),
      ];
    });
  if (rule.anchorReportsOpen > 0) {
    missing.unshift({ path: "reports", message: "A report about the whole anchor is not answered." });
  }
  return missing;
}

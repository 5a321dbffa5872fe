import type { LoadPolicy } from "@/lib/domain/policy";
import type { Condition, PlacementRole, Use } from "@/lib/domain/vocabulary";
import { CONDITIONS } from "@/lib/domain/vocabulary";
import type { OpenReportFacts } from "@/lib/domain/finding/evidence";
import { lasts, standingReports } from "@/lib/domain/finding/open-reports";
import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";

/** What a steward set by hand. */
export interface Decision {
  condition: Condition;
  /** UTC instant. */
  at: string;
}

export interface BoltForCondition {
  boltId: string;
  role: PlacementRole;
  removed: boolean;
  /** UTC instant since which it stands in its hole; null: longer than anything on record. */
  standsSince: string | null;
  openReports: readonly OpenReportFacts[];
  /** Its glue is not hard yet. */
  curing: boolean;
  /** UTC instant of the last check by hand that found it sound; null: none on record. */
  handCheckedAt: string | null;
  decided: Decision | null;
}

/** Something that strained the whole anchor: a confirmed report that took it out of use, answered or not. */
export interface OutOfUseEvent {
  observedAt: string;
}

export interface AnchorForCondition {
  uses: readonly Use[];
  bolts: readonly BoltForCondition[];
  /** Reports about the anchor or its rock, not about one bolt. */
  openReports: readonly OpenReportFacts[];
  /** Past events of the anchor; those of open reports need not be repeated here. */
  events: readonly OutOfUseEvent[];
  decided: Decision | null;
}

/** What the evidence says, what a steward decided, and which of the two holds. */
export interface DerivedCondition {
  condition: Condition;
  derived: Condition;
  decided: Condition | null;
  /** Why the evidence says so, in words. */
  why: readonly string[];
  /** When the event happened that took it out of use; null: it is not out of use by an event. */
  outOfUseSince: string | null;
}

export interface AnchorCondition extends DerivedCondition {
  bolts: readonly (DerivedCondition & { boltId: string })[];
}

/** What a derivation found, before a decision is laid beside it. */
interface Found {
  derived: Condition;
  why: readonly string[];
  outOfUseSince: string | null;
  /** The newest evidence it stands on; null: none. */
  newest: string | null;
}

/**
 * The condition of an anchor and of each of its bolts, from what is open against them.
 *
 * A bolt with a permanent bend, moving glue, cracked metal or a new, moving or hollow crack is out of use
 * until that report is answered. Every bolt that stood there then carried the same event: the whole anchor
 * is out of use until each of them was checked by hand afterwards. Then the anchor is as its worst bolt,
 * except that with enough sound main bolts for every use it is "check first" instead of out of use. A tag's
 * report nobody confirmed means "check first".
 */
export function deriveCondition(anchor: AnchorForCondition, policy: LoadPolicy): AnchorCondition {
  const events = eventsOf(anchor);
  const bolts = anchor.bolts.map((bolt) => ({ bolt, found: ofBolt(bolt, events) }));
  return {
    ...settle(ofAnchor(anchor, bolts, events, policy), anchor.decided),
    bolts: bolts.map(({ bolt, found }) => ({ boltId: bolt.boltId, ...settle(found, bolt.decided) })),
  };
}

/** Instants of all events that strained the anchor, in order. */
function eventsOf(anchor: AnchorForCondition): readonly string[] {
  const open = [...anchor.openReports, ...anchor.bolts.flatMap((bolt) => bolt.openReports)];
  return [
    ...anchor.events.map((event) => event.observedAt),
    ...open
      .filter((report) => report.confirmed && isOutOfUseAtOnce(report))
      .map((report) => report.observedAt),
  ].sort();
}

function ofBolt(bolt: BoltForCondition, events: readonly string[]): Found {
  const found = (derived: Condition, why: string[], rest: Partial<Found> = {}): Found => ({
    derived,
    why,
    outOfUseSince: null,
    newest: null,
    ...rest,
  });
  if (bolt.removed) return found("removed", ["Taken out of the rock."]);

  const standing = standingReports(bolt.openReports);
  const newest =
    standing
      .map(({ report }) => report.observedAt)
      .sort()
      .at(-1) ?? null;
  const struck = standing.filter(({ report }) => report.confirmed && lasts(report));
  const [first] = struck.map(({ report }) => report.observedAt).sort();
  if (first !== undefined) {
    const why = "A report that takes it out of use is not answered.";
    return found("out_of_use", [why], { outOfUseSince: first, newest });
  }
  if (bolt.curing) return found("out_of_use", ["Its glue is not hard yet."], { newest });

  const unchecked = uncheckedEvent(bolt, events);
  const why = [
    unchecked === null
      ? null
      : "It carried the same event as a bolt out of use and was not checked by hand since.",
    standing.some(({ level }) => level !== "note") ? "An open report asks for a look first." : null,
  ].filter((words) => words !== null);
  if (why.length === 0) return found("in_service", [], { newest });
  return found("check_first", why, {
    newest:
      [newest, unchecked]
        .filter((t) => t !== null)
        .sort()
        .at(-1) ?? null,
  });
}

/** The latest event the bolt stood through without a check by hand afterwards; null: none. */
function uncheckedEvent(bolt: BoltForCondition, events: readonly string[]): string | null {
  const open = events.filter(
    (at) =>
      (bolt.standsSince === null || bolt.standsSince <= at) &&
      (bolt.handCheckedAt === null || bolt.handCheckedAt <= at),
  );
  return open.at(-1) ?? null;
}

function ofAnchor(
  anchor: AnchorForCondition,
  bolts: readonly { bolt: BoltForCondition; found: Found }[],
  events: readonly string[],
  policy: LoadPolicy,
): Found {
  const current = bolts.filter(({ bolt }) => !bolt.removed);
  const nothing = { why: [], outOfUseSince: null, newest: events.at(-1) ?? null };
  if (bolts.length > 0 && current.length === 0)
    return { ...nothing, derived: "removed", why: ["Every bolt is taken out."] };

  const own = standingReports(anchor.openReports);
  const ownStruck = own.filter(({ report }) => report.confirmed && lasts(report));
  const [ownFirst] = ownStruck.map(({ report }) => report.observedAt).sort();
  if (ownFirst !== undefined) {
    const why = ["A report about the whole anchor is not answered."];
    return { ...nothing, derived: "out_of_use", why, outOfUseSince: ownFirst };
  }
  const pending = current
    .filter(({ found }) => found.derived !== "out_of_use")
    .map(({ bolt }) => uncheckedEvent(bolt, events))
    .filter((at) => at !== null)
    .sort();
  if (pending[0] !== undefined) {
    const why = [`${pending.length} of its bolts carried the event and were not checked by hand since.`];
    return { ...nothing, derived: "out_of_use", why, outOfUseSince: pending[0] };
  }
  const out = current.filter(({ found }) => found.derived === "out_of_use");
  if (out.length > 0) return { ...nothing, ...withBoltsOut(anchor, current, out, policy) };

  const look =
    current.some(({ found }) => found.derived === "check_first") || own.some(({ level }) => level !== "note");
  const newest = [...own.map(({ report }) => report.observedAt), ...current.map(({ found }) => found.newest)]
    .filter((at) => at !== null)
    .sort()
    .at(-1);
  return look
    ? {
        ...nothing,
        derived: "check_first",
        why: ["An open report asks for a look first."],
        newest: newest ?? null,
      }
    : { ...nothing, derived: "in_service" };
}

/** Some bolts are out and the others were checked: enough sound main bolts make it "check first". */
function withBoltsOut(
  anchor: AnchorForCondition,
  current: readonly { bolt: BoltForCondition; found: Found }[],
  out: readonly { found: Found }[],
  policy: LoadPolicy,
): Pick<Found, "derived" | "why" | "outOfUseSince"> {
  const sound = current.filter(
    ({ bolt, found }) => bolt.role === "main" && found.derived === "in_service",
  ).length;
  const wanted = Math.max(1, ...anchor.uses.map((use) => policy.minSoundBolts[use]));
  const count = `${out.length} out of use, ${sound} sound main ${sound === 1 ? "bolt" : "bolts"}, ${wanted} wanted.`;
  const [since = null] = out
    .map(({ found }) => found.outOfUseSince)
    .filter((at) => at !== null)
    .sort();
  return sound >= wanted
    ? { derived: "check_first", why: [count], outOfUseSince: null }
    : { derived: "out_of_use", why: [count], outOfUseSince: since };
}

/**
 * Lays a steward's decision beside the evidence. What is out of use by evidence comes back through evidence
 * only; otherwise the decision holds until something newer is seen, from then on the worse of the two.
 */
function settle({ derived, why, outOfUseSince, newest }: Found, decided: Decision | null): DerivedCondition {
  const beside = { derived, decided: decided?.condition ?? null, why, outOfUseSince };
  if (decided === null) return { ...beside, condition: derived };
  const overrules =
    derived !== "out_of_use" && derived !== "removed" && (newest === null || newest <= decided.at);
  return { ...beside, condition: overrules ? decided.condition : worse(derived, decided.condition) };
}

function worse(a: Condition, b: Condition): Condition {
  return CONDITIONS.indexOf(a) >= CONDITIONS.indexOf(b) ? a : b;
}

import type { PlaceClass } from "@/lib/engineering";
import type { LoadPolicy } from "@/lib/domain/policy";
import type { RuleCode, Use, Verdict } from "@/lib/domain/vocabulary";
import { RULE_CODES } from "@/lib/domain/vocabulary";
import { ENGINE_VERSION } from "@/lib/domain/finding/engine";
import type { BoltVerdict } from "@/lib/domain/finding/evaluate-bolt";
import { evaluateBolt } from "@/lib/domain/finding/evaluate-bolt";
import type { AnchorEvidence } from "@/lib/domain/finding/evidence";
import type { HelpMost } from "@/lib/domain/finding/help-most";
import { placeClassOf } from "@/lib/domain/finding/place";
import { ANCHOR_RULES } from "@/lib/domain/finding/rules";
import type { Finding } from "@/lib/domain/finding/types";
import { byWeight, verdictOf } from "@/lib/domain/finding/verdict-of";

/** A reason with the uses of the anchor under which it arises in exactly these words. */
export interface UsedFinding extends Finding {
  uses: readonly Use[];
}

export interface AnchorBoltVerdict {
  boltId: string;
  placementNumber: number;
  /** The worst over the anchor's uses. */
  verdict: Verdict;
  findings: readonly UsedFinding[];
  utilisation: number | null;
  helpMost: HelpMost | null;
}

export interface AnchorVerdict {
  /** The worst of the anchor's own reasons and of its bolts. */
  verdict: Verdict;
  engine: string;
  /** Reasons about the anchor as a whole. */
  findings: readonly UsedFinding[];
  bolts: readonly AnchorBoltVerdict[];
  utilisation: number | null;
  placeClass: PlaceClass | null;
  /** The fact that settles most over all bolts; null unless the verdict is `not_enough_known`. */
  helpMost: HelpMost | null;
  /** Every rule that spoke, on the anchor or a bolt. */
  codes: readonly RuleCode[];
}

/** The verdict on an anchor: its own rules once for each use, and every bolt under every use. */
export function evaluateAnchor(evidence: AnchorEvidence, policy: LoadPolicy): AnchorVerdict {
  const own = evidence.uses.map((use) => ({
    use,
    findings: ANCHOR_RULES.map((rule) => rule({ ...evidence, use }, policy)).filter(
      (found) => found !== null,
    ),
  }));
  const findings = merged(own);
  const bolts = boltVerdicts(evidence, policy);
  const all = [...findings, ...bolts.flatMap((bolt) => bolt.findings)];
  const verdict = verdictOf(all);
  const codes = new Set(all.map((found) => found.code));
  return {
    verdict,
    engine: ENGINE_VERSION,
    findings,
    bolts,
    utilisation: greatest(bolts.map((bolt) => bolt.utilisation)),
    placeClass: placeClassOf(evidence.place),
    helpMost: verdict === "not_enough_known" ? mostHelpful(bolts, findings) : null,
    codes: RULE_CODES.filter((code) => codes.has(code)),
  };
}

function boltVerdicts(evidence: AnchorEvidence, policy: LoadPolicy): AnchorBoltVerdict[] {
  const byBolt = new Map<string, { placementNumber: number; under: { use: Use; result: BoltVerdict }[] }>();
  for (const { boltId, placementNumber, evidence: one } of evidence.bolts) {
    const entry = byBolt.get(boltId) ?? { placementNumber, under: [] };
    entry.under.push({ use: one.use, result: evaluateBolt(one, policy) });
    byBolt.set(boltId, entry);
  }
  return [...byBolt].map(([boltId, { placementNumber, under }]) => {
    const findings = merged(under.map(({ use, result }) => ({ use, findings: result.findings })));
    return {
      boltId,
      placementNumber,
      verdict: verdictOf(findings),
      findings,
      utilisation: greatest(under.map(({ result }) => result.utilisation)),
      helpMost: under.map(({ result }) => result.helpMost).reduce(better, null),
    };
  });
}

/** Reasons of several uses, those in the same words told once with all their uses. */
function merged(under: readonly { use: Use; findings: readonly Finding[] }[]): UsedFinding[] {
  const told: (Finding & { uses: Use[] })[] = [];
  for (const { use, findings } of under) {
    for (const found of findings) {
      const twin = told.find(
        (one) => one.code === found.code && one.level === found.level && one.text === found.text,
      );
      if (twin === undefined) told.push({ ...found, uses: [use] });
      else twin.uses.push(use);
    }
  }
  return told.sort(byWeight);
}

function greatest(values: readonly (number | null)[]): number | null {
  const known = values.filter((value) => value !== null);
  return known.length === 0 ? null : Math.max(...known);
}

function better(a: HelpMost | null, b: HelpMost | null): HelpMost | null {
  if (a === null || b === null) return a ?? b;
  return b.settles > a.settles ? b : a;
}

/**
 * The fact named most often, weighed by what it settles; an anchor's own open question speaks when no bolt
 * asks.
 */
function mostHelpful(bolts: readonly AnchorBoltVerdict[], own: readonly UsedFinding[]): HelpMost | null {
  const sums = new Map<string, HelpMost>();
  for (const { helpMost } of bolts) {
    if (helpMost === null) continue;
    const sum = sums.get(helpMost.fact);
    sums.set(
      helpMost.fact,
      sum === undefined
        ? helpMost
        : { ...sum, settles: sum.settles + helpMost.settles, of: sum.of + helpMost.of },
    );
  }
  const best = [...sums.values()].reduce<HelpMost | null>(better, null);
  const open = own.find((found) => found.level === "ask");
  if (best !== null || open === undefined) return best;
  return { fact: open.code, label: open.clearsWhen ?? open.title, settles: 1, of: 1 };
}

import Link from "next/link";
import { ReasonItem, ReasonList } from "@/components/finding/reason-item";
import { reasonMargin } from "@/components/finding/reason-margin";
import { MarginBar } from "@/components/ui/margin-bar";
import { usesLabel } from "@/lib/domain/labels";
import type { Use } from "@/lib/domain/vocabulary";
import type { SheetFinding } from "@/lib/schemas/views/anchor";
import { formatRuns } from "@/lib/shared/format";

interface ReasonsProps {
  findings: readonly SheetFinding[];
  /** The uses of the anchor: a reason that holds for all of them does not repeat them. */
  uses: readonly Use[];
  /** Names the bolts a reason is about; left out on a page about one bolt. */
  withSubjects?: boolean;
}

/** The reasons of a verdict with their bars, each once, numbered as on the drawing. */
export function Reasons({ findings, uses, withSubjects = true }: ReasonsProps) {
  if (findings.length === 0) {
    return <p className="text-muted">No rule has anything to say about what is recorded here.</p>;
  }
  return (
    <ReasonList className="gap-x-10 xl:columns-2 print:columns-2 print:gap-x-5">
      {reasonGroups(findings).map((group) => (
        <OneReason key={group[0].number} group={group} uses={uses} withSubjects={withSubjects} />
      ))}
    </ReasonList>
  );
}

function OneReason({
  group,
  uses,
  withSubjects,
}: {
  group: Group;
  uses: readonly Use[];
  withSubjects: boolean;
}) {
  const [reason] = group;
  const margin = reasonMargin(reason);
  const reportId = reason.numbers["reportId"];
  const own = [...new Set(group.flatMap((finding) => finding.uses))];
  const asUses = own.length > 0 && own.length < uses.length ? ` · as ${usesLabel(own)}` : "";
  const subject = withSubjects ? subjectOf(group) + asUses : asUses.replace(" · ", "");
  return (
    <ReasonItem number={reason.number} reason={reason} subject={subject || undefined}>
      {margin ? <MarginBar {...margin} className="max-w-md" /> : null}
      {typeof reportId === "string" ? (
        <p>
          <Link href={`/reports/${reportId}`} className="inline-block py-1 text-link">
            Read the report
          </Link>
        </p>
      ) : null}
    </ReasonItem>
  );
}

type Group = readonly [SheetFinding, ...SheetFinding[]];

/** Findings that share a number are one reason. Keeps the order. */
export function reasonGroups(findings: readonly SheetFinding[]): Group[] {
  const groups = new Map<number, [SheetFinding, ...SheetFinding[]]>();
  for (const finding of findings) {
    const group = groups.get(finding.number);
    if (group) group.push(finding);
    else groups.set(finding.number, [finding]);
  }
  return [...groups.values()];
}

/** "bolts 1–3, 5", "bolt 2", "whole anchor". */
export function subjectOf(group: Group): string {
  const numbers = group.flatMap(({ placementNumber }) => (placementNumber === null ? [] : [placementNumber]));
  if (numbers.length === 0) return "whole anchor";
  const runs = formatRuns(numbers);
  return `${new Set(numbers).size > 1 ? "placements" : "placement"} ${runs}`;
}

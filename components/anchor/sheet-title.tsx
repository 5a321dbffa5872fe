import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import type { TitleBlockProps } from "@/components/layout/title-block";
import { Badge } from "@/components/ui/badge";
import { PastDate } from "@/components/ui/date-text";
import { sentence, usesLabel } from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";

/** The title block of an anchor sheet. `today` is the day the next check is held against. */
export function sheetTitle(sheet: AnchorSheet, today: string): TitleBlockProps {
  const [lon, lat] = sheet.point.coordinates;
  return {
    name: sheet.label,
    kind: "Anchor sheet",
    code: sheet.code,
    condition: <ConditionMark condition={sheet.condition} verdict={sheet.verdict} />,
    revision: sheet.revisions.at(-1)?.letter ?? "–",
    cells: [
      {
        name: "Site",
        value: (
          <Link href={`/sites/${sheet.site.slug}`} className="text-link">
            {sheet.site.name}
          </Link>
        ),
      },
      { name: "Use", value: sentence(usesLabel(sheet.uses)) },
      {
        name: "Area",
        value: (
          <Link href={`/areas/${sheet.area.slug}`} className="text-link">
            {sheet.area.name}
          </Link>
        ),
      },
      { name: "Last check", value: <PastDate on={sheet.lastCheckOn} unknown="never" /> },
      { name: "Next check", value: <NextCheck dueOn={sheet.nextCheckDueOn} today={today} /> },
      {
        name: sheet.exact ? "Position" : "Position, to about 1 km",
        value: (
          <span className="type-code text-sm">
            {latitude(lat, sheet.exact)} {longitude(lon, sheet.exact)}
          </span>
        ),
      },
      {
        name: "Judged by",
        value: `policy ${sheet.policyVersion ?? "–"}, rules ${sheet.engineVersion ?? "–"}`,
      },
    ],
  };
}

function NextCheck({ dueOn, today }: { dueOn: string | null; today: string }) {
  if (dueOn === null) return <Badge tone="warn">due now</Badge>;
  return (
    <span className="inline-flex flex-wrap items-center gap-x-2">
      <PastDate on={dueOn} />
      {dueOn < today ? <Badge tone="warn">overdue</Badge> : null}
    </span>
  );
}

/** `46.901` → "46.90100° N". */
function latitude(value: number, exact: boolean): string {
  return `${Math.abs(value).toFixed(exact ? 5 : 2)}°${value < 0 ? "S" : "N"}`;
}

function longitude(value: number, exact: boolean): string {
  return `${Math.abs(value).toFixed(exact ? 5 : 2)}°${value < 0 ? "W" : "E"}`;
}

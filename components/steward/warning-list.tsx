import { EndForm } from "@/components/steward/end-form";
import { Badge } from "@/components/ui/badge";
import { PastDate } from "@/components/ui/date-text";
import { metalLabel } from "@/lib/domain/labels";
import type { BatchWarningView } from "@/lib/schemas/views/steward";
import type { FormAction } from "@/lib/shared/action-state";
import { formatCount, formatPastDate } from "@/lib/shared/format";

interface WarningListProps {
  warnings: readonly (BatchWarningView & { mayClose: boolean })[];
  close: FormAction<void>;
}

/** Warnings about hardware, glue or metal: those that hold first. */
export function WarningList({ warnings, close }: WarningListProps) {
  const ordered = warnings.toSorted((a, b) => Number(a.closedAt !== null) - Number(b.closedAt !== null));
  return (
    <ul className="divide-y divide-line border-y border-line">
      {ordered.map((warning) => (
        <li key={warning.id} className="grid gap-1 py-4">
          <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
            <h2 className="text-lg">{warning.title}</h2>
            <StateBadge warning={warning} />
            <span className="type-label text-muted">{formatCount(warning.hits, "bolt")} found</span>
          </div>
          <p className="max-w-prose whitespace-pre-line">{warning.body}</p>
          <p className="text-sm text-muted">
            About {aboutOf(warning)}
            {warning.source ? ` · ${warning.source}` : ""}
            {warning.publishedAt ? (
              <>
                {" "}
                · published <PastDate on={warning.publishedAt.slice(0, 10)} />
              </>
            ) : null}
            {warning.closedAt ? (
              <>
                {" "}
                · closed <PastDate on={warning.closedAt.slice(0, 10)} />
              </>
            ) : null}
          </p>
          {warning.mayClose && warning.closedAt === null ? (
            <EndForm
              action={close}
              record={warning}
              label="Close it"
              about={warning.title}
              hint="It then speaks against no bolt any more and stays in history."
            />
          ) : null}
        </li>
      ))}
    </ul>
  );
}

function StateBadge({ warning }: { warning: BatchWarningView }) {
  if (warning.closedAt !== null) return <Badge>closed</Badge>;
  return warning.says === "stop" ? (
    <Badge tone="stop">do not use</Badge>
  ) : (
    <Badge tone="warn">inspect first</Badge>
  );
}

/** "type X, batch 0419*, set 1 March 2019 to 5 June 2019". */
function aboutOf(warning: BatchWarningView): string {
  const { typeName, adhesiveName, metal, batchPattern, installedFrom, installedTo } = warning;
  const from = installedFrom ? `from ${formatPastDate(installedFrom)}` : "";
  const to = installedTo ? `to ${formatPastDate(installedTo)}` : "";
  return [
    typeName ?? "",
    adhesiveName ?? "",
    metal === null ? "" : metalLabel(metal),
    batchPattern === null ? "" : `batch ${batchPattern}`,
    from || to ? `set ${[from, to].filter(Boolean).join(" ")}` : "",
  ]
    .filter(Boolean)
    .join(", ");
}

import { periodOf } from "@/components/anchor/closure-list";
import { EndForm } from "@/components/steward/end-form";
import { Badge } from "@/components/ui/badge";
import type { ClosureView } from "@/lib/schemas/views/anchor";
import type { FormAction } from "@/lib/shared/action-state";

interface ClosureTableProps {
  closures: readonly (ClosureView & { mayLift: boolean })[];
  lift: FormAction<void>;
  /** YYYY-MM-DD */
  today: string;
}

/** Access stops: those that are not lifted first. */
export function ClosureTable({ closures, lift, today }: ClosureTableProps) {
  const ordered = closures.toSorted((a, b) => Number(a.liftedAt !== null) - Number(b.liftedAt !== null));
  return (
    <ul className="divide-y divide-line border-y border-line">
      {ordered.map((closure) => (
        <li key={closure.id} className="grid gap-1 py-4">
          <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
            <h2 className="text-lg">{closure.scopeName}</h2>
            <Badge tone={toneOf(closure, today)}>{stateOf(closure, today)}</Badge>
            <span className="type-label text-muted">whole {closure.scope}</span>
          </div>
          <p className="max-w-prose">{closure.reason}</p>
          <p className="text-sm text-muted">
            {periodOf(closure)}
            {closure.source ? ` · ${closure.source}` : ""}
          </p>
          {closure.mayLift && closure.liftedAt === null ? (
            <EndForm
              action={lift}
              record={closure}
              label="Lift it"
              about={closure.scopeName}
              hint="It then stops nobody any more and stays in history."
            />
          ) : null}
        </li>
      ))}
    </ul>
  );
}

function stateOf({ liftedAt, startsOn, endsOn, yearly }: ClosureView, today: string): string {
  if (liftedAt !== null) return "lifted";
  if (yearly) return "every year";
  if (today < startsOn) return "to come";
  return endsOn !== null && today > endsOn ? "over" : "closed now";
}

function toneOf(closure: ClosureView, today: string) {
  const state = stateOf(closure, today);
  if (state === "closed now") return "stop";
  return state === "every year" || state === "to come" ? "warn" : "plain";
}

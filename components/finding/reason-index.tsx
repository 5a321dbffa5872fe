import { ReasonKey } from "@/components/finding/reason-key";
import { reasonGroups, subjectOf } from "@/components/finding/reasons";
import type { SheetFinding } from "@/lib/schemas/views/anchor";

/** The key to the balloons of the drawing: number, what it is, which bolts; each leads to the whole reason. */
export function ReasonIndex({ findings }: { findings: readonly SheetFinding[] }) {
  if (findings.length === 0) return null;
  return (
    <nav aria-label="Key to the drawing">
      <ol className="divide-y divide-line border-y border-line">
        {reasonGroups(findings).map((group) => {
          const [reason] = group;
          return (
            <li key={reason.number}>
              <a
                href={`#reason-${reason.number}`}
                className="grid touch grid-cols-[auto_1fr] items-center gap-x-3 py-1 hover:bg-sunk hover:text-action print:min-h-0"
              >
                <ReasonKey number={reason.number} level={reason.level} />
                <span className="flex flex-wrap items-baseline justify-between gap-x-4 leading-snug">
                  <span className="font-semibold">{reason.title}</span>
                  <span className="type-label text-muted">{subjectOf(group)}</span>
                </span>
              </a>
            </li>
          );
        })}
      </ol>
    </nav>
  );
}

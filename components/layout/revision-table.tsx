import type { ReactNode } from "react";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";

export interface Revision {
  id: string;
  letter: string;
  /** What changed, in words. */
  what: ReactNode;
  /** Already formatted for the place. */
  when: ReactNode;
  by: string;
}

const HEAD = [{ name: "Rev." }, { name: "Change" }, { name: "Date" }, { name: "By" }];

/** Who changed what and when: the audit trail in the form every drawing has. Newest first. */
export function RevisionTable({ revisions }: { revisions: readonly Revision[] }) {
  return (
    <StackTable caption="Revisions, newest first" head={HEAD}>
      {revisions.map((revision) => (
        <StackRow key={revision.id}>
          <StackCell head className="type-figure max-lg:text-lg">
            {revision.letter}
          </StackCell>
          <StackCell wide className="max-lg:-mt-9 max-lg:pl-10 print:mt-0 print:pl-1.5">
            {revision.what}
          </StackCell>
          <StackCell className="max-lg:pl-10 max-lg:text-sm max-lg:text-muted lg:whitespace-nowrap print:pl-1.5">
            {revision.when}
          </StackCell>
          <StackCell className="max-lg:text-sm max-lg:text-muted">{revision.by}</StackCell>
        </StackRow>
      ))}
    </StackTable>
  );
}

import type { ReactNode } from "react";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";

export interface Revision {
  id: string;
  letter: string;
  /** What changed, in words. */
  what: ReactNode;
  /** Already formatted for the place. */
  when: ReactNode;
  by: string;
}

/** Who changed what and when: the audit trail in the form every drawing has. Newest first. */
export function RevisionTable({ revisions }: { revisions: readonly Revision[] }) {
  return (
    <Table caption="Revisions, newest first">
      <TableHead>
        <tr>
          <Th className="w-12">Rev.</Th>
          <Th>Change</Th>
          <Th className="whitespace-nowrap">Date</Th>
          <Th>By</Th>
        </tr>
      </TableHead>
      <TableBody>
        {revisions.map((revision) => (
          <tr key={revision.id}>
            <Td className="type-figure">{revision.letter}</Td>
            <Td className="min-w-40">{revision.what}</Td>
            <Td className="whitespace-nowrap">{revision.when}</Td>
            <Td>{revision.by}</Td>
          </tr>
        ))}
      </TableBody>
    </Table>
  );
}

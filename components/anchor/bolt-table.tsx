import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { PastDate } from "@/components/ui/date-text";
import { Quantity } from "@/components/ui/quantity";
import { SourceMark } from "@/components/ui/source-mark";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import {
  FORM_LABELS,
  METHOD_LABELS,
  metalLabel,
  PLACEMENT_KIND_LABELS,
  PLACEMENT_ROLE_LABELS,
  sentence,
} from "@/lib/domain/labels";
import type { PlacementView } from "@/lib/schemas/views/anchor";
import type { BoltView } from "@/lib/schemas/views/bolt";

/** Every hole and natural placement of the anchor, with what is in it now. */
export function BoltTable({ placements }: { placements: readonly PlacementView[] }) {
  return (
    <Table caption="Placements and the bolts in them">
      <TableHead>
        <tr>
          <Th className="w-10">No.</Th>
          <Th>What</Th>
          <Th>Set</Th>
          <Th className="text-right">Depth</Th>
          <Th className="text-right">Rated across / along</Th>
          <Th className="text-right">Bends from</Th>
          <Th>State</Th>
        </tr>
      </TableHead>
      <TableBody>
        {placements.map((placement) =>
          placement.bolt ? (
            <BoltLine key={placement.id} placement={placement} bolt={placement.bolt} />
          ) : (
            <NaturalLine key={placement.id} placement={placement} />
          ),
        )}
      </TableBody>
    </Table>
  );
}

function BoltLine({ placement, bolt }: { placement: PlacementView; bolt: BoltView }) {
  return (
    <tr>
      <Th scope="row" className="type-figure text-lg">
        {placement.number}
      </Th>
      <Td className="min-w-52">
        <Link href={`/bolts/${bolt.id}`} className="font-semibold underline underline-offset-2">
          {bolt.typeName ?? sentence(FORM_LABELS[bolt.form])}
        </Link>
        <span className="block text-sm text-muted">
          {metalLabel(bolt.boltMetal)}
          {bolt.hangerMetal && bolt.hangerMetal !== bolt.boltMetal
            ? `, hanger ${metalLabel(bolt.hangerMetal)}`
            : ""}
          {placement.role === "main" ? "" : ` · ${PLACEMENT_ROLE_LABELS[placement.role]}`}
        </span>
      </Td>
      <Td className="min-w-28">
        <PastDate on={bolt.installedOn} precision={bolt.installedOnPrecision} />
        <span className="block text-sm text-muted">
          {bolt.method ? METHOD_LABELS[bolt.method] : "method not known"}
        </span>
      </Td>
      <Td numeric>
        <Quantity value={bolt.embedmentMm} unit="mm" />
      </Td>
      <Td numeric>
        <Quantity value={bolt.ratedRadialKn} unit="kN" />
        <br />
        <Quantity value={bolt.ratedAxialKn} unit="kN" className="text-sm text-muted" />
      </Td>
      <Td numeric>
        <Quantity value={bolt.bendOnsetLowKn} unit="kN" digits={1} />
        <span className="block">
          <SourceMark source={bolt.bendOnsetBasis} />
        </span>
      </Td>
      <Td className="min-w-44">
        <ConditionMark condition={bolt.condition} verdict={bolt.verdict} />
        {bolt.verdict ? (
          <span className="mt-1 block text-sm">
            <VerdictMark verdict={bolt.verdict} />
          </span>
        ) : null}
      </Td>
    </tr>
  );
}

function NaturalLine({ placement }: { placement: PlacementView }) {
  const { number, kind, role, sizeMm, note } = placement;
  return (
    <tr>
      <Th scope="row" className="type-figure text-lg">
        {number}
      </Th>
      <Td colSpan={6}>
        <span className="font-semibold">
          {kind === "bolt" ? "Empty hole" : sentence(PLACEMENT_KIND_LABELS[kind])}
        </span>
        <span className="text-muted"> · {PLACEMENT_ROLE_LABELS[role]}</span>
        {sizeMm === null ? null : (
          <span className="text-muted">
            {" "}
            · <Quantity value={sizeMm} unit="mm" />
          </span>
        )}
        {note ? <span className="block text-sm text-muted">{note}</span> : null}
      </Td>
    </tr>
  );
}

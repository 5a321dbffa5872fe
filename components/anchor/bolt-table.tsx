import Link from "next/link";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { PastDate } from "@/components/ui/date-text";
import { Quantity } from "@/components/ui/quantity";
import { SourceMark } from "@/components/ui/source-mark";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import {
  FORM_LABELS,
  METHOD_LABELS,
  metalLabel,
  PLACEMENT_KIND_LABELS,
  PLACEMENT_ROLE_LABELS,
  sentence,
} from "@/lib/domain/labels";
import type { AnchorSheet, PlacementView } from "@/lib/schemas/views/anchor";
import type { BoltView } from "@/lib/schemas/views/bolt";

const HEAD = [
  { name: "No." },
  { name: "What is in it" },
  { name: "Ø", numeric: true },
  { name: "Method" },
  { name: "Depth", numeric: true },
  { name: "Set" },
  { name: "Rated across", numeric: true },
  { name: "Rated along", numeric: true },
  { name: "Bends from", numeric: true },
  { name: "Condition" },
  { name: "Verdict" },
];

/** The parts list: every hole and natural placement, with what is in it now. */
export function BoltTable({ placements, rockBodies }: Pick<AnchorSheet, "placements" | "rockBodies">) {
  return (
    <StackTable caption="Placements and the bolts in them" head={HEAD}>
      {placements.map((placement) =>
        placement.bolt ? (
          <BoltRow key={placement.id} placement={placement} bolt={placement.bolt} />
        ) : (
          <NaturalRow key={placement.id} placement={placement} bodies={rockBodies} />
        ),
      )}
    </StackTable>
  );
}

function BoltRow({ placement, bolt }: { placement: PlacementView; bolt: BoltView }) {
  return (
    <StackRow id={`placement-${placement.number}`}>
      <Number placement={placement} />
      <StackCell wide className="max-lg:-mt-10 max-lg:pl-10 print:mt-0 print:pl-1.5">
        <Link href={`/bolts/${bolt.id}`} className="inline-block font-semibold text-link max-lg:py-1">
          {bolt.typeName ?? sentence(FORM_LABELS[bolt.form])}
        </Link>
        <span className="block text-sm text-muted">{metalsOf(bolt)}</span>
        <Role role={placement.role} />
      </StackCell>
      <StackCell label="Ø" numeric>
        <Diameter bolt={bolt} />
      </StackCell>
      <StackCell label="Method">
        {bolt.method ? METHOD_LABELS[bolt.method] : <span className="text-muted">not known</span>}
      </StackCell>
      <StackCell label="Depth" numeric>
        <Quantity value={bolt.embedmentMm} unit="mm" digits={0} />
      </StackCell>
      <StackCell label="Set">
        <PastDate on={bolt.installedOn} precision={bolt.installedOnPrecision} />
      </StackCell>
      <StackCell label="Rated across" numeric>
        <Quantity value={bolt.ratedRadialKn} unit="kN" digits={1} />
      </StackCell>
      <StackCell label="Rated along" numeric>
        <Quantity value={bolt.ratedAxialKn} unit="kN" digits={1} />
      </StackCell>
      <StackCell label="Bends from" numeric wide>
        <Onset bolt={bolt} />
      </StackCell>
      <StackCell label="Condition">
        <ConditionMark condition={bolt.condition} className="whitespace-normal" />
      </StackCell>
      <StackCell label="Verdict">
        {bolt.verdict ? (
          <VerdictMark verdict={bolt.verdict} />
        ) : (
          <span className="text-muted">not judged</span>
        )}
      </StackCell>
    </StackRow>
  );
}

function Number({ placement }: { placement: PlacementView }) {
  return (
    <StackCell head className="type-figure text-2xl lg:text-lg print:text-base">
      {placement.number}
    </StackCell>
  );
}

function Role({ role }: { role: PlacementView["role"] }) {
  if (role === "main") return null;
  return <span className="block type-label">{PLACEMENT_ROLE_LABELS[role]}</span>;
}

/** A tree, a block, a thread, gear, or a hole with nothing in it. */
function NaturalRow({ placement, bodies }: { placement: PlacementView; bodies: AnchorSheet["rockBodies"] }) {
  const { kind, role, sizeMm, note, rockBodyId } = placement;
  const body = bodies.find(({ id }) => id === rockBodyId);
  return (
    <StackRow id={`placement-${placement.number}`}>
      <Number placement={placement} />
      <StackCell wide colSpan={10} className="max-lg:-mt-10 max-lg:pl-10 print:mt-0 print:pl-1.5">
        <span className="font-semibold">
          {kind === "bolt" ? "Empty hole" : sentence(PLACEMENT_KIND_LABELS[kind])}
        </span>
        <span className="text-muted">
          {sizeMm === null ? null : (
            <>
              {" · "}
              <Quantity value={sizeMm} unit="mm" digits={0} /> across
            </>
          )}
          {body ? ` · in ${body.label}` : ""}
        </span>
        <Role role={role} />
        {note ? <span className="block text-sm text-muted">{note}</span> : null}
      </StackCell>
    </StackRow>
  );
}

function metalsOf(bolt: BoltView): string {
  const hanger =
    bolt.hangerMetal && bolt.hangerMetal !== bolt.boltMetal ? `hanger ${metalLabel(bolt.hangerMetal)}` : null;
  const link =
    bolt.linkMetal && bolt.linkMetal !== bolt.boltMetal ? `link ${metalLabel(bolt.linkMetal)}` : null;
  return [metalLabel(bolt.boltMetal), hanger, link].filter((word) => word !== null).join(", ");
}

/** Rods of a bent rod, shank of everything else. */
function Diameter({ bolt }: { bolt: BoltView }) {
  const several = bolt.rodCount !== null && bolt.rodCount > 1 && bolt.rodDiameterMm !== null;
  return (
    <>
      {several ? <span className="type-figure">{bolt.rodCount} × </span> : null}
      <Quantity value={bolt.rodDiameterMm ?? bolt.shankDiameterMm} unit="mm" />
    </>
  );
}

function Onset({ bolt }: { bolt: BoltView }) {
  return (
    <>
      {bolt.bendOnsetLowKn === null ? null : (
        <>
          <Quantity value={bolt.bendOnsetLowKn} unit="kN" digits={1} />{" "}
        </>
      )}
      <SourceMark source={bolt.bendOnsetBasis} className="lg:flex lg:justify-end" />
    </>
  );
}

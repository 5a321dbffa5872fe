"use client";

import { type ReactNode, useState } from "react";
import { v7 } from "uuid";
import { keptIds, type Kept, type PartProps } from "@/components/edit/edit-types";
import { KeptNumber, KeptSelect, KeptText } from "@/components/edit/kept-field";
import { Button } from "@/components/ui/button";
import { Checkbox } from "@/components/ui/checkbox";
import {
  ATTACHMENT_LABELS,
  PLACEMENT_KIND_LABELS,
  PLACEMENT_ROLE_LABELS,
  SHARPNESS_LABELS,
  SIDE_LABELS,
} from "@/lib/domain/labels";
import {
  ATTACHMENTS,
  PLACEMENT_KINDS,
  PLACEMENT_ROLES,
  type PlacementKind,
  SHARPNESSES,
  SIDES,
} from "@/lib/domain/vocabulary";

/** Rows of one kind that can be added and taken away again from the end. */
export function useRows(kept: Kept, list: string, first = 0) {
  const [ids, setIds] = useState<readonly string[]>(() => {
    const before = keptIds(kept, list);
    return before.length > 0 ? before : Array.from({ length: first }, () => v7());
  });
  return {
    ids,
    add: () => setIds((all) => [...all, v7()]),
    drop: () => setIds((all) => all.slice(0, -1)),
  };
}

interface RowsProps {
  rows: ReturnType<typeof useRows>;
  name: string;
  list: string;
  children: (index: number) => ReactNode;
}

/** The rows with a heading each, and the buttons to add one and leave the last one out. */
export function Rows({ rows, name, list, children }: RowsProps) {
  return (
    <div className="grid gap-6">
      {rows.ids.map((id, index) => (
        <section
          key={id}
          aria-label={`${name} ${index + 1}`}
          className="grid gap-4 border-l-4 border-line pl-4"
        >
          <h3>
            {name} <span className="type-figure">{index + 1}</span>
          </h3>
          <input type="hidden" name={`${list}.${index}.id`} value={id} readOnly />
          {children(index)}
          {index === rows.ids.length - 1 ? (
            <Button tone="quiet" onClick={rows.drop} className="justify-self-start">
              Leave out {name.toLowerCase()} {index + 1}
            </Button>
          ) : null}
        </section>
      ))}
      <Button onClick={rows.add} className="justify-self-start">
        {rows.ids.length === 0
          ? `Add ${article(name)} ${name.toLowerCase()}`
          : `Add another ${name.toLowerCase()}`}
      </Button>
    </div>
  );
}

function article(name: string): string {
  return /^[aeiou]/i.test(name) ? "an" : "a";
}

interface PlacementPartProps extends PartProps {
  /** "" or "placements.0." */
  prefix: string;
  kinds?: readonly PlacementKind[];
  bodies: readonly { id: string; label: string }[];
}

/** One hole or natural placement, in mm from placement 1 looking at the rock. */
export function PlacementPart({
  prefix,
  kinds = PLACEMENT_KINDS,
  bodies,
  kept,
  errorOf,
}: PlacementPartProps) {
  const part = { kept, errorOf };
  const p = (name: string) => prefix + name;
  const bodyIds = bodies.map(({ id }) => id);
  return (
    <div className="grid gap-4 sm:grid-cols-3">
      <KeptSelect
        {...part}
        name={p("kind")}
        label="What"
        words={kinds}
        labels={PLACEMENT_KIND_LABELS}
        fallback={kinds[0]}
      />
      <KeptSelect
        {...part}
        name={p("role")}
        label="Role"
        words={PLACEMENT_ROLES}
        labels={PLACEMENT_ROLE_LABELS}
        fallback="main"
      />
      {bodyIds.length > 0 ? (
        <KeptSelect
          {...part}
          name={p("rockBodyId")}
          label="In rock body"
          words={bodyIds}
          labels={Object.fromEntries(bodies.map(({ id, label }) => [id, label]))}
          emptyLabel="Not said"
        />
      ) : null}
      <KeptNumber {...part} name={p("xMm")} label="Right of placement 1" unit="mm" hint="Left is negative" />
      <KeptNumber {...part} name={p("yMm")} label="Above placement 1" unit="mm" hint="Below is negative" />
      <KeptNumber {...part} name={p("zMm")} label="Out of the face" unit="mm" hint="On a step or corner" />
      {kinds.includes("bolt") ? (
        <>
          <KeptNumber {...part} name={p("holeDiameterMm")} label="Hole diameter" unit="mm" />
          <KeptNumber {...part} name={p("holeDepthMm")} label="Hole depth" unit="mm" />
        </>
      ) : null}
      <KeptNumber {...part} name={p("sizeMm")} label="Size" unit="mm" hint="Of a trunk, boulder or neck" />
      <KeptNumber {...part} name={p("edgeDistanceMm")} label="To the nearest free edge" unit="mm" />
      <KeptSelect
        {...part}
        name={p("edgeSide")}
        label="That edge is"
        words={SIDES}
        labels={SIDE_LABELS}
        emptyLabel="Not measured"
      />
      <KeptText {...part} name={p("note")} label="Note" optional />
    </div>
  );
}

/** A block the placements sit in: one that is not attached may come with everything on it. */
export function RockBodyPart({ prefix, kept, errorOf }: PartProps & { prefix: string }) {
  const part = { kept, errorOf };
  const p = (name: string) => prefix + name;
  return (
    <div className="grid gap-4 sm:grid-cols-3">
      <KeptText {...part} name={p("label")} label="Name" hint="Main wall, leaning block" />
      <KeptSelect
        {...part}
        name={p("attachment")}
        label="How it holds"
        words={ATTACHMENTS}
        labels={ATTACHMENT_LABELS}
        fallback="unknown"
      />
      <KeptNumber {...part} name={p("lengthM")} label="Length" unit="m" />
      <KeptNumber {...part} name={p("widthM")} label="Width" unit="m" />
      <KeptNumber {...part} name={p("heightM")} label="Height" unit="m" />
      <KeptText {...part} name={p("note")} label="Note" optional />
    </div>
  );
}

/** An edge that ropes or slings run over. */
export function EdgePart({ prefix, kept, errorOf }: PartProps & { prefix: string }) {
  const part = { kept, errorOf };
  const p = (name: string) => prefix + name;
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <KeptText {...part} name={p("label")} label="Name" hint="Lip below the masterpoint" />
      <KeptSelect
        {...part}
        name={p("sharpness")}
        label="How sharp"
        words={SHARPNESSES}
        labels={SHARPNESS_LABELS}
        fallback="sharp"
      />
      <KeptNumber {...part} name={p("x1Mm")} label="One end right" unit="mm" />
      <KeptNumber {...part} name={p("y1Mm")} label="One end up" unit="mm" />
      <KeptNumber {...part} name={p("x2Mm")} label="Other end right" unit="mm" />
      <KeptNumber {...part} name={p("y2Mm")} label="Other end up" unit="mm" />
      <KeptText {...part} name={p("secured")} label="How it is secured" optional />
      <Checkbox
        name={p("paddingNeeded")}
        label="Needs padding"
        defaultChecked={kept[p("paddingNeeded")] === "on"}
      />
    </div>
  );
}

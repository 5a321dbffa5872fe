"use client";

import { useState } from "react";
import { FacePicker } from "@/components/install/face-picker";
import type { ErrorOf, InstallAnchor, Kept } from "@/components/install/install-types";
import { Checkbox } from "@/components/ui/checkbox";
import { Disclosure } from "@/components/ui/disclosure";
import { NumberField } from "@/components/ui/number-field";
import { SelectField } from "@/components/ui/select-field";
import { TextField } from "@/components/ui/text-field";
import { PLACEMENT_ROLE_LABELS, sentence, SIDE_LABELS } from "@/lib/domain/labels";
import { PLACEMENT_ROLES, SIDES } from "@/lib/domain/vocabulary";

interface PlacementFieldsProps {
  anchor: InstallAnchor;
  /** Put before every name: "" or "bolts.0.". */
  prefix: string;
  newPlacementId: string;
  kept: Kept;
  errorOf: ErrorOf;
  initialPlacementId: string | null;
}

const NEW = "new";

/** Which hole: one that exists, whose bolt it then replaces, or a new one with its place on the face. */
export function PlacementFields({
  anchor,
  prefix,
  newPlacementId,
  kept,
  errorOf,
  initialPlacementId,
}: PlacementFieldsProps) {
  const p = (name: string) => prefix + name;
  const [chosen, setChosen] = useState(kept[p("hole")] ?? initialPlacementId ?? NEW);
  const placement = anchor.placements.find((one) => one.id === chosen);
  return (
    <div className="grid gap-5">
      <SelectField
        name={p("hole")}
        label="Hole"
        choices={[
          ...anchor.placements.map(({ id, label }) => ({ value: id, label })),
          { value: NEW, label: "A new hole" },
        ]}
        value={chosen}
        onChange={(event) => setChosen(event.currentTarget.value)}
        error={errorOf(p("placementId"))}
      />
      {placement ? (
        <>
          <input type="hidden" name={p("placementId")} value={placement.id} />
          {placement.hasBolt ? <Replaces prefix={prefix} kept={kept} errorOf={errorOf} /> : null}
        </>
      ) : (
        <NewHole anchor={anchor} prefix={prefix} id={newPlacementId} kept={kept} errorOf={errorOf} />
      )}
    </div>
  );
}

function Replaces({ prefix, kept, errorOf }: { prefix: string; kept: Kept; errorOf: ErrorOf }) {
  const p = (name: string) => prefix + name;
  return (
    <div className="grid gap-5 border-l-4 border-warn-fill pl-4">
      <p className="text-sm text-muted">
        The bolt that is there now is recorded as removed and stays in the history of this hole.
      </p>
      <TextField
        name={p("removedWhy")}
        label="Why it came out"
        defaultValue={kept[p("removedWhy")]}
        error={errorOf(p("removedWhy"))}
      />
    </div>
  );
}

interface NewHoleProps {
  anchor: InstallAnchor;
  prefix: string;
  id: string;
  kept: Kept;
  errorOf: ErrorOf;
}

function NewHole({ anchor, prefix, id, kept, errorOf }: NewHoleProps) {
  const p = (name: string) => `${prefix}newPlacement.${name}`;
  const first = anchor.placements.length === 0;
  const [x, setX] = useState(kept[p("xMm")] ?? (first ? "0" : ""));
  const [y, setY] = useState(kept[p("yMm")] ?? (first ? "0" : ""));
  const picked =
    x !== "" && y !== "" ? { xMm: Number(x.replace(",", ".")), yMm: Number(y.replace(",", ".")) } : null;
  const usable = picked && Number.isFinite(picked.xMm) && Number.isFinite(picked.yMm) ? picked : null;
  return (
    <div className="grid gap-5">
      <input type="hidden" name={p("id")} value={kept[p("id")] ?? id} readOnly />
      <input type="hidden" name={p("kind")} value="bolt" />
      {first ? (
        <p className="text-sm text-muted">
          The first hole is placement 1: everything else is measured from it.
        </p>
      ) : (
        <FacePicker
          face={anchor.face}
          picked={usable}
          onPick={(at) => {
            setX(String(at.xMm));
            setY(String(at.yMm));
          }}
        />
      )}
      <div className="grid gap-5 sm:grid-cols-3">
        <NumberField
          name={p("xMm")}
          label="Right of placement 1"
          unit="mm"
          hint="Left is negative"
          value={x}
          onChange={(event) => setX(event.currentTarget.value)}
          error={errorOf(p("xMm"))}
          optional
        />
        <NumberField
          name={p("yMm")}
          label="Above placement 1"
          unit="mm"
          hint="Below is negative"
          value={y}
          onChange={(event) => setY(event.currentTarget.value)}
          error={errorOf(p("yMm"))}
          optional
        />
        <NumberField
          name={p("zMm")}
          label="Out of the face"
          unit="mm"
          hint="On a step or corner"
          defaultValue={kept[p("zMm")]}
          error={errorOf(p("zMm"))}
          optional
        />
        <NumberField
          name={p("holeDiameterMm")}
          label="Hole diameter"
          unit="mm"
          defaultValue={kept[p("holeDiameterMm")]}
          error={errorOf(p("holeDiameterMm"))}
          optional
        />
        <NumberField
          name={p("holeDepthMm")}
          label="Hole depth"
          unit="mm"
          defaultValue={kept[p("holeDepthMm")]}
          error={errorOf(p("holeDepthMm"))}
          optional
        />
        <SelectField
          name={p("role")}
          label="Role"
          choices={PLACEMENT_ROLES.map((value) => ({ value, label: sentence(PLACEMENT_ROLE_LABELS[value]) }))}
          defaultValue={kept[p("role")] ?? "main"}
          error={errorOf(p("role"))}
        />
      </div>
      <Disclosure summary="Edge, overhang and axis">
        <div className="grid gap-5 pt-2 sm:grid-cols-2">
          <NumberField
            name={p("edgeDistanceMm")}
            label="To the nearest free edge"
            unit="mm"
            defaultValue={kept[p("edgeDistanceMm")]}
            error={errorOf(p("edgeDistanceMm"))}
            optional
          />
          <SelectField
            name={p("edgeSide")}
            label="That edge is"
            emptyLabel="Not measured"
            choices={SIDES.map((value) => ({ value, label: sentence(SIDE_LABELS[value]) }))}
            defaultValue={kept[p("edgeSide")] ?? ""}
            error={errorOf(p("edgeSide"))}
            optional
          />
          <NumberField
            name={p("axisAzimuthDeg")}
            label="Axis points to"
            unit="°"
            hint="From true north, where it is not square to the face"
            defaultValue={kept[p("axisAzimuthDeg")]}
            error={errorOf(p("axisAzimuthDeg"))}
            optional
          />
          <NumberField
            name={p("axisElevationDeg")}
            label="Axis above level"
            unit="°"
            defaultValue={kept[p("axisElevationDeg")]}
            error={errorOf(p("axisElevationDeg"))}
            optional
          />
          <Checkbox
            name={p("overhang")}
            label="Under an overhang"
            defaultChecked={kept[p("overhang")] === "on"}
          />
        </div>
      </Disclosure>
    </div>
  );
}

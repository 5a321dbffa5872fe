import { MarginBar } from "@/components/ui/margin-bar";
import { PastDate } from "@/components/ui/date-text";
import { Quantity } from "@/components/ui/quantity";
import {
  ATTACHMENT_LABELS,
  FITTING_KIND_LABELS,
  metalLabel,
  sentence,
  SHARPNESS_LABELS,
} from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";

/** A ring or link that lost this part of its diameter is to be looked at, that one is done (see fitting.wear). */
const WORN_OUT = 0.7;

/** Rings, chains, links: how much metal is left. */
export function FittingList({ fittings }: { fittings: AnchorSheet["fittings"] }) {
  if (fittings.length === 0) return <p className="text-muted">None recorded.</p>;
  return (
    <ul className="grid gap-5 sm:grid-cols-2">
      {fittings.map((fitting) => (
        <li key={fitting.id}>
          <MarginBar
            label={`${sentence(FITTING_KIND_LABELS[fitting.kind])}, ${metalLabel(fitting.metal)}`}
            value={fitting.diameterLeftMm}
            limit={fitting.diameterMm === null ? null : fitting.diameterMm * WORN_OUT}
            unit="mm"
            digits={1}
            kind="atLeast"
            limitLabel="worn out below"
          >
            {fitting.diameterMm === null ? null : (
              <>
                <Quantity value={fitting.diameterMm} unit="mm" /> when new
                {fitting.diameterLeftMm === null ? "; nobody has measured what is left." : "."}
              </>
            )}
            {fitting.placementNumber === null ? "" : ` On placement ${fitting.placementNumber}.`}
            {fitting.replaceable ? "" : " Cannot be replaced without a new bolt."}
            {fitting.note ? ` ${fitting.note}` : ""}
          </MarginBar>
          {fitting.installedOn ? (
            <p className="text-sm text-muted">
              Since <PastDate on={fitting.installedOn} />
            </p>
          ) : null}
        </li>
      ))}
    </ul>
  );
}

/** Edges that textile touches, and how padding is kept from moving. */
export function EdgeList({ edges }: { edges: AnchorSheet["edges"] }) {
  if (edges.length === 0) return <p className="text-muted">None recorded between anchor and load.</p>;
  return (
    <ul className="divide-y divide-line border-y border-line">
      {edges.map((edge) => (
        <li key={edge.id} className="py-2">
          <span className="font-semibold">{edge.label}</span>
          <span className="text-muted"> · {SHARPNESS_LABELS[edge.sharpness]}</span>
          <span className="block">
            {edge.paddingNeeded
              ? edge.secured
                ? `Padding, kept in place by: ${edge.secured}`
                : "Padding needed; nobody has written how it is kept from moving."
              : "No padding needed."}
          </span>
        </li>
      ))}
    </ul>
  );
}

export function RockBodyList({ bodies }: { bodies: AnchorSheet["rockBodies"] }) {
  if (bodies.length === 0) return null;
  return (
    <ul className="divide-y divide-line border-y border-line">
      {bodies.map((body) => (
        <li key={body.id} className="py-2">
          <span className="font-semibold">{body.label}</span>
          <span className="text-muted"> · {ATTACHMENT_LABELS[body.attachment]}</span>
          {body.lengthM !== null && body.widthM !== null && body.heightM !== null ? (
            <span className="text-muted">
              {" "}
              · <Quantity value={body.lengthM} unit="m" /> × <Quantity value={body.widthM} unit="m" /> ×{" "}
              <Quantity value={body.heightM} unit="m" />
            </span>
          ) : null}
          {body.note ? <span className="block text-sm">{body.note}</span> : null}
        </li>
      ))}
    </ul>
  );
}

import type { ReactNode } from "react";
import type { Form, PlacementKind } from "@/lib/domain/vocabulary";

const LINE = { fill: "none", stroke: "currentColor", strokeWidth: 2 } as const;
const PLATE = { className: "fill-surface", stroke: "currentColor", strokeWidth: 1.8 } as const;

/**
 * What sits in the rock, drawn around (0, 0) where the hole is, hanging down; about 24 units high. Each family has
 * a shape of its own: a plate under a nut or a head, a rod bent round, an eye on one shank, a trunk, a block…
 */
export function PlacementGlyph({ kind, form }: { kind: PlacementKind; form: Form | null }) {
  switch (kind) {
    case "tree":
      return <Tree />;
    case "boulder":
      return <Boulder />;
    case "thread":
      return <Thread />;
    case "removable":
      return <Removable />;
    case "bolt":
      return form === null ? <circle r="5" {...LINE} strokeDasharray="2.5 2" /> : <Bolt form={form} />;
  }
}

function Bolt({ form }: { form: Form }) {
  switch (form) {
    case "glued_bent_rod":
      return (
        <>
          <path d="M-4.5 -1C-10 8-6.5 17 0 17S10 8 4.5 -1" {...LINE} strokeWidth="2.8" />
          <circle cx="-4.5" cy="-2" r="3.2" fill="currentColor" />
          <circle cx="4.5" cy="-2" r="3.2" fill="currentColor" />
        </>
      );
    case "glued_eye":
      return (
        <>
          <circle cy="9.5" r="7" {...LINE} strokeWidth="3.4" />
          <circle r="5" fill="currentColor" />
        </>
      );
    case "expansion_stud_hanger":
      return (
        <Hanger>
          <circle r="2.2" fill="currentColor" />
        </Hanger>
      );
    case "glued_stud_hanger":
      return (
        <>
          <circle r="9.5" fill="none" stroke="currentColor" strokeWidth="1.2" strokeDasharray="2 1.7" />
          <Hanger>
            <circle r="2.2" fill="currentColor" />
          </Hanger>
        </>
      );
    case "sleeve_hanger":
      return (
        <Hanger>
          <circle r="3.2" fill="none" stroke="currentColor" strokeWidth="1.4" />
        </Hanger>
      );
    case "screw_hanger":
      return (
        <Hanger>
          <path d="M-2.8 0h5.6M0-2.8v5.6" stroke="currentColor" strokeWidth="1.4" />
        </Hanger>
      );
  }
}

/** A plate with its eye below and a hexagon on top; the children tell what holds it. */
function Hanger({ children }: { children: ReactNode }) {
  return (
    <>
      <path d="M-7.5 -7H7.5L8.5 8C8.5 15 5 18 0 18S-8.5 15-8.5 8Z" {...PLATE} />
      <circle cy="11.5" r="3.6" {...LINE} strokeWidth="1.8" />
      <path d="M-5.5 0-2.75-4.75H2.75L5.5 0 2.75 4.75H-2.75Z" {...PLATE} strokeWidth="1.6" />
      {children}
    </>
  );
}

/** A trunk cut across: bark and two rings. */
function Tree() {
  return (
    <>
      <path
        d="M0-14 4-12.5 9-11 11-6.5 14-2 12.5 3.5 12 9 7 11 2 14-3.5 12.5-9 11-11 6.5-14 2-12.5-3.5-11-9-6-11.5Z"
        {...PLATE}
      />
      <circle r="7" {...LINE} strokeWidth="1.3" />
      <circle cx="-.5" cy=".5" r="3" {...LINE} strokeWidth="1.3" />
    </>
  );
}

function Boulder() {
  return (
    <>
      <path d="M-15 9-12-6-4-13 8-11 15-1 13 10 2 13Z" {...PLATE} />
      <path d="M-12-6-2-2 8-11M-2-2 2 13" {...LINE} strokeWidth="1.1" />
    </>
  );
}

/** A bridge of rock with the eye of daylight under it. */
function Thread() {
  return (
    <>
      <path d="M-14 10C-14-6-8-13 0-13S14-6 14 10H6C6 1 4-3 0-3S-6 1-6 10Z" {...PLATE} />
      <path d="M0-3C-6 14 6 14 0-3" {...LINE} strokeWidth="1.5" strokeDasharray="2.5 1.8" />
    </>
  );
}

/** A wedge on a wire. */
function Removable() {
  return (
    <>
      <path d="M-8-11H8L4 4H-4Z" {...PLATE} />
      <path d="M-2 4V14A2.5 2.5 0 0 0 2 14V4" {...LINE} strokeWidth="1.4" />
    </>
  );
}

/**
 * Words shared by the capacity estimates.
 *
 * An estimate never replaces a test or a rating: it is shown as a range and may only lower a verdict. Order
 * of trust: a recorded test > a maker's rating under a named standard > an estimate. A rating (EN 959: 25 kN
 * radial, 15 kN axial) is a breaking load and says nothing about when the bolt begins to bend.
 */
export type Source = "test" | "rating" | "estimate";

export interface Capacity {
  mode: "bend-onset" | "steel-break" | "bond" | "rock-cone" | "edge-breakout";
  /** Resistance to pull-out along the axis, N; null: this mode does not limit an axial pull. */
  axialN: number | null;
  /** Resistance across the axis, N; null: this mode does not limit a radial pull. */
  radialN: number | null;
  /** Ends of the range an estimate stands for, N, in the direction the mode is about. */
  lowN?: number;
  highN?: number;
  source: Source;
  /** a in (N/NR)^a + (V/VR)^a <= 1: 1 bend onset, 1.5 rock, 2 steel. */
  interactionExponent: 1 | 1.5 | 2;
}

/** The part of a bolt's demand that capacity is held against: axial (+ = pull-out) and radial, N. */
export interface AxialRadial {
  axialN: number;
  radialN: number;
}

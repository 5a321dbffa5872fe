import { isOutOfUseAtOnce } from "@/lib/domain/finding/out-of-use";
import type { Depth, ReportKind } from "@/lib/domain/vocabulary";

/** What each kind is for, in the words of somebody at the anchor. */
export const KIND_DETAILS: Readonly<Record<ReportKind, string>> = {
  routine_check: "Looked at it, and this is how it is",
  deformation: "Something is bent",
  corrosion: "Rust, pits, stains, cracks",
  nut_loose: "The nut can be turned by hand",
  hanger_spins: "The hanger turns on its bolt",
  stud_turns: "The stud turns in its hole",
  glue_in_moves: "A glued bolt has play or turns",
  rock: "A crack, a flake, a hollow sound",
  wear: "A ring, link or eye is worn thin",
  after_storm: "It has carried a storm or a big load",
  missing: "It is not there any more",
  not_in_register: "There is an anchor nobody has written down",
  other: "Anything else somebody should know",
};

export const DEPTH_DETAILS: Readonly<Record<Depth, string>> = {
  seen: "Looked, did not touch",
  handled: "Pulled and turned by hand",
  torqued: "With a torque wrench",
  pulled: "With a measured pull",
};

export const GRADE_CHOICES = [
  { value: "0", label: "0 · as new" },
  { value: "1", label: "1 · slight, no effect" },
  { value: "2", label: "2 · clear, watch it" },
  { value: "3", label: "3 · serious, plan its replacement" },
  { value: "4", label: "4 · failed or about to" },
] as const;

/** Whether what is typed so far would take the bolt and its anchor out of use the moment it is sent. */
export function wouldTakeOutOfUse(kind: ReportKind | null, typed: Readonly<Record<string, string>>): boolean {
  if (kind === null) return false;
  const yes = (key: string) => (typed[`measured.${key}`] === "true" ? true : null);
  const angle = Number((typed["measured.bendAngleDeg"] ?? "").replace(",", "."));
  return isOutOfUseAtOnce({
    kind,
    bendAngleDeg: Number.isFinite(angle) && typed["measured.bendAngleDeg"] ? angle : null,
    metalCracked: yes("metalCracked"),
    crackNew: yes("crackNew"),
    crackMoves: yes("crackMoves"),
    soundsHollow: yes("soundsHollow"),
  });
}

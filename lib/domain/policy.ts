import type { Use } from "@/lib/domain/vocabulary";

/** Working and peak case of one use, as the area has agreed. */
export interface UseDemand {
  workingKn: number;
  peakKn: number;
  /** The peak is compared with the breaking strength only, never with bend onset. */
  peakStrengthOnly: boolean;
}

/** The load policy of an area: versioned, editable by its stewards, shown wherever it was used. */
export interface LoadPolicy {
  version: number;
  demand: Readonly<Record<Use, UseDemand>>;
  /** Months between checks, by use. */
  checkIntervalMonths: Readonly<Record<Use, number>>;
  /** Putting an anchor back in service needs two people. */
  secondPersonForReturn: boolean;
  /** Fewest sound main bolts with which an anchor whose bolt is out may still be "check first". */
  minSoundBolts: Readonly<Record<Use, number>>;
}

/** Common practice: the demand table of the product's design; peak of belay through one bolt is strength only. */
export const DEFAULT_POLICY: LoadPolicy = {
  version: 1,
  demand: {
    highline: { workingKn: 6, peakKn: 12, peakStrengthOnly: false },
    protection: { workingKn: 8, peakKn: 20, peakStrengthOnly: true },
    directional: { workingKn: 8, peakKn: 20, peakStrengthOnly: true },
    belay: { workingKn: 6, peakKn: 12, peakStrengthOnly: false },
    lower_off: { workingKn: 3, peakKn: 8, peakStrengthOnly: false },
    abseil: { workingKn: 3, peakKn: 12, peakStrengthOnly: false },
    rope_access: { workingKn: 6, peakKn: 15, peakStrengthOnly: false },
  },
  checkIntervalMonths: {
    highline: 12,
    belay: 24,
    lower_off: 24,
    abseil: 24,
    protection: 36,
    rope_access: 6,
    directional: 24,
  },
  secondPersonForReturn: false,
  minSoundBolts: {
    highline: 3,
    belay: 2,
    lower_off: 2,
    abseil: 2,
    protection: 1,
    rope_access: 2,
    directional: 1,
  },
};

import type { NumberSource } from "@/components/ui/source-mark";
import { ONSET_BASES, type RuleCode } from "@/lib/domain/vocabulary";
import type { FindingView } from "@/lib/schemas/views/common";

/** What a margin bar needs to show the two numbers a reason compared. */
export interface ReasonMargin {
  label: string;
  value: number;
  limit: number;
  unit: "kN" | "mm";
  digits: number;
  kind: "atMost" | "atLeast";
  limitLabel: string;
  source?: NumberSource;
}

type Numbers = FindingView["numbers"];

/** How each rule that compares two numbers names them. */
const MARGINS: Readonly<Partial<Record<RuleCode, (numbers: Numbers) => ReasonMargin | null>>> = {
  "load.bend": (numbers) => load(numbers, "onsetKn", "bends from", basisOf(numbers)),
  "load.strength": (numbers) => load(numbers, "ratedRadialKn", "rated"),
  "rock.embedment": (numbers) => atLeast(numbers, "Depth", "embedmentMm", "wantedMm", "wanted"),
  "rock.edge": (numbers) => atLeast(numbers, "To the free edge", "edgeDistanceMm", "wantedMm", "wanted"),
  "eye.radius": (numbers) => atLeast(numbers, "Thickness under textile", "thicknessMm", "wantedMm", "wanted"),
  "record.standard": (numbers) =>
    atLeast(numbers, "Rated across", "ratedRadialKn", "wantedRadialKn", "standard", "kN"),
};

/** The two numbers behind a reason as a bar; null where it compares words, or one of them is not known. */
export function reasonMargin({ code, numbers }: Pick<FindingView, "code" | "numbers">): ReasonMargin | null {
  return MARGINS[code]?.(numbers) ?? null;
}

function load(
  numbers: Numbers,
  limitKey: string,
  limitLabel: string,
  source?: NumberSource,
): ReasonMargin | null {
  const value = numberOf(numbers, "radialKn");
  const limit = numberOf(numbers, limitKey);
  if (value === null || limit === null) return null;
  return {
    label: "Across the bolt",
    value,
    limit,
    unit: "kN",
    digits: 1,
    kind: "atMost",
    limitLabel,
    ...(source ? { source } : {}),
  };
}

function atLeast(
  numbers: Numbers,
  label: string,
  valueKey: string,
  limitKey: string,
  limitLabel: string,
  unit: "kN" | "mm" = "mm",
): ReasonMargin | null {
  const value = numberOf(numbers, valueKey);
  const limit = numberOf(numbers, limitKey);
  if (value === null || limit === null) return null;
  return { label, value, limit, unit, digits: unit === "kN" ? 1 : 0, kind: "atLeast", limitLabel };
}

function numberOf(numbers: Numbers, key: string): number | null {
  const value = numbers[key];
  return typeof value === "number" ? value : null;
}

function basisOf(numbers: Numbers): NumberSource | undefined {
  return ONSET_BASES.find((basis) => basis === numbers["basis"]);
}

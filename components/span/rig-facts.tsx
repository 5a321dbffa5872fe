import { Fact, Facts } from "@/components/ui/facts";
import { sentence } from "@/lib/domain/labels";
import { formatQuantity } from "@/lib/shared/format";
import { readableText } from "@/lib/shared/readable-text";

type Rig = Readonly<Record<string, unknown>>;

/** What is usually rigged, as the group wrote it down. Nested parts become lines of their own. */
export function RigFacts({ rig }: { rig: Rig | null }) {
  if (rig === null) return <p className="text-muted">Nobody has written down what is usually rigged here.</p>;
  return (
    <Facts>
      {Object.entries(rig).map(([key, value]) => (
        <Fact key={key} name={sentence(nameOf(key))}>
          {inWords(key, value)}
        </Fact>
      ))}
    </Facts>
  );
}

/** How the unit at the end of a key is written. */
const UNITS: Readonly<Record<string, string>> = {
  kn: "kN",
  m: "m",
  kg: "kg",
  mps: "m/s",
  mm: "mm",
  percent: "%",
};

/** `standingTensionKn` → ["standing", "tension", "kn"]. */
function partsOf(key: string): string[] {
  return key
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .toLowerCase()
    .split(" ");
}

function unitOf(key: string): string | null {
  const parts = partsOf(key);
  return parts.length > 1 ? (UNITS[parts.at(-1) ?? ""] ?? null) : null;
}

/** The key without its unit: "standing tension". */
function nameOf(key: string): string {
  const parts = partsOf(key);
  return (unitOf(key) === null ? parts : parts.slice(0, -1)).join(" ");
}

function inWords(key: string, value: unknown): string {
  if (value === null || value === undefined) return "not recorded";
  if (typeof value === "number") {
    const unit = unitOf(key);
    return unit === null ? String(value) : formatQuantity(value, unit);
  }
  if (Array.isArray(value)) return value.map((one) => inWords("", one)).join("; ");
  if (typeof value === "object") {
    return Object.entries(value)
      .map(([inner, part]) => `${nameOf(inner)} ${inWords(inner, part)}`)
      .join(", ");
  }
  return readableText(String(value));
}

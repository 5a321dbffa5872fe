import { Fact, Facts } from "@/components/ui/facts";
import { sentence } from "@/lib/domain/labels";

/** What is usually rigged, as the group wrote it down. Nested parts become lines of their own. */
export function RigFacts({ rig }: { rig: Readonly<Record<string, unknown>> | null }) {
  if (rig === null) return <p className="text-muted">Nobody has written down what is usually rigged here.</p>;
  return (
    <Facts>
      {Object.entries(rig).map(([key, value]) => (
        <Fact key={key} name={wordsOf(key)}>
          {inWords(value)}
        </Fact>
      ))}
    </Facts>
  );
}

const UNITS: Readonly<Record<string, string>> = {
  kn: "kN",
  m: "m",
  kg: "kg",
  mps: "m/s",
  mm: "mm",
  percent: "%",
};

/** `standingTensionKn` → "Standing tension, kN". */
function wordsOf(key: string): string {
  const parts = key
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .toLowerCase()
    .split(" ");
  const unit = UNITS[parts.at(-1) ?? ""];
  const words = sentence((unit && parts.length > 1 ? parts.slice(0, -1) : parts).join(" "));
  return unit && parts.length > 1 ? `${words}, ${unit}` : words;
}

function inWords(value: unknown): string {
  if (value === null || value === undefined) return "not recorded";
  if (Array.isArray(value)) return value.map(inWords).join("; ");
  if (typeof value === "object") {
    return Object.entries(value)
      .map(([key, inner]) => `${wordsOf(key).toLowerCase()} ${inWords(inner)}`)
      .join(", ");
  }
  return String(value);
}

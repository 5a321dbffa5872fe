import { PastDate } from "@/components/ui/date-text";
import { Quantity } from "@/components/ui/quantity";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import type { PullTestView } from "@/lib/schemas/views/bolt";

const MODES: Readonly<Record<PullTestView["mode"], string>> = {
  held: "held",
  moved: "moved",
  bent: "bent",
  broke: "broke",
  pulled_out: "pulled out",
};

const HEAD = [
  { name: "Date" },
  { name: "Pulled" },
  { name: "Load", numeric: true },
  { name: "Held for", numeric: true },
  { name: "Moved by", numeric: true },
  { name: "Result" },
];

/** Loads somebody really put on it. */
export function PullTestTable({ tests }: { tests: readonly PullTestView[] }) {
  if (tests.length === 0) return <p className="text-muted">Nobody has pulled on it with a gauge.</p>;
  return (
    <StackTable caption="Pull tests" head={HEAD}>
      {tests.map((test) => (
        <StackRow key={test.id}>
          <StackCell head>
            <PastDate on={test.testedOn} />
          </StackCell>
          <StackCell label="Pulled">
            {test.direction === "axial" ? "along its axis" : "across the bolt"}
          </StackCell>
          <StackCell label="Load" numeric>
            <Quantity value={test.loadKn} unit="kN" digits={1} />
          </StackCell>
          <StackCell label="Held for" numeric>
            <Quantity value={test.holdS} unit="s" digits={0} />
          </StackCell>
          <StackCell label="Moved by" numeric>
            <Quantity value={test.movementMm} unit="mm" digits={1} />
          </StackCell>
          <StackCell label="Result" wide>
            <span className="font-semibold">{MODES[test.mode]}</span>
            {test.note ? <span className="block text-sm text-muted">{test.note}</span> : null}
          </StackCell>
        </StackRow>
      ))}
    </StackTable>
  );
}

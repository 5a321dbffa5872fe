import type { AxialRadial, Capacity, Source } from "./capacity";
import { utilisation } from "./utilisation";

/** Trust, lowest number first. */
const TRUST: Readonly<Record<Source, number>> = { test: 0, rating: 1, estimate: 2 };

/**
 * Which capacity decides for a demand.
 *
 * Two steps. Within each mode the best-trusted source speaks and silences the others: test > rating >
 * estimate; of several with the same trust, the lowest. Between modes the lowest capacity along the
 * direction of the demand governs, that is the largest u^(1/a) (see `utilisation`): modes with different
 * exponents cannot be compared by u itself. A rating for breaking therefore never silences an estimate for
 * bending: they answer different questions, and an estimate may lower what is said.
 *
 * Worked example (also a test): a rating of 25 kN and an estimate of 39 kN for breaking, an onset of 4 kN
 * from a test; 5 kN across: bend onset governs at 1.25.
 *
 * @throws RangeError when the list is empty, or as `utilisation` does.
 */
export function governing(
  c: readonly Capacity[],
  d: AxialRadial,
): { mode: Capacity["mode"]; utilisation: number; source: Source } {
  const trusted = c.filter((one) =>
    c.every((other) => other.mode !== one.mode || TRUST[one.source] <= TRUST[other.source]),
  );
  const [first, ...rest] = trusted.map((capacity) => {
    const used = utilisation(d, capacity);
    return { capacity, used, loadFactor: used ** (1 / capacity.interactionExponent) };
  });
  if (first === undefined) throw new RangeError("capacities must hold at least 1 entry, got 0");
  const worst = rest.reduce((a, b) => (b.loadFactor > a.loadFactor ? b : a), first);
  return { mode: worst.capacity.mode, utilisation: worst.used, source: worst.capacity.source };
}

import { BoltChain } from "@/components/bolt/bolt-chain";
import type { PlacementView } from "@/lib/schemas/views/anchor";

/** What stood in each hole before: the chain of bolts, newest first. Holes with their first bolt are left out. */
export function HoleHistory({ placements }: { placements: readonly PlacementView[] }) {
  const withPast = placements.filter((placement) => placement.former.length > 0);
  if (withPast.length === 0)
    return <p className="text-muted">Every bolt is the first in its hole, as far as recorded.</p>;
  return (
    <ol className="grid gap-4 sm:grid-cols-2 print:grid-cols-2">
      {withPast.map(({ id, number, bolt, former }) => (
        <li key={id} className="keep-together grid grid-cols-[2rem_1fr] gap-2">
          <span className="pt-1.5 type-figure text-lg">
            <span className="sr-only">Placement </span>
            {number}
          </span>
          <BoltChain chain={[...(bolt ? [bolt] : []), ...former]} />
        </li>
      ))}
    </ol>
  );
}

import type { LoadPolicy } from "@/lib/domain/policy";
import type { Level, Use } from "@/lib/domain/vocabulary";
import type { AnchorQuestion } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";
import { isSerious } from "@/lib/domain/finding/traits";

/** Highline placements from which losing one leaves a share that can be judged without the geometry. */
const ENOUGH_WITHOUT_GEOMETRY = 3;

/**
 * load.one-lost: what is left when one placement goes.
 *
 * Every placement that can take the load counts, main or backup, bolt or tree: a backup is there for
 * exactly this. Protection, directionals and rows are single by nature and have the next bolt below. How
 * the survivors share after a loss is computed from the geometry where there is one; here stand the cases
 * that need no computing.
 */
export function loadOneLost(e: AnchorQuestion, policy: LoadPolicy): Finding | null {
  const { mainCount, backupCount, hasGeometry } = e.group;
  const total = mainCount + backupCount;
  if (isSingleByNature(e.use) || e.group.isRow === true || total === 0) return null;

  const peakKn = policy.demand[e.use].peakKn;
  const numbers = { use: e.use, mainCount, backupCount, hasGeometry, peakKn };
  if (total === 1) {
    const level: Level = isSerious(e.use) || e.use === "belay" ? "stop" : "limit";
    return {
      code: "load.one-lost",
      level,
      title: "Everything hangs on one placement",
      text: "There is a single placement: when it goes, nothing is left.",
      clearsWhen: "a second placement that can take the load alone is made",
      numbers,
      assumed: [],
      source: { mark: "common_practice", name: "No single point of failure where a person hangs" },
    };
  }
  if (e.use !== "highline" || hasGeometry || total >= ENOUGH_WITHOUT_GEOMETRY) return null;
  return {
    code: "load.one-lost",
    level: "ask",
    title: "Not known what is left when one placement goes",
    text: `There are ${total} placements and their positions are not recorded, so the load on the survivor cannot be computed.`,
    clearsWhen: `the positions of the placements and the masterpoint are recorded, or there are ${ENOUGH_WITHOUT_GEOMETRY} placements`,
    numbers,
    assumed: [],
    source: { mark: "common_practice", name: "A highline anchor survives the loss of any one placement" },
  };
}

function isSingleByNature(use: Use): boolean {
  return use === "protection" || use === "directional";
}

import type { AnchorQuestion } from "@/lib/domain/finding/evidence";
import type { Finding } from "@/lib/domain/finding/types";
import { exceeds, isSome, mm, percent, sentence } from "@/lib/domain/finding/words";

/** Parts of the diameter gone: discard, and limit (the latter as for chain in EN 818-6, from memory). */
const STOP_AT = 0.3;
const LIMIT_AT = 0.1;

/** fitting.wear: the most worn ring, chain or link. One that was never measured says nothing. */
export function fittingWear(e: AnchorQuestion): Finding | null {
  const worn = e.fittings
    .flatMap((fitting) => {
      const { diameterMm, diameterLeftMm, kind } = fitting;
      if (kind === "sling" || !isSome(diameterMm) || diameterLeftMm === null) return [];
      return [{ fitting, diameterMm, diameterLeftMm, lost: 1 - diameterLeftMm / diameterMm }];
    })
    .sort((a, b) => b.lost - a.lost)[0];
  if (worn === undefined || exceeds(LIMIT_AT, worn.lost)) return null;
  const stop = !exceeds(STOP_AT, worn.lost);
  const { kind, fittingId } = worn.fitting;
  return {
    code: "fitting.wear",
    level: stop ? "stop" : "limit",
    title: `${sentence(kind)} worn by ${percent(worn.lost)}`,
    text: `${mm(worn.diameterLeftMm)} are left of ${mm(worn.diameterMm)}: from ${percent(LIMIT_AT)} it limits, from ${percent(STOP_AT)} it is discarded.`,
    clearsWhen: `a ${kind} with more than ${mm((1 - LIMIT_AT) * worn.diameterMm)} of ${mm(worn.diameterMm)} left hangs there`,
    numbers: {
      fittingId,
      diameterMm: worn.diameterMm,
      diameterLeftMm: worn.diameterLeftMm,
      lostPart: worn.lost,
    },
    assumed: [],
    source: { mark: "from_memory", name: "EN 818-6 for chain; 30 %: common practice" },
  };
}

import type { Level } from "@/lib/domain/vocabulary";
import type { AnchorQuestion, PlacementFacts } from "@/lib/domain/finding/evidence";
import { isSerious } from "@/lib/domain/finding/traits";
import type { Finding } from "@/lib/domain/finding/types";

/**
 * rock.one-body: main and backup, or everything there is, in one block that may come off whole.
 *
 * A body counts when it is recorded as detached or hollow, or when its attachment is recorded as not known.
 * Rock for which no body is recorded is the cliff itself. An anchor without a backup whose placements all
 * sit in one such block is no better than one whose backup does.
 */
export function rockOneBody(e: AnchorQuestion): Finding | null {
  const carrying = e.group.placements.filter((placement) => placement.role !== "edge");
  const found = e.group.rockBodies
    .filter((body) => body.attachment !== "attached" && holdsBoth(body.rockBodyId, carrying))
    .map((body) => ({ body, level: levelOf(e, body.attachment === "unknown") }))
    .filter((one): one is typeof one & { level: Level } => one.level !== null)
    .sort((a, b) => (a.level === b.level ? 0 : a.level === "stop" ? -1 : 1))[0];
  if (found === undefined) return null;

  const { body, level } = found;
  const unknown = body.attachment === "unknown";
  return {
    code: "rock.one-body",
    level,
    title: unknown ? "Not known whether the block is attached" : "Main and backup in one loose block",
    text: `${body.label} holds the placements that should save each other; it is ${unknown ? "not known to be attached" : body.attachment}.`,
    clearsWhen: unknown
      ? "the attachment of the block is recorded"
      : "a placement that can take the load is made outside the block",
    numbers: { rockBodyId: body.rockBodyId, attachment: body.attachment, use: e.use },
    assumed: [],
    source: { mark: "common_practice", name: "A backup does not share the main anchor's block" },
  };
}

function levelOf(e: AnchorQuestion, unknown: boolean): Level | null {
  if (unknown) return isSerious(e.use) ? "ask" : null;
  return isSerious(e.use) ? "stop" : "limit";
}

function holdsBoth(rockBodyId: string, carrying: readonly PlacementFacts[]): boolean {
  const inside = carrying.filter((placement) => placement.rockBodyId === rockBodyId);
  const roles = new Set(inside.map((placement) => placement.role));
  return (
    (roles.has("main") && roles.has("backup")) || (inside.length > 0 && inside.length === carrying.length)
  );
}

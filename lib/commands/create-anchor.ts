import "server-only";
import { inTransaction, type Tx } from "@/db/client";
import {
  findAnchorDigest,
  insertAnchor,
  insertEdges,
  insertFittings,
  insertPlacements,
  insertRockBodies,
  listCodesLike,
} from "@/db/repositories/anchors";
import { appendEvents } from "@/db/repositories/events";
import { lockSite, type SiteRow } from "@/db/repositories/stewarding";
import type { CommandContext } from "@/lib/commands/context";
import { digestOf } from "@/lib/commands/digest";
import { authorize } from "@/lib/commands/writing/authorize";
import { reevaluate } from "@/lib/commands/writing/reevaluate";
import { idTaken, invalid, isReplay, notFound } from "@/lib/commands/writing/refusals";
import { seaDistanceColumns } from "@/lib/commands/writing/sea-distance";
import { createdBy } from "@/lib/commands/writing/stamp";
import { audience } from "@/lib/policy/audience";
import type { CreateAnchorInput, NewPlacementInput } from "@/lib/schemas/anchor";
import type { FieldProblem } from "@/lib/shared/errors";

/** An anchor with its placements, rock bodies, edges and fittings, in one go. Bolts are logged afterwards. */
export async function createAnchor(
  ctx: CommandContext,
  input: CreateAnchorInput,
): Promise<{ id: string; replayed: boolean }> {
  const digest = digestOf(input);
  return inTransaction(ctx.db, async (tx) => {
    const site = await lockSite(tx, audience(ctx.actor), input.siteId);
    if (!site) throw notFound();
    const person = authorize(ctx.actor, "anchor.create", { areaId: site.areaId });
    if (isReplay(await findAnchorDigest(tx, input.id), digest)) return { id: input.id, replayed: true };

    const placements = numbered(input.placements);
    const problems = partProblems(input, placements);
    if (problems.length > 0) throw invalid(problems);

    const stamp = createdBy(person, ctx.now);
    const added = await insertAnchor(tx, {
      ...factsOf(input),
      ...(await seaDistanceColumns(tx, input.point, input)),
      code: await nextCode(tx, site),
      digest,
      ...stamp,
    });
    const own = <T extends object>(part: T) => ({ ...part, anchorId: input.id, ...stamp });
    const stored =
      added &&
      (await insertRockBodies(tx, input.rockBodies.map(own))) &&
      (await insertPlacements(tx, placements.map(own))) &&
      (await insertEdges(tx, input.edges.map(own))) &&
      (await insertFittings(tx, input.fittings.map(own)));
    if (!stored) throw idTaken();

    await appendEvents(tx, ctx, [
      {
        areaId: site.areaId,
        anchorId: input.id,
        subjectType: "anchor",
        subjectId: input.id,
        kind: "anchor.created",
        summary: `Entered ${input.label} with ${placements.length} placements`,
        after: { label: input.label, uses: input.uses, siteId: input.siteId },
      },
    ]);
    await reevaluate(tx, ctx, [input.id]);
    return { id: input.id, replayed: false };
  });
}

/** The anchor's own columns, without its parts. */
function factsOf(input: CreateAnchorInput) {
  const { rockBodies: _bodies, placements: _holes, edges: _edges, fittings: _fittings, ...facts } = input;
  return facts;
}

/** Placements without a number get the next free one. */
function numbered(placements: readonly NewPlacementInput[]): (NewPlacementInput & { number: number })[] {
  const taken = new Set(placements.map((placement) => placement.number));
  let next = 1;
  return placements.map((placement) => {
    if (placement.number !== undefined) return { ...placement, number: placement.number };
    while (taken.has(next)) next += 1;
    taken.add(next);
    return { ...placement, number: next };
  });
}

/** What the parts say about each other that cannot be. */
function partProblems(
  { rockBodies, fittings }: CreateAnchorInput,
  placements: readonly { id: string; number: number; rockBodyId?: string | null }[],
): FieldProblem[] {
  const bodyIds = new Set(rockBodies.map((body) => body.id));
  const placementIds = new Set(placements.map((placement) => placement.id));
  const numbers = placements.map((placement) => placement.number);
  return [
    ...placements.flatMap(({ number, rockBodyId }, index) => [
      ...(numbers.indexOf(number) < index
        ? [{ path: `placements.${index}.number`, message: `Number ${number} is there twice.` }]
        : []),
      ...(rockBodyId && !bodyIds.has(rockBodyId)
        ? [{ path: `placements.${index}.rockBodyId`, message: "This rock body is not among those sent." }]
        : []),
    ]),
    ...fittings.flatMap(({ placementId }, index) =>
      placementId && !placementIds.has(placementId)
        ? [{ path: `fittings.${index}.placementId`, message: "This placement is not among those sent." }]
        : [],
    ),
  ];
}

/** `GC-07`: the first letters of the site's words and the next number. The site's lock keeps two from taking it. */
async function nextCode(tx: Tx, site: SiteRow): Promise<string> {
  const words = site.slug.split("-").map((word) => word.charAt(0).toUpperCase());
  const prefix = words.length > 1 ? words.slice(0, 3).join("") : site.slug.slice(0, 2).toUpperCase();
  const taken = (await listCodesLike(tx, `${prefix}-`))
    .map((code) => Number(code.slice(prefix.length + 1)))
    .filter((number) => Number.isInteger(number));
  return `${prefix}-${String(Math.max(0, ...taken) + 1).padStart(2, "0")}`;
}

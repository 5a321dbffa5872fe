import "server-only";
import { findPlacement } from "@/db/repositories/anchors";
import {
  type BoltRow,
  findAdhesive,
  findBoltInForce,
  findBoltType,
  insertBolt,
  updateBoltRow,
} from "@/db/repositories/bolts";
import { appendEvents } from "@/db/repositories/events";
import { answerReports } from "@/db/repositories/reports";
import { makePlacement } from "@/lib/commands/add-placement";
import type { CommandContext } from "@/lib/commands/context";
import { dayAt } from "@/lib/commands/evaluation/evaluate-anchors";
import { glueUsableFrom, usableInWords } from "@/lib/commands/install/glue-time";
import type { OnAnchor } from "@/lib/commands/writing/on-anchor";
import { idTaken, invalid, invalidField } from "@/lib/commands/writing/refusals";
import { by, createdBy } from "@/lib/commands/writing/stamp";
import { formOf, installProblems, isSetWithGlue } from "@/lib/domain/bolt/draft-install";
import { REPORT_KINDS } from "@/lib/domain/vocabulary";
import type { InstallFacts } from "@/lib/schemas/bolt";

export interface Installed {
  id: string;
  placementId: string;
  placementNumber: number;
  replacedBoltId: string | null;
  usableFrom: string | null;
}

/** What a new bolt answers by itself; damage to the rock stays. */
const ANSWERED_BY_NEW_BOLT = REPORT_KINDS.filter((kind) => kind !== "rock");

/**
 * Puts one bolt on record in the caller's transaction: makes the hole when asked, takes the former bolt out,
 * keeps the chain, answers what was open against the former one. The caller evaluates afterwards.
 */
export async function installBolt(
  ctx: CommandContext,
  on: OnAnchor,
  facts: InstallFacts,
  digest: string,
): Promise<Installed> {
  const { tx, anchor, person } = on;
  const placement = await placementFor(ctx, on, facts);
  const former = facts.newPlacement ? null : await findBoltInForce(tx, placement.id);
  const today = dayAt(ctx.now, anchor.timeZone);
  const { form, type, adhesive } = await checked(on, facts, former, today);
  const installedOn =
    facts.installedOn ?? (facts.installedAt ? dayAt(facts.installedAt, anchor.timeZone) : null);
  const usableFrom = isSetWithGlue(form, facts.method)
    ? glueUsableFrom(
        {
          adhesive,
          installedOn,
          installedAt: facts.installedAt ?? null,
          glueTempC: facts.glueTempC ?? null,
          rockTempC: facts.rockTempC ?? null,
        },
        { now: ctx.now, today },
      )
    : null;

  if (former) await takeOut(ctx, on, former, installedOn ?? today, facts.removedWhy ?? "Replaced");
  const { newPlacement: _hole, installedAt: _at, removedWhy: _why, ...columns } = facts;
  const added = await insertBolt(tx, {
    ...columns,
    placementId: placement.id,
    form,
    installedOn,
    installedBy: facts.installedBy ?? (installedOn === today ? person.name : null),
    installedByUserId: !facts.installedBy && installedOn === today ? person.userId : null,
    usableFrom,
    replacesBoltId: former?.id ?? null,
    digest,
    ...createdBy(person, ctx.now),
  });
  if (!added) throw idTaken();
  await answerReports(
    tx,
    { placementId: placement.id, kinds: ANSWERED_BY_NEW_BOLT, how: "The bolt was replaced." },
    by(person, ctx.now),
  );
  await appendEvents(tx, ctx, [
    {
      areaId: anchor.areaId,
      anchorId: anchor.id,
      subjectType: "bolt",
      subjectId: facts.id,
      kind: "bolt.installed",
      summary: `Placement ${placement.number}: ${type?.name ?? "bolt"} ${former ? "replaces the former bolt" : "installed"}${usableInWords(usableFrom, anchor.timeZone)}`,
      after: { ...columns, form, usableFrom: usableFrom?.toISOString() ?? null },
    },
  ]);
  return {
    id: facts.id,
    placementId: placement.id,
    placementNumber: placement.number,
    replacedBoltId: former?.id ?? null,
    usableFrom: usableFrom?.toISOString() ?? null,
  };
}

async function placementFor(
  ctx: CommandContext,
  on: OnAnchor,
  facts: InstallFacts,
): Promise<{ id: string; number: number }> {
  if (facts.newPlacement) {
    const kind = facts.newPlacement.kind ?? "bolt";
    if (kind !== "bolt") throw invalidField("newPlacement.kind", "A bolt goes into a hole.");
    return { id: facts.newPlacement.id, number: await makePlacement(ctx, on, facts.newPlacement, null) };
  }
  const placement = facts.placementId ? await findPlacement(on.tx, facts.placementId) : null;
  if (!placement || placement.anchorId !== on.anchor.id || placement.struckAt) {
    throw invalidField("placementId", "This placement is not one of this anchor's.");
  }
  if (placement.kind !== "bolt")
    throw invalidField("placementId", "This placement is not a hole for a bolt.");
  return placement;
}

async function checked({ tx }: OnAnchor, facts: InstallFacts, former: BoltRow | null, today: string) {
  const type = facts.boltTypeId ? await findBoltType(tx, facts.boltTypeId) : null;
  if (facts.boltTypeId && !type) throw invalidField("boltTypeId", "There is no such type in the catalogue.");
  const adhesive = facts.adhesiveId ? await findAdhesive(tx, facts.adhesiveId) : null;
  if (facts.adhesiveId && !adhesive) throw invalidField("adhesiveId", "There is no such adhesive.");
  const formerInstalledOn =
    former?.installedOnPrecision === "day" && (facts.installedOnPrecision ?? "day") === "day"
      ? former.installedOn
      : null;
  const problems = installProblems(facts, { type, formerInstalledOn, today });
  const form = formOf(facts, type);
  if (problems.length > 0 || form === null) throw invalid(problems);
  return { form, type, adhesive };
}

/** Takes a bolt out of its hole; its record and everything said about it stay. */
export async function takeOut(
  ctx: CommandContext,
  { tx, anchor, person }: OnAnchor,
  bolt: BoltRow,
  removedOn: string,
  why: string,
): Promise<void> {
  await updateBoltRow(
    tx,
    bolt.id,
    { removedOn, removedBy: person.name, removedWhy: why, condition: "removed", derivedCondition: "removed" },
    by(person, ctx.now),
  );
  await appendEvents(tx, ctx, [
    {
      areaId: anchor.areaId,
      anchorId: anchor.id,
      subjectType: "bolt",
      subjectId: bolt.id,
      kind: "bolt.removed",
      summary: "Taken out of its hole",
      before: { condition: bolt.condition },
      after: { removedOn },
      reason: why,
    },
  ]);
}

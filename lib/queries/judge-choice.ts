import "server-only";
import { getDb } from "@/db/client";
import { findAnchorHead } from "@/db/repositories/anchor-read";
import { policyOf } from "@/db/repositories/area-read";
import { placedNew } from "@/lib/domain/catalogue/catalogue-matrix";
import { whatIf, type WhatIfAnswer } from "@/lib/domain/finding/what-if";
import type { Use } from "@/lib/domain/vocabulary";
import { audience } from "@/lib/policy/audience";
import { can } from "@/lib/policy/can";
import { getBoltType } from "@/lib/queries/bolt-types";
import type { ChoiceInput } from "@/lib/schemas/choice";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

export interface JudgedChoice {
  answers: readonly { use: Use; answer: WhatIfAnswer }[];
  policyVersion: number;
}

/**
 * The verdict on a type at one anchor before it is placed: for every use of the anchor, under the area's own
 * demand, in the anchor's own place and rock. One bolt carries all. What is typed already counts; what is not
 * is taken as the standard wants it. @throws AppError `not_found`, `forbidden`.
 */
export async function judgeChoice(actor: Actor, input: ChoiceInput, now: Date): Promise<JudgedChoice> {
  const db = getDb();
  const head = await findAnchorHead(db, audience(actor), { id: input.anchorId });
  if (!head) throw new AppError("not_found", "There is no such anchor, or it is not shown to you.");
  if (!can(actor, "bolt.install", { areaId: head.area.id })) {
    throw new AppError("forbidden", "Bolters of this area log installs.");
  }
  const [type, policy] = await Promise.all([
    getBoltType(actor, input.boltTypeId),
    policyOf(db, head.area.id),
  ]);
  const { anchor, site, area } = head;
  const onDate = now.toISOString().slice(0, 10);
  const placed = placedNew({ ...type, metal: type.boltMetal, bendOnsetKn: type.bendOnsetLowKn }, onDate);
  const place = {
    seaDistanceM: anchor.seaDistanceM,
    seaDistanceErrorM: anchor.seaDistanceErrorM,
    coast: area.coast,
    washing: anchor.washing ?? site.washing,
    so2: site.so2 ?? area.so2,
    saltedRoadDistanceM: site.saltedRoadDistanceM,
    warmDry: site.warmDry,
  };
  const bolt = {
    ...placed,
    method: input.method ?? placed.method ?? null,
    embedmentMm: input.embedmentMm ?? placed.embedmentMm ?? null,
    leverMm: input.leverMm ?? placed.leverMm ?? null,
  };
  return {
    answers: anchor.uses.map((use) => ({
      use,
      answer: whatIf({ use, bolt, place, rock: { ucsMpa: site.ucsMpa }, onDate }, policy),
    })),
    policyVersion: policy.version,
  };
}

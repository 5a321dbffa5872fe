import "server-only";
import type { AdhesiveRow } from "@/db/repositories/bolts";
import { addDays } from "@/lib/domain/finding/dates";
import { usableFrom } from "@/lib/domain/bolt/usable-from";
import { invalidField } from "@/lib/commands/writing/refusals";
import { formatInstant } from "@/lib/shared/format";
import { AppError } from "@/lib/shared/errors";

/** Glue older than this has cured at any temperature it may be used at; its time need not be known. */
const SURELY_CURED_DAYS = 30;

interface Glued {
  adhesive: AdhesiveRow | null;
  installedOn: string | null;
  installedAt: Date | null;
  glueTempC: number | null;
  rockTempC: number | null;
}

/**
 * From when fresh glue may be loaded. Null: it cured long ago, or nobody knows when it was set, which is a
 * matter for the verdict. @throws AppError when the table gives no time: `refused_by_rule` below its first row.
 */
export function glueUsableFrom(glued: Glued, at: { now: Date; today: string }): Date | null {
  const { adhesive, installedOn } = glued;
  if (installedOn === null || installedOn < addDays(at.today, -SURELY_CURED_DAYS)) return null;
  if (!adhesive) {
    throw invalidField("adhesiveId", "Name the adhesive: its table says from when the bolt may be loaded.");
  }
  if (glued.glueTempC === null) throw invalidField("glueTempC", "Measure the glue: the colder one decides.");
  if (glued.rockTempC === null) throw invalidField("rockTempC", "Measure the rock: the colder one decides.");
  const installedAt = setAt(glued, at);
  const found = usableFrom({
    installedAt: installedAt.toISOString(),
    table: adhesive.cureSteps,
    glueTempC: glued.glueTempC,
    rockTempC: glued.rockTempC,
  });
  if (!found.ok) {
    const path = glued.rockTempC <= glued.glueTempC ? "rockTempC" : "glueTempC";
    throw new AppError("refused_by_rule", found.reason, { problems: [{ path, message: found.reason }] });
  }
  return new Date(found.usableFrom);
}

/** The hour it was set: as told, else now on the same day, else the last moment of that day. */
function setAt({ installedOn, installedAt }: Glued, at: { now: Date; today: string }): Date {
  if (installedAt) {
    if (installedAt > at.now) throw invalidField("installedAt", "This lies in the future.");
    return installedAt;
  }
  if (installedOn === null || installedOn >= at.today) return at.now;
  const endOfDay = new Date(`${addDays(installedOn, 1)}T12:00:00Z`);
  return endOfDay < at.now ? endOfDay : at.now;
}

/** For the trail: "may be loaded from 4 May 2026, 14:05". */
export function usableInWords(usable: Date | null, timeZone: string): string {
  return usable === null ? "" : `; may be loaded from ${formatInstant(usable.toISOString(), timeZone)}`;
}

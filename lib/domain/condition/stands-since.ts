import { span } from "@/lib/domain/finding/dates";
import type { DatePrecision } from "@/lib/domain/vocabulary";

/**
 * UTC instant since when a bolt stands in its hole; null: not known. One that was logged on the day it was set
 * stands since it was logged; a date known less well counts from its earliest day, which asks for a check rather
 * than sparing one.
 */
export function standsSince({
  installedOn,
  installedOnPrecision,
  createdAt,
}: {
  installedOn: string | null;
  installedOnPrecision: DatePrecision;
  createdAt: Date;
}): string | null {
  if (installedOn === null) return null;
  const logged = createdAt.toISOString();
  if (installedOnPrecision === "day" && logged.startsWith(installedOn)) return logged;
  const { earliest } = span(installedOn, installedOnPrecision);
  return earliest === null ? null : `${earliest}T00:00:00.000Z`;
}

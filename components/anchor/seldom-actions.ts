import type { MenuEntry } from "@/components/ui/menu";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";
import { can } from "@/lib/policy/can";
import type { Actor } from "@/lib/shared/actor";

/** What this person may change here besides logging an install; each leads to a form of its own. */
export function seldomActions(actor: Actor, sheet: AnchorSheet): MenuEntry[] {
  const subject = { areaId: sheet.area.id };
  const at = `/anchors/${sheet.code}`;
  const job = sheet.jobs[0];
  return [
    ...(can(actor, "anchor.edit", subject) ? [{ label: "Correct the record", href: `${at}/edit` }] : []),
    ...(can(actor, "anchor.move", subject) ? [{ label: "Move the anchor", href: `${at}/move` }] : []),
    ...(can(actor, "job.open", subject) ? [{ label: "Open a rebolt", href: `${at}/rebolt` }] : []),
    ...(can(actor, "service.return", subject) && sheet.outOfUseSince && job
      ? [{ label: "Put back in service", href: `/queue/${job.id}#put-back` }]
      : []),
  ];
}

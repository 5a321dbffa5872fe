import type { Actor } from "@/lib/shared/actor";
import type { Audience } from "@/lib/shared/audience";

export const PUBLIC_AUDIENCE: Audience = { everything: false, memberAreaIds: [], key: "public" };

export function audience(actor: Actor): Audience {
  if (actor.kind === "visitor") return PUBLIC_AUDIENCE;
  if (actor.isAdmin) return { everything: true, memberAreaIds: [], key: "everything" };
  const memberAreaIds = Object.keys(actor.roles).toSorted();
  if (memberAreaIds.length === 0) return PUBLIC_AUDIENCE;
  return { everything: false, memberAreaIds, key: `areas:${memberAreaIds.join(",")}` };
}

/** Member of the area, whatever the role. */
export function isMember(who: Audience, areaId: string): boolean {
  return who.everything || who.memberAreaIds.includes(areaId);
}

/** About 1 km: two decimals of latitude. Used for sensitive sites shown to outsiders. */
export function roundedPoint(point: { lon: number; lat: number }): { lon: number; lat: number } {
  return { lon: Math.round(point.lon * 100) / 100, lat: Math.round(point.lat * 100) / 100 };
}

import type { SiteView } from "@/lib/schemas/views/register";

/** The anchors of a site for the plan, by code; the site itself where there is none yet. */
export function marksOf({ anchors, point, name }: Pick<SiteView, "anchors" | "point" | "name">) {
  const marks = anchors.map((anchor) => markAt(anchor.point.coordinates, anchor.code));
  return marks.length > 0 ? marks : [markAt(point.coordinates, name)];
}

function markAt([lon, lat]: readonly [number, number], name: string) {
  return { lon, lat, name };
}

import type { Metadata } from "next";
import { MapRegister } from "@/components/map/map-register";
import { getActor } from "@/lib/auth/get-actor";
import { can } from "@/lib/policy/can";
import { listAreas } from "@/lib/queries/list-areas";
import { mapFeatures } from "@/lib/queries/map-features";

export const metadata: Metadata = { title: "Map of anchors" };

export default async function MapPage() {
  const actor = await getActor();
  const [{ anchors, spans }, areas] = await Promise.all([mapFeatures(actor), listAreas(actor)]);
  return (
    <MapRegister
      anchors={anchors.features.map(({ geometry, properties }) => ({ ...properties, point: geometry }))}
      spans={spans.features.map(({ geometry, properties: { name, lengthM, aCode, bCode } }) => ({
        name,
        lengthM,
        aCode,
        bCode,
        coordinates: geometry.coordinates,
      }))}
      installAreas={areas
        .filter((area) => can(actor, "bolt.install", { areaId: area.id }))
        .map((area) => area.slug)}
    />
  );
}

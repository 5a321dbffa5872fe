"use client";

import dynamic from "next/dynamic";
import { type ReactNode, useCallback, useEffect, useMemo, useRef, useState } from "react";
import type { GeoJSONSource } from "maplibre-gl";
import type { MapRef } from "react-map-gl/maplibre";
import type { MapLook } from "@/components/map/map-canvas";
import { MapFrame, MapKey } from "@/components/map/map-frame";
import type { Target } from "@/components/map/map-targets";
import { usePalette } from "@/components/map/use-palette";
import { Notice } from "@/components/ui/notice";
import { type Bounds, boundsOf } from "@/lib/map/features";
import { frameTicks } from "@/lib/map/graticule";
import type { MapAnchor, MapSpan } from "@/lib/map/map-anchor";
import type { Camera } from "@/lib/map/map-params";

const MapCanvas = dynamic(() => import("@/components/map/map-canvas").then((module) => module.MapCanvas), {
  ssr: false,
});

/** A wish to look at something; a new object each time, so that the same wish can be made twice. */
export type Wish = { anchor: MapAnchor } | { around: readonly MapAnchor[] };

interface MapSheetProps {
  anchors: readonly MapAnchor[];
  spans: readonly MapSpan[];
  all: readonly MapAnchor[];
  chosen: MapAnchor | null;
  camera: Camera | null;
  wish: Wish | null;
  onCamera: (camera: Camera) => void;
  onChoose: (code: string) => void;
  onSite: (slug: string) => void;
  /** The chosen anchor in words, laid over the map. */
  panel: ReactNode;
}

/** Close enough to tell the two ends of a short span apart. */
const NEAR_ZOOM = 16.2;
/** A rounded point is not worth a closer look than this. */
const SOFT_ZOOM = 12;
/** Room for tags at the edge. */
const PADDING_PX = 64;
/** Width of the panel beside the map. */
const PANEL_PX = 384;
const NOWHERE: Bounds = [-34.55, 46.74, -33.88, 47.07];

/** The map in its frame, and what its keys and marks do. */
export function MapSheet(props: MapSheetProps) {
  const { anchors, all, chosen, camera, wish, onCamera, onChoose, onSite } = props;
  const palette = usePalette();
  const mapRef = useRef<MapRef | null>(null);
  const [look, setLook] = useState<MapLook | null>(null);
  const [pointed, setPointed] = useState<string | null>(null);
  const [failed, setFailed] = useState(false);
  const [start] = useState<Camera | { bounds: Bounds }>(() => startAt(props));
  const ticks = useMemo(() => (look ? frameTicks(look.bounds, look) : null), [look]);
  const lonStep = ticks?.step.lon ?? 60;
  const latStep = ticks?.step.lat ?? 60;
  const gridStep = useMemo(() => ({ lon: lonStep, lat: latStep }), [lonStep, latStep]);

  useEffect(() => {
    if (wish) fulfil(mapRef.current, wish);
  }, [wish]);

  const onTarget = useCallback(
    (target: Target) => {
      if (target.kind === "anchor") {
        onChoose(target.code);
        uncover(mapRef.current, target);
      }
      if (target.kind === "place") onSite(target.site);
      if (target.kind === "group") void openGroup(mapRef.current, target);
    },
    [onChoose, onSite],
  );

  return (
    <MapFrame
      ticks={ticks ?? { top: [], left: [] }}
      scale={look}
      pointed={pointed}
      controls={
        <>
          <MapKey name="Zoom in" onPress={() => mapRef.current?.zoomIn()}>
            <path d="M12 4v16M4 12h16" />
          </MapKey>
          <MapKey name="Zoom out" onPress={() => mapRef.current?.zoomOut()}>
            <path d="M4 12h16" />
          </MapKey>
          <MapKey name="Show all that is listed" onPress={() => fulfil(mapRef.current, { around: anchors })}>
            <path d="M4 9V4h5M15 4h5v5M20 15v5h-5M9 20H4v-5" />
          </MapKey>
        </>
      }
    >
      {failed ? (
        <Notice
          tone="info"
          title="The map cannot be drawn here"
          className="absolute inset-x-3 top-3 max-w-sm"
        >
          This browser does not draw maps. The list says everything the map would show.
        </Notice>
      ) : palette ? (
        <MapCanvas
          palette={palette}
          anchors={anchors}
          spans={props.spans}
          all={all}
          chosen={chosen}
          gridStep={gridStep}
          start={start}
          mapRef={mapRef}
          onReady={() => {
            if (chosen && !camera) fulfil(mapRef.current, { anchor: chosen }, { durationMs: 0 });
          }}
          onLook={setLook}
          onCamera={onCamera}
          onPoint={setPointed}
          onTarget={onTarget}
          onFail={() => setFailed(true)}
        />
      ) : null}
      {props.panel}
    </MapFrame>
  );
}

/** The address says where; else the chosen anchor; else all that fits the sentence. */
function startAt({ camera, chosen, anchors, all }: MapSheetProps): Camera | { bounds: Bounds } {
  if (camera) return camera;
  if (chosen) {
    const [lon, lat] = chosen.point.coordinates;
    return { lon, lat, zoom: chosen.exact ? NEAR_ZOOM : SOFT_ZOOM };
  }
  return { bounds: boundsOf(anchors) ?? boundsOf(all) ?? NOWHERE };
}

function fulfil(map: MapRef | null, wish: Wish, options: { durationMs?: number } = {}) {
  if (!map) return;
  if ("anchor" in wish) {
    const [lon, lat] = wish.anchor.point.coordinates;
    const least = wish.anchor.exact ? NEAR_ZOOM : SOFT_ZOOM;
    const { durationMs } = options;
    map.easeTo({
      center: [lon, lat],
      zoom: Math.max(map.getZoom(), least),
      offset: besidePanel(map),
      ...(durationMs === undefined ? {} : { duration: durationMs }),
    });
    return;
  }
  const bounds = boundsOf(wish.around);
  if (bounds) map.fitBounds(bounds, { padding: PADDING_PX, maxZoom: 15 });
}

/** From the middle of the map to the middle of what the panel leaves free. */
function besidePanel(map: MapRef): [number, number] {
  const { clientWidth, clientHeight } = map.getContainer();
  return clientWidth > PANEL_PX * 1.6 ? [-PANEL_PX / 2, 0] : [0, -clientHeight / 4];
}

/** Moves the map when the panel would cover the mark that opened it. */
function uncover(map: MapRef | null, { lon, lat }: { lon: number; lat: number }) {
  if (!map) return;
  const { clientWidth, clientHeight } = map.getContainer();
  const at = map.project([lon, lat]);
  const [right, up] = besidePanel(map);
  const hidden = right === 0 ? at.y > clientHeight + 2 * up : at.x > clientWidth - PANEL_PX - 24;
  if (hidden) map.easeTo({ center: [lon, lat], offset: [right, up] });
}

/** Comes as close as the group needs to fall apart. */
async function openGroup(map: MapRef | null, group: Target & { kind: "group" }) {
  const source = map?.getSource<GeoJSONSource>("anchors");
  if (!map || !source) return;
  const zoom = await source.getClusterExpansionZoom(group.clusterId);
  map.easeTo({ center: [group.lon, group.lat], zoom: zoom + 0.3 });
}

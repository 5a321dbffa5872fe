"use client";

import "maplibre-gl/dist/maplibre-gl.css";
import * as maplibregl from "maplibre-gl";
import { type RefObject, useCallback, useEffect, useMemo, useRef, useState } from "react";
import { Layer, Map as MapView, type MapRef, Source, useMap } from "react-map-gl/maplibre";
import { describeFeature, nearestTarget, type Target } from "@/components/map/map-targets";
import { drawPicture } from "@/components/map/map-pictures";
import type { Bounds } from "@/lib/map/features";
import { anchorPoints, softPlaces, spanLines } from "@/lib/map/features";
import { graticuleLines } from "@/lib/map/graticule";
import {
  anchorLayer,
  chosenLayers,
  CLUSTER_MAX_ZOOM,
  CLUSTER_PROPERTIES,
  CLUSTER_RADIUS_PX,
  clusterLayer,
  gridLayer,
  placeLayers,
  readImageId,
  spanLayers,
} from "@/lib/map/layers";
import type { MapAnchor, MapSpan } from "@/lib/map/map-anchor";
import type { Camera } from "@/lib/map/map-params";
import type { Palette } from "@/lib/map/palette";
import { groundStyle } from "@/lib/map/style";

// The worker is a public file: bundlers do not find it by themselves.
maplibregl.setWorkerUrl("/vendor/maplibre-gl-worker.mjs");

/** What the frame around the map is drawn from. */
export interface MapLook {
  bounds: Bounds;
  widthPx: number;
  heightPx: number;
  zoom: number;
  lat: number;
}

export interface MapCanvasProps {
  palette: Palette;
  anchors: readonly MapAnchor[];
  spans: readonly MapSpan[];
  /** Every anchor, for spans whose far end does not fit the sentence. */
  all: readonly MapAnchor[];
  chosen: MapAnchor | null;
  gridStep: { lon: number; lat: number };
  start: Camera | { bounds: Bounds };
  mapRef: RefObject<MapRef | null>;
  onReady: () => void;
  onLook: (look: MapLook) => void;
  onCamera: (camera: Camera) => void;
  onPoint: (words: string | null) => void;
  onTarget: (target: Target) => void;
  onFail: () => void;
}

export function MapCanvas(props: MapCanvasProps) {
  const { palette, anchors, spans, all, chosen, start, mapRef, onLook, onPoint, onTarget } = props;
  const [settled, setSettled] = useState<Bounds | null>(null);
  const style = useMemo(() => groundStyle(palette, places()), [palette]);
  // The chosen one stands beside its group, never under it.
  const points = useMemo(() => anchorPoints(anchors.filter((one) => one !== chosen)), [anchors, chosen]);
  const soft = useMemo(() => softPlaces(anchors), [anchors]);
  const lines = useMemo(() => spanLines(spans, all), [spans, all]);
  const ring = useMemo(() => anchorPoints(chosen ? [chosen] : []), [chosen]);
  const grid = useMemo(
    () => (settled ? graticuleLines(padded(settled), props.gridStep) : EMPTY),
    [settled, props.gridStep],
  );
  const softLat = soft.features[0]?.geometry.coordinates[1] ?? 0;

  const look = useCallback(
    (map: maplibregl.Map, done: boolean) => {
      const seen = lookOf(map);
      onLook(seen);
      if (done) setSettled(seen.bounds);
      if (done && document.activeElement === map.getCanvas()) {
        const middle = nearestTarget(map, middleOf(map), MIDDLE_PX);
        onPoint(middle ? `In the middle: ${describeFeature(middle)}` : null);
      }
    },
    [onLook, onPoint],
  );

  return (
    <MapView
      ref={mapRef}
      mapLib={maplibregl}
      mapStyle={style}
      initialViewState={
        "bounds" in start
          ? { bounds: start.bounds, fitBoundsOptions: { padding: 64, maxZoom: 15 } }
          : { latitude: start.lat, longitude: start.lon, zoom: start.zoom }
      }
      minZoom={1}
      maxZoom={20}
      dragRotate={false}
      touchPitch={false}
      pitchWithRotate={false}
      attributionControl={false}
      locale={{ "Map.Title": CANVAS_NAME }}
      style={{ position: "absolute", inset: 0 }}
      onResize={({ target }) => look(target, true)}
      onMove={({ target }) => look(target, false)}
      onMoveEnd={({ target }) => {
        look(target, true);
        const { lat, lng: lon } = target.getCenter();
        props.onCamera({ lat, lon, zoom: target.getZoom() });
      }}
      onMouseMove={({ target, point }) => {
        const found = nearestTarget(target, point);
        target.getCanvas().style.cursor = found ? "pointer" : "";
        onPoint(found ? describeFeature(found) : null);
      }}
      onMouseOut={() => onPoint(null)}
      onClick={({ target, point }) => {
        const found = nearestTarget(target, point);
        if (found) onTarget(found);
      }}
      onError={({ error }) => {
        if (/webgl/i.test(error.message)) props.onFail();
      }}
    >
      <Pictures palette={palette} />
      <EnterChooses onTarget={onTarget} />
      <Ready
        onReady={(map) => {
          map.touchZoomRotate.disableRotation();
          map.keyboard.disableRotation();
          look(map, true);
          props.onReady();
        }}
      />
      <Source id="graticule" type="geojson" data={grid}>
        <Layer {...gridLayer(palette)} />
      </Source>
      <Source id="soft-places" type="geojson" data={soft}>
        {placeLayers(palette, softLat).map((layer) => (
          <Layer key={layer.id} {...layer} />
        ))}
      </Source>
      <Source id="spans" type="geojson" data={lines}>
        {spanLayers(palette).map((layer) => (
          <Layer key={layer.id} {...layer} />
        ))}
      </Source>
      <Source
        id="anchors"
        type="geojson"
        data={points}
        cluster
        clusterRadius={CLUSTER_RADIUS_PX}
        clusterMaxZoom={CLUSTER_MAX_ZOOM}
        clusterProperties={CLUSTER_PROPERTIES}
      >
        <Layer {...anchorLayer(palette)} />
        <Layer {...clusterLayer(palette)} />
      </Source>
      <Source id="chosen" type="geojson" data={ring}>
        {chosenLayers(palette).map((layer) => (
          <Layer key={layer.id} {...layer} />
        ))}
      </Source>
    </MapView>
  );
}

const CANVAS_NAME =
  "Map of anchors. Arrow keys move it, plus and minus zoom, Enter opens the mark nearest to the middle. The list says the same.";

/** How far from the middle a mark may be to answer to the keyboard. */
const MIDDLE_PX = 120;

const EMPTY = graticuleLines([0, 0, -1, -1], { lon: 60, lat: 60 });

/** Draws marks and tags when a layer first asks for them. */
function Pictures({ palette }: { palette: Palette }) {
  const { current: map } = useMap();
  const latest = useRef(palette);
  useEffect(() => {
    latest.current = palette;
  }, [palette]);
  useEffect(() => {
    if (!map) return;
    const target = map.getMap();
    target.setMissingStyleImageResolver(async (id) => {
      const request = readImageId(id);
      if (!request) return;
      await document.fonts.ready;
      const pixelRatio = Math.max(2, Math.ceil(window.devicePixelRatio));
      const picture = drawPicture(request, latest.current, pixelRatio);
      if (picture && !target.hasImage(id)) target.addImage(id, picture, { pixelRatio });
    });
  }, [map]);
  return null;
}

/** Once, as soon as there is a map: long before every tile has come. */
function Ready({ onReady }: { onReady: (map: maplibregl.Map) => void }) {
  const { current: map } = useMap();
  const latest = useRef(onReady);
  useEffect(() => {
    if (map) latest.current(map.getMap());
  }, [map]);
  return null;
}

/** The keyboard's click: the mark nearest to the middle of the map. */
function EnterChooses({ onTarget }: { onTarget: (target: Target) => void }) {
  const { current: map } = useMap();
  useEffect(() => {
    if (!map) return;
    const target = map.getMap();
    const canvas = target.getCanvas();
    const choose = (event: KeyboardEvent) => {
      if (event.key !== "Enter") return;
      const found = nearestTarget(target, middleOf(target), MIDDLE_PX);
      if (found) onTarget(found);
    };
    canvas.addEventListener("keydown", choose);
    return () => canvas.removeEventListener("keydown", choose);
  }, [map, onTarget]);
  return null;
}

function middleOf(map: maplibregl.Map) {
  const { clientWidth, clientHeight } = map.getContainer();
  return { x: clientWidth / 2, y: clientHeight / 2 };
}

function lookOf(map: maplibregl.Map): MapLook {
  const seen = map.getBounds();
  const { clientWidth, clientHeight } = map.getContainer();
  return {
    bounds: [seen.getWest(), seen.getSouth(), seen.getEast(), seen.getNorth()],
    widthPx: clientWidth,
    heightPx: clientHeight,
    zoom: map.getZoom(),
    lat: map.getCenter().lat,
  };
}

/** Half a screen more on each side, so that the grid is there while the map is moved. */
function padded([west, south, east, north]: Bounds): Bounds {
  const [x, y] = [(east - west) / 2, (north - south) / 2];
  return [west - x, Math.max(-85, south - y), east + x, Math.min(85, north + y)];
}

function places() {
  const { origin } = window.location;
  return {
    world: `${origin}/tiles/land.geojson`,
    island: `${origin}/tiles/tarrow.geojson`,
    textFont: `${origin}/fonts/atkinson-hyperlegible-next-latin.woff2`,
    labelFont: `${origin}/fonts/archivo-latin.woff2`,
  };
}

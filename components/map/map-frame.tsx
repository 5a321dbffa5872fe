"use client";

import type { ReactNode } from "react";
import type { Tick } from "@/lib/map/graticule";
import { metresPerPixel, scaleBar } from "@/lib/map/scale-bar";
import { formatQuantity } from "@/lib/shared/format";

interface MapFrameProps {
  ticks: { top: readonly Tick[]; left: readonly Tick[] };
  /** Null until the map is there. */
  scale: { lat: number; zoom: number } | null;
  /** What lies under the pointer, or in the middle when the keyboard moves the map. */
  pointed: string | null;
  controls: ReactNode;
  children: ReactNode;
}

/** The map as a surveyed sheet: degrees in the margin, below it scale, north and a line that reads out. */
export function MapFrame({ ticks, scale, pointed, controls, children }: MapFrameProps) {
  return (
    <div className="flex h-full flex-col border-2 border-frame bg-surface">
      <div className="relative grid min-h-0 flex-1 grid-cols-[1.25rem_1fr] grid-rows-[1.25rem_1fr]">
        <div aria-hidden="true" className="relative col-start-2 overflow-hidden">
          {ticks.top.map((tick) => (
            <span
              key={tick.label}
              className="absolute bottom-0 h-full border-l border-line-strong pl-1 type-label text-[0.6875rem] leading-5 whitespace-nowrap text-muted"
              style={{ left: tick.atPx }}
            >
              {tick.label}
            </span>
          ))}
        </div>
        <div aria-hidden="true" className="relative row-start-2 overflow-hidden">
          {ticks.left.map((tick) => (
            <span
              key={tick.label}
              className="absolute left-0 w-full border-t border-line-strong"
              style={{ top: tick.atPx }}
            >
              <span className="absolute top-1 left-0 block rotate-180 type-label text-[0.6875rem] leading-5 whitespace-nowrap text-muted [writing-mode:vertical-rl]">
                {tick.label}
              </span>
            </span>
          ))}
        </div>
        <div className="group/map relative col-start-2 row-start-2 overflow-hidden border-t border-l border-frame bg-[var(--map-sea)] [&_canvas:focus-visible]:outline-offset-[-4px]">
          {children}
          <span
            aria-hidden="true"
            className="pointer-events-none absolute top-1/2 left-1/2 hidden size-8 -translate-1/2 group-has-[canvas:focus-visible]/map:block"
          >
            <svg viewBox="0 0 32 32" className="text-text" fill="none" stroke="currentColor">
              <path d="M16 0v11M16 21v11M0 16h11M21 16h11" strokeWidth="1.5" />
            </svg>
          </span>
          <div className="absolute top-2 right-2 grid border border-frame bg-surface">{controls}</div>
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-t border-frame px-2 py-1.5">
        <North />
        <Scale scale={scale} />
        <p role="status" className="line-clamp-2 min-h-10 min-w-40 flex-1 content-center text-sm leading-5">
          {pointed ?? <span className="text-muted">Point at a mark to read it; press to open it.</span>}
        </p>
        <p className="text-xs text-muted">Land: Natural Earth, public domain. Tarrow: invented.</p>
      </div>
    </div>
  );
}

function North() {
  return (
    <span className="flex items-center gap-1">
      <svg viewBox="0 0 16 24" aria-hidden="true" className="h-7" fill="none" stroke="currentColor">
        <path d="M8 23V3" strokeWidth="1.5" />
        <path d="M8 1 13 11 8 8.5Z" fill="currentColor" />
        <path d="M8 1 3 11 8 8.5" strokeWidth="1" />
      </svg>
      <span className="type-label">
        N<span className="sr-only">orth is up</span>
      </span>
    </span>
  );
}

function Scale({ scale }: { scale: MapFrameProps["scale"] }) {
  if (!scale) return <span className="h-7 w-[110px]" />;
  const { lengthM, widthPx } = scaleBar(metresPerPixel(scale.lat, scale.zoom), 104);
  return (
    <span className="grid w-[110px] gap-0.5">
      <span className="type-figure text-xs leading-none">
        <span className="sr-only">Length of the scale bar: </span>
        {lengthM < 1000 ? formatQuantity(lengthM, "m") : formatQuantity(lengthM / 1000, "km")}
      </span>
      <svg aria-hidden="true" className="h-2 w-full text-text" fill="none" stroke="currentColor">
        <rect x="0.5" y="1.5" width={widthPx} height="5" strokeWidth="1" />
        <rect x="0.5" y="1.5" width={widthPx / 2} height="5" fill="currentColor" />
      </svg>
    </span>
  );
}

/** A key of the map: 44 px, with its name read out. */
export function MapKey({
  name,
  onPress,
  children,
}: {
  name: string;
  onPress: () => void;
  children: ReactNode;
}) {
  return (
    <button
      type="button"
      title={name}
      onClick={onPress}
      className="grid touch cursor-pointer place-items-center border-line-strong text-text not-first:border-t hover:bg-sunk"
    >
      <span className="sr-only">{name}</span>
      <svg
        viewBox="0 0 24 24"
        aria-hidden="true"
        className="size-5"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
      >
        {children}
      </svg>
    </button>
  );
}

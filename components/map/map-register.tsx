"use client";

import { createSerializer, throttle, useQueryState, useQueryStates } from "nuqs";
import { NuqsAdapter } from "nuqs/adapters/next/app";
import { useCallback, useMemo, useState } from "react";
import { Legend } from "@/components/finding/legend";
import { AnchorList } from "@/components/map/anchor-list";
import { AnchorPanel } from "@/components/map/anchor-panel";
import { FilterSentence } from "@/components/map/filter-sentence";
import { MapSheet, type Wish } from "@/components/map/map-sheet";
import { ResultLine } from "@/components/map/result-line";
import { choicesFor, fits, type MapFilter, spansBetween } from "@/lib/map/filter";
import type { MapSpan } from "@/lib/map/map-anchor";
import { type Camera, mapParams } from "@/lib/map/map-params";
import type { AnchorSummary } from "@/lib/schemas/views/anchor";

interface MapRegisterProps {
  anchors: readonly AnchorSummary[];
  spans: readonly MapSpan[];
  /** Slugs of the areas this reader may log installs in. */
  installAreas: readonly string[];
}

const { anchor: anchorParam, at: cameraParam, ...sentenceParams } = mapParams;
const addressOf = createSerializer(mapParams);

/** The map of the register and its list twin; everything that is chosen stands in the address. */
export function MapRegister(props: MapRegisterProps) {
  return (
    <NuqsAdapter>
      <Register {...props} />
    </NuqsAdapter>
  );
}

function Register({ anchors, spans, installAreas }: MapRegisterProps) {
  const [filter, setFilter] = useQueryStates(sentenceParams, { history: "replace" });
  const [code, setCode] = useQueryState("anchor", anchorParam.withOptions({ history: "push" }));
  const [camera, setCamera] = useQueryState(
    "at",
    cameraParam.withOptions({ limitUrlUpdates: throttle(600) }),
  );
  const [wish, setWish] = useState<Wish | null>(null);
  const [byHand, setByHand] = useState(false);

  const shown = useMemo(() => anchors.filter((anchor) => fits(anchor, filter)), [anchors, filter]);
  const shownSpans = useMemo(() => spansBetween(spans, shown), [spans, shown]);
  const choices = useMemo(() => choicesFor(anchors, filter), [anchors, filter]);
  const chosen = useMemo(() => anchors.find((anchor) => anchor.code === code) ?? null, [anchors, code]);

  const change = useCallback(
    (part: Partial<MapFilter>) => {
      void setFilter(part);
      if (part.site === undefined) return;
      const around = anchors.filter((anchor) => part.site === null || anchor.siteSlug === part.site);
      setWish({ around });
    },
    [anchors, setFilter],
  );
  const choose = useCallback(
    (next: string | null) => {
      setByHand(true);
      void setCode(next);
    },
    [setCode],
  );
  const chooseFromList = useCallback(
    (next: string) => {
      choose(next);
      const anchor = anchors.find((one) => one.code === next);
      if (anchor) setWish({ anchor });
    },
    [anchors, choose],
  );
  const hrefFor = useCallback((next: string) => addressOf("/", { ...filter, anchor: next }), [filter]);
  const keepCamera = useCallback((next: Camera) => void setCamera(next), [setCamera]);
  const showSite = useCallback((site: string) => change({ site }), [change]);

  return (
    <div className="mx-auto grid max-w-[120rem] grid-cols-1 gap-x-5 px-2 pt-3 sm:px-4 lg:grid-cols-[26rem_1fr] lg:grid-rows-[auto_1fr]">
      <div className="px-1">
        <h1 className="sr-only">Map of anchors</h1>
        <FilterSentence filter={filter} choices={choices} onChange={change} />
        <ResultLine anchors={shown} total={anchors.length} spanCount={shownSpans.length} />
      </div>
      <div className="relative mt-3 h-[62dvh] min-h-96 lg:sticky lg:top-3 lg:col-start-2 lg:row-span-2 lg:row-start-1 lg:mt-0 lg:h-[calc(100dvh-5.5rem)]">
        <MapSheet
          anchors={shown}
          spans={shownSpans}
          all={anchors}
          chosen={chosen}
          camera={camera}
          wish={wish}
          onCamera={keepCamera}
          onChoose={choose}
          onSite={showSite}
          panel={
            code === null ? null : (
              <div className="fixed inset-x-0 bottom-[calc(var(--nav-height)+env(safe-area-inset-bottom))] z-20 max-h-[58dvh] overflow-y-auto lg:absolute lg:inset-x-auto lg:-right-0.5 lg:-bottom-0.5 lg:max-h-[calc(100%-10rem)] lg:w-96">
                <AnchorPanel
                  code={code}
                  anchor={chosen}
                  mayInstall={chosen !== null && installAreas.includes(chosen.areaSlug)}
                  takeFocus={byHand}
                  onClose={() => choose(null)}
                />
              </div>
            )
          }
        />
      </div>
      <section aria-labelledby="list-heading" className="mt-5 px-1">
        <h2 id="list-heading" className="mb-3">
          The same as a list
        </h2>
        <AnchorList
          anchors={shown}
          spans={shownSpans}
          chosen={code}
          hrefFor={hrefFor}
          onChoose={chooseFromList}
        />
        <div className="mt-8 grid gap-2">
          <h2>Marks</h2>
          <Legend />
          <p className="max-w-prose text-sm text-muted">
            A mark is never milder than the verdict: an anchor with the verdict “do not use” is drawn as out
            of use, even when nobody has taken it out of use yet. A group shows the worst mark inside.
          </p>
        </div>
      </section>
    </div>
  );
}

import Link from "next/link";
import type { ReactNode } from "react";
import { ClosureList } from "@/components/anchor/closure-list";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { DemandTable } from "@/components/site/demand-table";
import { RigFacts } from "@/components/span/rig-facts";
import { SpanDrawing } from "@/components/span/span-drawing";
import { Notice } from "@/components/ui/notice";
import { Quantity } from "@/components/ui/quantity";
import { CAUTION } from "@/lib/domain/finding/engine";
import type { AreaDetail, SpanView } from "@/lib/schemas/views/register";
import { formatBearingDeg } from "@/lib/shared/format";

interface SpanSheetProps {
  span: SpanView;
  /** The loads its anchors are held against. */
  area: Pick<AreaDetail, "name" | "policyVersion" | "demand">;
  actions?: ReactNode;
}

/** A line's way between two anchors: both ends, what is usually rigged, and the loads both are judged with. */
export function SpanSheet({ span, area, actions }: SpanSheetProps) {
  return (
    <SheetFrame title={titleOf(span, area.name)} actions={actions}>
      <div className="grid gap-9 print:gap-5">
        {span.closures.length > 0 ? (
          <Notice tone="warn" title="Closures">
            <ClosureList closures={span.closures} />
          </Notice>
        ) : null}
        <SpanDrawing span={span} />
        <div className="grid gap-x-10 gap-y-6 md:grid-cols-2 print:grid-cols-2">
          <End name="A" end={span.a} />
          <End name="B" end={span.b} />
        </div>
        <div className="grid items-start gap-x-10 gap-y-9 lg:grid-cols-2 print:grid-cols-2 print:gap-5">
          <SheetSection title="Usually rigged">
            <RigFacts rig={span.rig} />
            {span.note ? <p className="max-w-prose pt-3">{span.note}</p> : null}
          </SheetSection>
          <SheetSection
            title="Loads both ends are judged with"
            note={`area policy, version ${area.policyVersion}`}
          >
            <DemandTable demand={area.demand.filter(({ use }) => use === "highline")} />
            <p className="max-w-prose pt-3">
              This line&rsquo;s own tension, people, wind and leash falls are not computed: a long, tight or
              windy line can bring more than the policy&rsquo;s peak. Compute it yourself before you rig it.
            </p>
          </SheetSection>
        </div>
        <Notice tone="warn">{CAUTION}</Notice>
      </div>
    </SheetFrame>
  );
}

function titleOf(span: SpanView, areaName: string) {
  return {
    name: span.name,
    kind: "Span sheet",
    code: `${span.a.code} – ${span.b.code}`,
    cells: [
      { name: "Length", value: <Quantity value={span.lengthM} unit="m" digits={1} className="text-xl" /> },
      {
        name: "Bearing, A to B",
        value:
          span.bearingDeg === null ? (
            "not shown"
          ) : (
            <span className="type-figure">{formatBearingDeg(span.bearingDeg)} true</span>
          ),
      },
      { name: "B above A", value: <Quantity value={span.heightDifferenceM} unit="m" digits={1} signed /> },
      {
        name: "Site",
        value:
          span.a.siteName === span.b.siteName ? span.a.siteName : `${span.a.siteName}, ${span.b.siteName}`,
      },
      {
        name: "Area",
        value: (
          <Link href={`/areas/${span.areaSlug}`} className="text-link">
            {areaName}
          </Link>
        ),
      },
    ],
  };
}

function End({ name, end }: { name: "A" | "B"; end: SpanView["a"] }) {
  return (
    <SheetSection title={`${name}: ${end.label}`} note={<span className="type-code">{end.code}</span>}>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-1">
        <ConditionMark condition={end.condition} />
        {end.verdict ? (
          <VerdictMark verdict={end.verdict} />
        ) : (
          <span className="text-muted">not judged yet</span>
        )}
        <Link href={`/anchors/${end.code}`} className="inline-block py-2 text-link">
          Anchor sheet
        </Link>
      </div>
    </SheetSection>
  );
}

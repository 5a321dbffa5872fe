import type { Metadata } from "next";
import Link from "next/link";
import { ClosureList } from "@/components/anchor/closure-list";
import { ConditionMark } from "@/components/finding/condition-mark";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { RigFacts } from "@/components/span/rig-facts";
import { Notice } from "@/components/ui/notice";
import { getActor } from "@/lib/auth/get-actor";
import { CAUTION } from "@/lib/domain/finding/engine";
import { idOrNotFound, orNotFound } from "@/lib/http/or-not-found";
import { getSpan } from "@/lib/queries/spans";
import type { SpanView } from "@/lib/schemas/views/register";
import { formatBearingDeg, formatQuantity } from "@/lib/shared/format";

interface SpanPageProps {
  params: Promise<{ id: string }>;
}

export async function generateMetadata({ params }: SpanPageProps): Promise<Metadata> {
  return { title: (await orNotFound(getSpan(await getActor(), idOrNotFound((await params).id)))).name };
}

export default async function SpanPage({ params }: SpanPageProps) {
  const span = await orNotFound(getSpan(await getActor(), idOrNotFound((await params).id)));
  return (
    <SheetFrame title={titleOf(span)}>
      <div className="grid gap-8">
        <div className="grid gap-x-10 gap-y-6 md:grid-cols-2">
          <End name="From" end={span.a} />
          <End name="To" end={span.b} />
        </div>
        {span.closures.length > 0 ? (
          <SheetSection title="Closures">
            <ClosureList closures={span.closures} />
          </SheetSection>
        ) : null}
        <SheetSection title="Usual rig">
          <RigFacts rig={span.rig} />
        </SheetSection>
        {span.note ? <p className="max-w-prose">{span.note}</p> : null}
        <Notice tone="warn">
          Both anchors are judged with the loads of the area&rsquo;s policy, not with this line&rsquo;s own
          tension, wind and people. {CAUTION}
        </Notice>
      </div>
    </SheetFrame>
  );
}

function titleOf(span: SpanView) {
  return {
    name: span.name,
    kind: "Span",
    revision: "–",
    cells: [
      {
        name: "Length",
        value: span.lengthM === null ? "–" : formatQuantity(span.lengthM, "m", { digits: 1 }),
      },
      {
        name: "Bearing from A",
        value: span.bearingDeg === null ? "–" : `${formatBearingDeg(span.bearingDeg)} true`,
      },
      {
        name: "B above A",
        value:
          span.heightDifferenceM === null
            ? "not known"
            : formatQuantity(span.heightDifferenceM, "m", { signed: true }),
      },
      { name: "Site", value: span.a.siteName },
    ],
  };
}

function End({ name, end }: { name: string; end: SpanView["a"] }) {
  return (
    <SheetSection title={`${name} ${end.label}`} note={end.code}>
      <div className="grid gap-1">
        <ConditionMark condition={end.condition} verdict={end.verdict} />
        {end.verdict ? <VerdictMark verdict={end.verdict} /> : null}
        <Link href={`/anchors/${end.code}`} className="underline underline-offset-2">
          Open its sheet
        </Link>
      </div>
    </SheetSection>
  );
}

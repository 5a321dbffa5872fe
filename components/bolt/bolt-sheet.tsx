import Link from "next/link";
import type { ReactNode } from "react";
import { BoltChain } from "@/components/bolt/bolt-chain";
import { HardwareFacts, SettingFacts } from "@/components/bolt/bolt-facts";
import { PullTestTable } from "@/components/bolt/pull-test-table";
import { StrengthTable } from "@/components/bolt/strength-table";
import { ConditionMark } from "@/components/finding/condition-mark";
import { Reasons, reasonGroups } from "@/components/finding/reasons";
import { VerdictBanner } from "@/components/finding/verdict-banner";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { ReportList } from "@/components/report/report-list";
import { Moment, PastDate } from "@/components/ui/date-text";
import { Notice } from "@/components/ui/notice";
import { FORM_LABELS, sentence, usesLabel } from "@/lib/domain/labels";
import type { BoltDetail } from "@/lib/schemas/views/bolt-detail";
import { formatCount } from "@/lib/shared/format";

/** Everything on record about one piece of hardware in one hole. */
export function BoltSheet({ detail, actions }: { detail: BoltDetail; actions: ReactNode }) {
  const { bolt, anchor, hole, chain, findings, reports } = detail;
  return (
    <SheetFrame title={titleOf(detail)} actions={actions}>
      <div className="grid gap-8">
        <Standing detail={detail} />
        <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2 print:grid-cols-2">
          <SheetSection title="What it is">
            <HardwareFacts bolt={bolt} />
          </SheetSection>
          <SheetSection title="How it was set">
            <SettingFacts bolt={bolt} hole={hole} timeZone={anchor.timeZone} />
          </SheetSection>
          <SheetSection title="Strength">
            <StrengthTable strengths={bolt} sourceNote={bolt.typeSourceNote} />
          </SheetSection>
          <SheetSection title="In this hole" note={formatCount(chain.length, "bolt so far", "bolts so far")}>
            <BoltChain chain={chain} currentId={bolt.id} />
          </SheetSection>
        </div>
        {bolt.removedOn ? null : (
          <SheetSection
            id="reasons"
            title="Reasons"
            note={`${reasonGroups(findings).length}, numbered as on the anchor sheet`}
          >
            <Reasons findings={findings} uses={anchor.uses} withSubjects={false} />
          </SheetSection>
        )}
        <SheetSection title="Pull tests">
          <PullTestTable tests={bolt.pullTests} />
        </SheetSection>
        <SheetSection id="reports" title={`Reports at placement ${detail.placementNumber}`}>
          <ReportList reports={reports} timeZone={anchor.timeZone} />
        </SheetSection>
      </div>
    </SheetFrame>
  );
}

/** Whether it is still there, what is said of it, and since when it is out of use. */
function Standing({ detail: { bolt, anchor } }: { detail: BoltDetail }) {
  return (
    <div className="grid gap-3">
      {bolt.removedOn ? (
        <Notice tone="plain" title="No longer in the rock">
          Taken out <PastDate on={bolt.removedOn} />
          {bolt.removedBy ? ` by ${bolt.removedBy}` : ""}
          {bolt.removedWhy ? `: ${bolt.removedWhy}` : ""}. Kept as the history of its hole.
        </Notice>
      ) : null}
      {bolt.struckReason ? (
        <Notice tone="plain" title="Struck through">
          This record was wrong: {bolt.struckReason}
        </Notice>
      ) : null}
      {bolt.verdict && !bolt.removedOn ? (
        <VerdictBanner
          verdict={bolt.verdict}
          about={`for ${usesLabel(anchor.uses)}, as part of anchor ${anchor.code}`}
        />
      ) : null}
      {bolt.outOfUseSince && !bolt.removedOn ? (
        <Notice tone="stop" title="Out of use">
          Since <Moment at={bolt.outOfUseSince} timeZone={anchor.timeZone} />.
        </Notice>
      ) : null}
    </div>
  );
}

function titleOf({ bolt, anchor, placementNumber, chain }: BoltDetail) {
  const from = chain.length - chain.findIndex((one) => one.id === bolt.id);
  return {
    name: bolt.typeName ?? sentence(FORM_LABELS[bolt.form]),
    kind: "Bolt sheet",
    code: `${anchor.code} / ${placementNumber}`,
    condition: <ConditionMark condition={bolt.condition} verdict={bolt.verdict} />,
    revision: `${bolt.version}`,
    cells: [
      {
        name: "Anchor",
        value: (
          <Link href={`/anchors/${anchor.code}`} className="text-link">
            {anchor.code} {anchor.label}
          </Link>
        ),
      },
      {
        name: "Site",
        value: (
          <Link href={`/sites/${anchor.siteSlug}`} className="text-link">
            {anchor.siteName}
          </Link>
        ),
      },
      {
        name: "Set",
        value: <PastDate on={bolt.installedOn} precision={bolt.installedOnPrecision} />,
      },
      {
        name: "Type",
        value: bolt.typeId ? (
          <Link href={`/types/${bolt.typeId}`} className="text-link">
            in the catalogue
          </Link>
        ) : (
          "not in the catalogue"
        ),
      },
      { name: "In this hole", value: `no. ${from} of ${chain.length}` },
    ],
  };
}

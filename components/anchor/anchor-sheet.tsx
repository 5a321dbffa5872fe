import Link from "next/link";
import type { ReactNode } from "react";
import { EdgeList, FittingList, RockBodyList } from "@/components/anchor/anchor-parts";
import { BoltTable } from "@/components/anchor/bolt-table";
import { ClosureList } from "@/components/anchor/closure-list";
import { FaceDrawing } from "@/components/anchor/face-drawing";
import { faceInputOf } from "@/components/anchor/face-input-of";
import { HoleHistory } from "@/components/anchor/hole-history";
import { PlaceNote } from "@/components/anchor/place-note";
import { ConditionMark } from "@/components/finding/condition-mark";
import { ReasonItem, ReasonList } from "@/components/finding/reason-item";
import { VerdictBanner } from "@/components/finding/verdict-banner";
import { RevisionTable } from "@/components/layout/revision-table";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { ReportList } from "@/components/report/report-list";
import { Moment, PastDate } from "@/components/ui/date-text";
import { Notice } from "@/components/ui/notice";
import { Quantity } from "@/components/ui/quantity";
import { JOB_STATE_LABELS, sentence, usesLabel } from "@/lib/domain/labels";
import type { AnchorSheet as Sheet, SheetFinding } from "@/lib/schemas/views/anchor";

interface AnchorSheetProps {
  sheet: Sheet;
  actions: ReactNode;
  /** Something has just happened: said above the drawing. */
  message?: ReactNode;
}

/** One anchor as an engineering drawing: title block, verdict, drawing, table, reasons, history. */
export function AnchorSheet({ sheet, actions, message }: AnchorSheetProps) {
  const { timeZone } = sheet.area;
  const last = sheet.revisions.at(-1);
  return (
    <SheetFrame title={titleOf(sheet, last?.letter ?? "–")} actions={actions}>
      <div className="grid gap-8">
        {message}
        <Standing sheet={sheet} />
        <div className="grid items-start gap-x-10 gap-y-8 xl:grid-cols-[minmax(24rem,36rem)_1fr] print:grid-cols-1">
          <FaceDrawing input={faceInputOf(sheet)} name={`Face drawing of ${sheet.label}`} />
          <SheetSection id="reasons" title="Reasons" note={`${sheet.findings.length}, worst first`}>
            {sheet.findings.length === 0 ? (
              <p className="text-muted">No rule found anything to say with what is recorded.</p>
            ) : (
              <ReasonList>
                {sheet.findings.map((finding) => (
                  <ReasonItem
                    key={finding.number}
                    number={finding.number}
                    reason={finding}
                    subject={subjectOf(finding)}
                  />
                ))}
              </ReasonList>
            )}
          </SheetSection>
        </div>
        <SheetSection id="bolts" title="Bolts and other placements">
          <BoltTable placements={sheet.placements} />
        </SheetSection>
        <div className="grid gap-x-10 gap-y-8 lg:grid-cols-2 print:grid-cols-2">
          <SheetSection title="The place">
            <PlaceNote sheet={sheet} />
          </SheetSection>
          <SheetSection title="Rings, links, chains">
            <FittingList fittings={sheet.fittings} />
          </SheetSection>
          <SheetSection title="Edges">
            <EdgeList edges={sheet.edges} />
          </SheetSection>
          {sheet.rockBodies.length > 0 ? (
            <SheetSection title="Blocks and flakes">
              <RockBodyList bodies={sheet.rockBodies} />
            </SheetSection>
          ) : null}
          {sheet.spans.length > 0 ? (
            <SheetSection title="Spans">
              <SpanLinks spans={sheet.spans} />
            </SheetSection>
          ) : null}
          {sheet.closures.length > 0 ? (
            <SheetSection title="Closures">
              <ClosureList closures={sheet.closures} />
            </SheetSection>
          ) : null}
          {sheet.jobs.length > 0 ? (
            <SheetSection title="Rebolt queue">
              <ul className="grid gap-1">
                {sheet.jobs.map((job) => (
                  <li key={job.id}>
                    <Link href={`/queue/${job.id}`} className="underline underline-offset-2">
                      {job.title}
                    </Link>{" "}
                    <span className="text-muted">
                      · {JOB_STATE_LABELS[job.state]} · priority {Math.round(job.priority)}
                    </span>
                  </li>
                ))}
              </ul>
            </SheetSection>
          ) : null}
        </div>
        <SheetSection id="reports" title="Reports" note={`${sheet.reports.length}`}>
          <ReportList reports={sheet.reports} timeZone={timeZone} />
        </SheetSection>
        <SheetSection id="history" title="What stood in the holes before">
          <HoleHistory placements={sheet.placements} />
        </SheetSection>
        <SheetSection id="revisions" title="Revisions">
          <RevisionTable
            revisions={sheet.revisions.toReversed().map((revision) => ({
              id: revision.letter,
              letter: revision.letter,
              what: revision.reason ? `${revision.summary}. Reason: ${revision.reason}` : revision.summary,
              when: <Moment at={revision.at} timeZone={timeZone} />,
              by: revision.by,
            }))}
          />
        </SheetSection>
      </div>
    </SheetFrame>
  );
}

function titleOf(sheet: Sheet, revision: string) {
  return {
    name: sheet.label,
    kind: "Anchor sheet",
    code: sheet.code,
    condition: <ConditionMark condition={sheet.condition} verdict={sheet.verdict} />,
    revision,
    cells: [
      {
        name: "Site",
        value: (
          <Link href={`/sites/${sheet.site.slug}`} className="underline underline-offset-2">
            {sheet.site.name}
          </Link>
        ),
      },
      { name: "Use", value: sentence(usesLabel(sheet.uses)) },
      { name: "Row", value: sheet.rowName ?? "–" },
      { name: "Last check", value: <PastDate on={sheet.lastCheckOn} unknown="never" /> },
      { name: "Next check", value: <PastDate on={sheet.nextCheckDueOn} unknown="at once" /> },
      { name: "Policy", value: sheet.policyVersion === null ? "–" : `version ${sheet.policyVersion}` },
    ],
  };
}

/** The verdict, and why the condition is what it is. */
function Standing({ sheet }: { sheet: Sheet }) {
  const worst = sheet.findings.find((finding) => finding.level === "limit");
  return (
    <div className="grid gap-3">
      {sheet.verdict ? (
        <VerdictBanner
          verdict={sheet.verdict}
          about={`as ${usesLabel(sheet.uses)} anchor, area policy version ${sheet.policyVersion ?? "–"}, rules ${sheet.engineVersion ?? "–"}`}
          limits={worst ? `· ${worst.title}` : undefined}
          helpMost={sheet.helpMost}
        />
      ) : (
        <Notice tone="info" title="Not judged yet" />
      )}
      {sheet.outOfUseSince ? (
        <Notice tone="stop" title="Out of use">
          Since <Moment at={sheet.outOfUseSince} timeZone={sheet.area.timeZone} />. It comes back only after a
          hand check of every bolt on site, with a photo.
        </Notice>
      ) : null}
      {sheet.decided ? (
        <Notice tone="warn" title="Condition set by a steward">
          {sheet.decided.reason}
        </Notice>
      ) : null}
      {sheet.note ? <p className="max-w-prose">{sheet.note}</p> : null}
    </div>
  );
}

function subjectOf(finding: SheetFinding): string {
  return finding.placementNumber === null ? "the anchor" : `bolt ${finding.placementNumber}`;
}

function SpanLinks({ spans }: { spans: Sheet["spans"] }) {
  return (
    <ul className="divide-y divide-line border-y border-line">
      {spans.map((span) => (
        <li key={span.id} className="flex flex-wrap items-baseline justify-between gap-x-4 py-2">
          <span>
            <Link href={`/spans/${span.id}`} className="font-semibold underline underline-offset-2">
              {span.name}
            </Link>{" "}
            <span className="text-muted">
              to{" "}
              <Link href={`/anchors/${span.otherCode}`} className="underline underline-offset-2">
                {span.otherCode}
              </Link>
            </span>
          </span>
          <Quantity value={span.lengthM} unit="m" digits={0} className="text-lg" />
        </li>
      ))}
    </ul>
  );
}

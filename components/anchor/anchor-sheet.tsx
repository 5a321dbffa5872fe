import type { ReactNode } from "react";
import { EdgeList, FittingList, RockBodyList } from "@/components/anchor/anchor-parts";
import { BoltTable } from "@/components/anchor/bolt-table";
import { FaceDrawing } from "@/components/anchor/face-drawing";
import { faceInputOf } from "@/components/anchor/face-input-of";
import { HoleHistory } from "@/components/anchor/hole-history";
import { PlaceNote } from "@/components/anchor/place-note";
import { SheetStanding } from "@/components/anchor/sheet-standing";
import { sheetTitle } from "@/components/anchor/sheet-title";
import { ReasonIndex } from "@/components/finding/reason-index";
import { reasonGroups, Reasons } from "@/components/finding/reasons";
import { RevisionTable } from "@/components/layout/revision-table";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { ReportList } from "@/components/report/report-list";
import { SpanLinks } from "@/components/span/span-links";
import { Moment } from "@/components/ui/date-text";
import type { AnchorSheet as Sheet } from "@/lib/schemas/views/anchor";
import { formatCount } from "@/lib/shared/format";

interface AnchorSheetProps {
  sheet: Sheet;
  /** The day the sheet is read: a check that is due before it is overdue. */
  today: string;
  actions: ReactNode;
  /** Something has just happened: said above everything else. */
  message?: ReactNode;
}

/** One anchor as an engineering drawing: title block, verdict, drawing, parts list, reasons, history. */
export function AnchorSheet({ sheet, today, actions, message }: AnchorSheetProps) {
  return (
    <SheetFrame title={sheetTitle(sheet, today)} actions={actions}>
      <div className="grid gap-9 print:gap-5">
        {message}
        <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,36rem)_minmax(0,1fr)] lg:grid-rows-[auto_1fr] print:grid-cols-[minmax(0,5fr)_minmax(0,6fr)] print:grid-rows-[auto_1fr] print:gap-x-5 print:gap-y-3">
          <div className="grid gap-5 lg:col-start-2 print:col-start-2">
            <SheetStanding sheet={sheet} />
            <ReasonIndex findings={sheet.findings} />
          </div>
          <FaceDrawing
            input={faceInputOf(sheet)}
            name={`Face drawing of ${sheet.label}`}
            className="lg:col-start-1 lg:row-span-2 lg:row-start-1 print:col-start-1 print:row-span-2 print:row-start-1"
          />
          <div className="grid gap-7 lg:col-start-2 print:col-start-2 print:gap-4">
            <Attached sheet={sheet} />
          </div>
        </div>
        <SheetSection id="bolts" title="Bolts and other placements">
          <BoltTable placements={sheet.placements} rockBodies={sheet.rockBodies} />
        </SheetSection>
        <SheetSection
          id="reasons"
          title="Reasons"
          note={`${formatCount(reasonGroups(sheet.findings).length, "reason")}, worst first`}
        >
          <Reasons findings={sheet.findings} uses={sheet.uses} />
        </SheetSection>
        <SheetSection id="place" title="The place">
          <PlaceNote sheet={sheet} />
        </SheetSection>
        <SheetSection id="reports" title="Reports" note={openNote(sheet)}>
          <ReportList reports={sheet.reports} timeZone={sheet.area.timeZone} />
        </SheetSection>
        <SheetSection id="history" title="In these holes before">
          <HoleHistory placements={sheet.placements} />
        </SheetSection>
        <SheetSection id="revisions" title="Revisions">
          <Revisions sheet={sheet} />
        </SheetSection>
      </div>
    </SheetFrame>
  );
}

/** What hangs on the anchor, and what the line and the legs touch. */
function Attached({ sheet }: { sheet: Sheet }) {
  return (
    <>
      {sheet.spans.length > 0 ? (
        <SheetSection id="spans" title="Spans">
          <SpanLinks spans={sheet.spans} />
        </SheetSection>
      ) : null}
      {sheet.fittings.length > 0 ? (
        <SheetSection id="fittings" title="Rings, links and chains">
          <FittingList fittings={sheet.fittings} />
        </SheetSection>
      ) : null}
      <SheetSection id="edges" title="Edges">
        <EdgeList edges={sheet.edges} />
      </SheetSection>
      {sheet.rockBodies.length > 0 ? (
        <SheetSection id="blocks" title="Blocks and flakes">
          <RockBodyList bodies={sheet.rockBodies} />
        </SheetSection>
      ) : null}
    </>
  );
}

function Revisions({ sheet }: { sheet: Sheet }) {
  return (
    <RevisionTable
      revisions={sheet.revisions.toReversed().map((revision) => ({
        id: revision.letter,
        letter: revision.letter,
        what: revision.reason ? `${revision.summary}. Reason: ${revision.reason}` : revision.summary,
        when: <Moment at={revision.at} timeZone={sheet.area.timeZone} />,
        by: revision.by,
      }))}
    />
  );
}

function openNote({ reports }: Sheet): string {
  const open = reports.filter(({ state }) => state === "open").length;
  return `${reports.length} in all, ${open} open`;
}

import type { Metadata } from "next";
import { Legend } from "@/components/finding/legend";
import { VerdictMark } from "@/components/finding/verdict-mark";
import { Page } from "@/components/layout/page";
import { SheetSection } from "@/components/layout/sheet-section";
import { Fact, Facts } from "@/components/ui/facts";
import { Notice } from "@/components/ui/notice";
import { SourceMark } from "@/components/ui/source-mark";
import { CAUTION } from "@/lib/domain/finding/engine";

export const metadata: Metadata = { title: "What a verdict means" };

export default function CautionPage() {
  return (
    <Page title="What a verdict means" width="read" intro="And what it does not mean.">
      <div className="grid gap-8">
        <Notice tone="warn">{CAUTION}</Notice>
        <SheetSection title="The four verdicts">
          <Facts>
            <Fact name={<VerdictMark verdict="do_not_use" />}>
              A rule fails even with the friendliest plausible assumption.
            </Fact>
            <Fact name={<VerdictMark verdict="not_enough_known" />}>
              A fact is missing, and knowing it could change the answer. Unknown is never a pass. The one fact
              that would help most stands beside it.
            </Fact>
            <Fact name={<VerdictMark verdict="within_limits" />}>
              It falls short of something; the reasons say of what, and what would clear it.
            </Fact>
            <Fact name={<VerdictMark verdict="nothing_against" />}>
              No rule found anything against it with what is recorded. Nobody has said that it holds.
            </Fact>
          </Facts>
        </SheetSection>
        <SheetSection title="The five marks">
          <Legend />
        </SheetSection>
        <SheetSection title="Where a bend onset comes from">
          <Facts>
            <Fact name={<SourceMark source="tested" />}>measured in a test of this type</Fact>
            <Fact name={<SourceMark source="maker" />}>stated by the maker</Fact>
            <Fact name={<SourceMark source="estimate" />}>
              computed from rod, lever and metal: never a rating
            </Fact>
            <Fact name={<SourceMark source="unknown" />}>nobody has given a number</Fact>
          </Facts>
          <p className="max-w-prose pt-3">
            A rating under a standard is a breaking load. The standard allows a permanent bend in its test, so
            a rating says nothing about when a bolt bends.
          </p>
        </SheetSection>
        <SheetSection title="What the rules stand on">
          <p className="max-w-prose">
            Each reason names its source and how sure it is: <em>published</em> (the standard or paper is
            named), <em>restated by others</em>, <em>from memory</em> (to be confirmed against the text),{" "}
            <em>common practice</em> of the trade, or plain <em>arithmetic</em>. Among the sources: EN 959, EN
            795, EN 892, EN 365, EN 1993-1-4 Annex A, ISO 9223 and 9224, ISO 898-1 and 3506-1, EN 1992-4, ISRM
            rock grades. Where two disagree the more careful one is used.
          </p>
        </SheetSection>
        <SheetSection title="What the record cannot see">
          <p className="max-w-prose">
            Glue inside the hole, cracks under a hanger, a joint behind the bolt, what happened yesterday.
            Look, handle and decide for yourself; ask somebody qualified when you cannot.
          </p>
        </SheetSection>
      </div>
    </Page>
  );
}

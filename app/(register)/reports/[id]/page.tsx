import type { Metadata } from "next";
import { answerReport } from "@/app/(register)/reports/[id]/actions";
import { AnswerForm } from "@/components/report/answer-form";
import { ReportReceipt } from "@/components/report/report-receipt";
import { ReportSheet } from "@/components/report/report-sheet";
import { getActor } from "@/lib/auth/get-actor";
import { idOrNotFound, orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getReport } from "@/lib/queries/reports";

interface ReportPageProps {
  params: Promise<{ id: string }>;
  searchParams: Promise<{ sent?: string }>;
}

export const metadata: Metadata = { title: "Report" };

export default async function ReportPage({ params, searchParams }: ReportPageProps) {
  const actor = await getActor();
  const report = await orNotFound(getReport(actor, idOrNotFound((await params).id)));
  const { sent } = await searchParams;
  const answers = report.state === "open" && can(actor, "report.handle", { areaId: report.areaId });
  return (
    <>
      {sent ? (
        <div className="mx-auto max-w-[96rem] px-3 pt-5 sm:px-6">
          <ReportReceipt report={report} />
        </div>
      ) : null}
      <ReportSheet
        report={report}
        answer={answers ? <AnswerForm report={report} action={answerReport} /> : undefined}
      />
    </>
  );
}

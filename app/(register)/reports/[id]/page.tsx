import type { Metadata } from "next";
import { ReportReceipt } from "@/components/report/report-receipt";
import { ReportSheet } from "@/components/report/report-sheet";
import { getActor } from "@/lib/auth/get-actor";
import { idOrNotFound, orNotFound } from "@/lib/http/or-not-found";
import { getReport } from "@/lib/queries/reports";

interface ReportPageProps {
  params: Promise<{ id: string }>;
  searchParams: Promise<{ sent?: string }>;
}

export const metadata: Metadata = { title: "Report" };

export default async function ReportPage({ params, searchParams }: ReportPageProps) {
  const report = await orNotFound(getReport(await getActor(), idOrNotFound((await params).id)));
  const { sent } = await searchParams;
  return (
    <>
      {sent ? (
        <div className="mx-auto max-w-[96rem] px-3 pt-5 sm:px-6">
          <ReportReceipt report={report} />
        </div>
      ) : null}
      <ReportSheet report={report} />
    </>
  );
}

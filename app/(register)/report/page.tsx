import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { v7 } from "uuid";
import { sendReport } from "@/app/(register)/report/actions";
import { Page } from "@/components/layout/page";
import { ReportForm } from "@/components/report/report-form";
import { Notice } from "@/components/ui/notice";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { orNotFound } from "@/lib/http/or-not-found";
import { getReportTarget } from "@/lib/queries/report-target";
import { pointParam } from "@/lib/schemas/query";

export const metadata: Metadata = { title: "Report what you saw" };

interface ReportPageProps {
  searchParams: Promise<{ anchor?: string; placement?: string; at?: string }>;
}

export default async function ReportPage({ searchParams }: ReportPageProps) {
  const { anchor, placement, at } = await searchParams;
  const actor = await getActor();
  if (actor.kind === "visitor") {
    const back = new URLSearchParams({
      ...(anchor && { anchor }),
      ...(placement && { placement }),
      ...(at && { at }),
    });
    redirect(`/sign-in?next=${encodeURIComponent(`/report?${back.toString()}`)}`);
  }
  const target = anchor ? await orNotFound(getReportTarget(actor, anchor, placement)) : null;
  return (
    <Page
      title="Report what you saw"
      width="read"
      intro={
        target
          ? `${target.anchorCode} · ${target.anchorLabel}`
          : "For a spot where nothing is registered yet. For an anchor in the register, open its sheet and report there."
      }
    >
      <div className="grid gap-6">
        <Notice tone="warn">
          A report informs the people who look after the place; it does not repair anything. If somebody could
          get hurt now, warn the people there first.
        </Notice>
        <ReportForm
          action={sendReport}
          newId={v7()}
          now={now().toISOString()}
          target={target}
          point={pointParam.safeParse(at).data ?? null}
        />
      </div>
    </Page>
  );
}

import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { v7 } from "uuid";
import { judgeType } from "@/app/(register)/anchors/[code]/install/actions";
import { assign, checkByHand, complete, decide, move, putBack } from "@/app/(steward)/queue/actions";
import { faceInputOf } from "@/components/anchor/face-input-of";
import { CompleteForm } from "@/components/queue/complete-form";
import { JobBolts } from "@/components/queue/job-bolts";
import { JobDecisions } from "@/components/queue/job-decisions";
import { JobSheet } from "@/components/queue/job-sheet";
import { ReturnForm } from "@/components/queue/return-form";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { idOrNotFound, orNotFound } from "@/lib/http/or-not-found";
import { can } from "@/lib/policy/can";
import { getInstallSetting } from "@/lib/queries/install-setting";
import { getJob } from "@/lib/queries/rebolt-queue";
import { getAnchorSheet } from "@/lib/queries/get-anchor-sheet";
import type { JobView } from "@/lib/schemas/views/steward";
import type { Person } from "@/lib/shared/actor";

export const metadata: Metadata = { title: "Rebolt job" };

interface JobPageProps {
  params: Promise<{ id: string }>;
}

export default async function JobPage({ params }: JobPageProps) {
  const id = idOrNotFound((await params).id);
  const actor = await getActor();
  if (actor.kind === "visitor") redirect(`/sign-in?next=${encodeURIComponent(`/queue/${id}`)}`);
  const job = await orNotFound(getJob(actor, id));
  const sheet = await orNotFound(getAnchorSheet(actor, { code: job.anchorCode }));
  const at = now().toISOString();
  const { areaId, state } = job;
  const assignedTo = job.assignees.map(({ userId }) => userId);
  const mayDecide = can(actor, "job.decide", { areaId });
  const mayClose = state === "accepted" && can(actor, "job.complete", { areaId, assignedTo });
  const mayPutBack = job.anchorOutOfUseSince !== null && can(actor, "service.return", { areaId });
  return (
    <JobSheet
      job={job}
      anchor={sheet}
      now={at}
      decide={mayDecide && state !== "done" ? <JobDecisions job={job} {...{ decide, assign, move }} /> : null}
      close={mayClose ? <Closing actor={actor} job={job} at={at} /> : null}
      bolts={
        <JobBolts
          job={job}
          timeZone={sheet.area.timeZone}
          now={at}
          newIds={Object.fromEntries(job.bolts.map(({ boltId }) => [boltId, v7()]))}
          check={can(actor, "report.file", { areaId }) ? checkByHand : null}
        />
      }
      putBack={mayPutBack ? <ReturnForm anchorId={job.anchorId} action={putBack} /> : null}
    />
  );
}

async function Closing({ actor, job, at }: { actor: Person; job: JobView; at: string }) {
  const setting = await getInstallSetting(actor, job.anchorCode);
  if (setting === null) return null;
  const { anchor, types, glues, sheet } = setting;
  const holes = anchor.placements.filter(({ number }) => job.placementNumbers.includes(number));
  const rows = holes.map(({ id }) => ({ id: v7(), newPlacementId: v7(), placementId: id }));
  return (
    <CompleteForm
      job={{ id: job.id, version: job.version }}
      complete={complete}
      install={{
        anchor: { ...anchor, face: faceInputOf(sheet) },
        types,
        glues,
        judge: judgeType,
        today: at.slice(0, 10),
        now: at,
        installer: actor.name,
        firstRows: rows.length > 0 ? rows : [{ id: v7(), newPlacementId: v7(), placementId: null }],
      }}
    />
  );
}

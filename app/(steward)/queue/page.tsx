import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { Page } from "@/components/layout/page";
import { QueueTable } from "@/components/queue/queue-table";
import { QueueViews } from "@/components/queue/queue-views";
import { EmptyState, ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { getReboltQueue } from "@/lib/queries/rebolt-queue";
import { queueShow, QUEUE_SHOWS, type QueueShow } from "@/lib/schemas/rebolt";
import type { Actor } from "@/lib/shared/actor";
import { AppError } from "@/lib/shared/errors";

export const metadata: Metadata = { title: "Rebolt queue" };

interface QueuePageProps {
  searchParams: Promise<{ show?: string; sort?: string }>;
}

export default async function QueuePage({ searchParams }: QueuePageProps) {
  const actor = await getActor();
  if (actor.kind === "visitor") redirect("/sign-in?next=/queue");
  const asked = await searchParams;
  const show = queueShow.parse(asked.show);
  const sort = asked.sort === "waiting" || asked.sort === "due" ? asked.sort : "rank";
  const entries = await entriesOf(actor, show);
  if (entries === null) {
    return (
      <Page title="Rebolt queue" width="read">
        <ForbiddenState title="For bolters and stewards">
          What is to be replaced is seen and done by the bolters and stewards of an area. You may still report
          what you saw at any anchor.
        </ForbiddenState>
      </Page>
    );
  }
  return (
    <Page
      title="Rebolt queue"
      intro="What wants work, ranked by what is at stake. A steward may move an entry with a reason; the computed rank stays visible."
    >
      <div className="grid gap-4">
        <QueueViews shows={QUEUE_SHOWS} show={show} sort={sort} />
        {entries.length === 0 ? (
          <EmptyState title="Nothing here">
            A report that takes an anchor out of use opens an entry by itself.
          </EmptyState>
        ) : (
          <QueueTable entries={sorted(entries, sort)} now={now().toISOString()} />
        )}
      </div>
    </Page>
  );
}

type Entries = Awaited<ReturnType<typeof getReboltQueue>>;

/** Null: this reader has no queue. */
async function entriesOf(actor: Actor, show: QueueShow): Promise<Entries | null> {
  try {
    return await getReboltQueue(actor, {
      states: show === "done" || show === "turned_down" ? [show] : ["proposed", "accepted"],
      mine: show === "mine",
    });
  } catch (error) {
    if (error instanceof AppError && error.code === "forbidden") return null;
    throw error;
  }
}

function sorted(entries: Entries, sort: "rank" | "waiting" | "due"): Entries {
  if (sort === "waiting") return entries.toSorted((a, b) => a.waitingSince.localeCompare(b.waitingSince));
  // Without a date it stands behind those that have one.
  if (sort === "due") return entries.toSorted((a, b) => (a.dueOn ?? "9").localeCompare(b.dueOn ?? "9"));
  return entries;
}

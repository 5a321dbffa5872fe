import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { Page } from "@/components/layout/page";
import { PastDate } from "@/components/ui/date-text";
import { StackCell, StackRow, StackTable } from "@/components/ui/stack-table";
import { EmptyState, ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { can } from "@/lib/policy/can";
import { listFailedMails } from "@/lib/queries/notices";

export const metadata: Metadata = { title: "Failed mail" };

const HEAD = [
  { name: "To" },
  { name: "About" },
  { name: "Written" },
  { name: "Tries", numeric: true },
  { name: "Why it failed" },
];

export default async function FailedMailPage() {
  const actor = await getActor();
  if (actor.kind === "visitor") redirect("/sign-in?next=/failed-mail");
  const areaIds = Object.keys(actor.roles);
  const steward = actor.isAdmin || areaIds.some((areaId) => can(actor, "mail.view-failed", { areaId }));
  if (!steward) {
    return (
      <Page title="Failed mail" width="read">
        <ForbiddenState title="For stewards">
          Mail that did not arrive is for the stewards of an area.
        </ForbiddenState>
      </Page>
    );
  }
  const mails = await listFailedMails(actor);
  return (
    <Page
      title="Failed mail"
      intro="What was tried several times and given up. Tell these people in another way, and have the address corrected."
    >
      {mails.length === 0 ? (
        <EmptyState title="Every mail got through">
          What is still on its way or tried again does not stand here.
        </EmptyState>
      ) : (
        <StackTable caption="Mails that were given up" head={HEAD}>
          {mails.map((mail) => (
            <StackRow key={mail.id}>
              <StackCell head>
                <span className="type-code break-all">{mail.toEmail}</span>
              </StackCell>
              <StackCell label="About" wide>
                {mail.subject}
              </StackCell>
              <StackCell label="Written">
                <PastDate on={mail.createdAt.slice(0, 10)} />
              </StackCell>
              <StackCell label="Tries" numeric>
                <span className="type-figure">{mail.attempts}</span>
              </StackCell>
              <StackCell label="Why it failed" wide>
                {mail.lastError ?? "not said"}
              </StackCell>
            </StackRow>
          ))}
        </StackTable>
      )}
    </Page>
  );
}

import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { v7 } from "uuid";
import { endMembership, giveRole, invite, takeInvitationBack } from "@/app/(steward)/people/actions";
import { InvitationList } from "@/components/account/invitation-list";
import { InviteForm } from "@/components/account/invite-form";
import { MemberRow } from "@/components/account/member-row";
import { Page } from "@/components/layout/page";
import { Disclosure } from "@/components/ui/disclosure";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { listPeople } from "@/lib/queries/account/list-people";
import { formatCount } from "@/lib/shared/format";

export const metadata: Metadata = { title: "People" };

export default async function PeoplePage() {
  const actor = await getActor();
  if (actor.kind === "visitor") redirect("/sign-in?next=/people");
  const areas = await listPeople(actor, now());
  if (areas.length === 0) {
    return (
      <Page title="People" width="read">
        <ForbiddenState title="For stewards">
          Who belongs to an area is seen and decided by its stewards.
        </ForbiddenState>
      </Page>
    );
  }
  return (
    <Page title="People" intro="Who belongs to the areas you look after, and who is invited.">
      <div className="grid gap-12">
        {areas.map(({ areaId, areaName, members, invitations }) => (
          <section key={areaId} aria-labelledby={`area-${areaId}`} className="border-t-2 border-frame pt-4">
            <h2 id={`area-${areaId}`}>{areaName}</h2>
            <p className="text-muted">{formatCount(members.length, "member")}</p>
            <div className="mt-4 grid items-start gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
              <ul className="divide-y divide-line border-y border-line">
                {members.map((member) => (
                  <MemberRow key={member.userId} {...{ areaId, areaName, member, giveRole, endMembership }} />
                ))}
              </ul>
              <div className="grid gap-6">
                <InvitationList invitations={invitations} takeBack={takeInvitationBack} />
                <Disclosure summary="Invite somebody" open={areas.length === 1}>
                  <InviteForm action={invite} areaId={areaId} newId={v7()} />
                </Disclosure>
              </div>
            </div>
          </section>
        ))}
      </div>
    </Page>
  );
}

import type { Metadata } from "next";
import { joinArea } from "@/app/(account)/actions";
import { InvitationForm } from "@/components/account/invitation-form";
import { LinkGone } from "@/components/account/link-gone";
import { ROLE_MEANS } from "@/components/account/role-words";
import { Page } from "@/components/layout/page";
import { Fact, Facts } from "@/components/ui/facts";
import { Notice } from "@/components/ui/notice";
import { getActor } from "@/lib/auth/get-actor";
import { hashSecret } from "@/lib/auth/secrets";
import { now } from "@/lib/config/clock";
import { getInvitation } from "@/lib/queries/account/get-invitation";

export const metadata: Metadata = { title: "Invitation" };

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const [invitation, actor] = await Promise.all([getInvitation(hashSecret(token), now()), getActor()]);
  if (!invitation) return <LinkGone>Ask the person who invited you to send a new invitation.</LinkGone>;
  const { email, role, areaName, invitedBy, hasAccount } = invitation;
  const isOther = actor.kind === "person" && actor.email !== email;
  return (
    <Page title={`Join ${areaName}`} width="read" intro={`${invitedBy} invites you.`}>
      <div className="grid gap-6">
        <Facts>
          <Fact name="For">
            <span className="type-code break-all">{email}</span>
          </Fact>
          <Fact name="As">
            <span className="font-semibold">{role}</span>
            <span className="block text-sm text-muted">{ROLE_MEANS[role]}</span>
          </Fact>
        </Facts>
        {isOther ? (
          <Notice tone="warn" title={`You are signed in as ${actor.name}`}>
            Joining signs this device in as {email} instead.
          </Notice>
        ) : null}
        <InvitationForm action={joinArea} secret={token} areaName={areaName} hasAccount={hasAccount} />
      </div>
    </Page>
  );
}

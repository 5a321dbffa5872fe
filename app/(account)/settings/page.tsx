import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { v7 } from "uuid";
import {
  endAllSessions,
  endToken,
  makeToken,
  saveName,
  savePassword,
} from "@/app/(account)/settings/actions";
import { ConfirmForm } from "@/components/account/confirm-form";
import { NameForm } from "@/components/account/name-form";
import { NewPasswordForm } from "@/components/account/new-password-form";
import { SettingsSection } from "@/components/account/settings-section";
import { TokenForm } from "@/components/account/token-form";
import { TokenList } from "@/components/account/token-list";
import { Page } from "@/components/layout/page";
import { Disclosure } from "@/components/ui/disclosure";
import { Fact, Facts } from "@/components/ui/facts";
import { getActor } from "@/lib/auth/get-actor";
import { getSettings } from "@/lib/queries/account/get-settings";

export const metadata: Metadata = { title: "Settings" };

export default async function SettingsPage() {
  const actor = await getActor();
  if (actor.kind === "visitor") redirect("/sign-in?next=/settings");
  const { name, email, isAdmin, hasPassword, roles, tokens } = await getSettings(actor);
  return (
    <Page title="Settings" width="read">
      <div className="grid gap-10">
        <SettingsSection title="You">
          <Facts>
            <Fact name="E-mail">
              <span className="type-code break-all">{email}</span>
            </Fact>
            {roles.map(({ areaName, role }) => (
              <Fact key={areaName} name={areaName}>
                {role}
              </Fact>
            ))}
            {isAdmin ? <Fact name="This installation">administrator</Fact> : null}
          </Facts>
          <NameForm action={saveName} name={name} />
        </SettingsSection>
        <SettingsSection
          title="Password"
          intro={
            hasPassword
              ? "Saving a new one signs you out on every other device."
              : "You sign in with a mailed link. With a password you can sign in without your mail at hand."
          }
        >
          <NewPasswordForm action={savePassword} asksCurrent={hasPassword} to="/settings" />
        </SettingsSection>
        <SettingsSection
          title="Devices"
          intro="Ends every session, this one too, and makes mailed links worthless. API tokens keep working until you revoke them."
        >
          <div>
            <ConfirmForm
              action={endAllSessions}
              label="Sign out everywhere"
              title="Sign out everywhere?"
              confirmLabel="Sign out everywhere"
              to="/sign-in"
            >
              You will have to sign in again on this device too.
            </ConfirmForm>
          </div>
        </SettingsSection>
        <SettingsSection
          title="API tokens"
          intro="For programs that read or write in your name. Whoever has a token can do what it may do: keep it like a password."
        >
          <TokenList tokens={tokens} revoke={endToken} />
          <Disclosure summary="Make a token">
            <TokenForm action={makeToken} newId={v7()} />
          </Disclosure>
        </SettingsSection>
      </div>
    </Page>
  );
}

import type { Metadata } from "next";
import { judgeType, storeInstall, storeSeries } from "@/app/(register)/anchors/[code]/install/actions";
import { faceInputOf } from "@/components/anchor/face-input-of";
import { InstallForm } from "@/components/install/install-form";
import { SeriesForm } from "@/components/install/series-form";
import { Page } from "@/components/layout/page";
import { LinkButton } from "@/components/ui/link-button";
import { Notice } from "@/components/ui/notice";
import { ForbiddenState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { orNotFound } from "@/lib/http/or-not-found";
import { getInstallSetting } from "@/lib/queries/install-setting";
import { v7 } from "uuid";

export const metadata: Metadata = { title: "Log an install" };

interface InstallPageProps {
  params: Promise<{ code: string }>;
  searchParams: Promise<{ placement?: string; series?: string }>;
}

export default async function InstallPage({ params, searchParams }: InstallPageProps) {
  const { code } = await params;
  const { placement, series } = await searchParams;
  const actor = await getActor();
  const setting = await orNotFound(getInstallSetting(actor, code));
  if (setting === null) {
    return (
      <Page title="Log an install" width="read">
        <ForbiddenState title="Bolters of this area log installs">
          You may still report what you saw at this anchor.
        </ForbiddenState>
      </Page>
    );
  }
  const { types, glues } = setting;
  const anchor = { ...setting.anchor, face: faceInputOf(setting.sheet) };
  const at = now();
  const path = `/anchors/${anchor.code}/install`;
  const shared = {
    anchor,
    types,
    glues,
    judge: judgeType,
    newId: v7(),
    newPlacementId: v7(),
    placementId: anchor.placements.find(({ number }) => String(number) === placement)?.id ?? null,
    today: at.toISOString().slice(0, 10),
    now: at.toISOString(),
    installer: actor.kind === "person" ? actor.name : "",
  };
  return (
    <Page
      title={series ? "Log a row of installs" : "Log an install"}
      width="read"
      intro={`${anchor.code} · ${anchor.label}`}
      actions={
        series ? (
          <LinkButton href={path}>One bolt only</LinkButton>
        ) : (
          <LinkButton href={`${path}?series=1`}>Several at once</LinkButton>
        )
      }
    >
      <div className="grid gap-6">
        <Notice tone="warn">
          The maker&rsquo;s instructions, the land owner&rsquo;s permission and local rules come before
          anything written here.
        </Notice>
        {series ? (
          <SeriesForm {...shared} save={storeSeries} />
        ) : (
          <InstallForm {...shared} save={storeInstall} />
        )}
      </div>
    </Page>
  );
}

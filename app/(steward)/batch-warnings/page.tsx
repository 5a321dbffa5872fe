import type { Metadata } from "next";
import { v7 } from "uuid";
import { closeWarning, publishWarning } from "@/app/(steward)/batch-warnings/actions";
import { Page } from "@/components/layout/page";
import { WarningForm } from "@/components/steward/warning-form";
import { WarningList } from "@/components/steward/warning-list";
import { Disclosure } from "@/components/ui/disclosure";
import { EmptyState } from "@/components/ui/state-panel";
import { getActor } from "@/lib/auth/get-actor";
import { can } from "@/lib/policy/can";
import { listAdhesives, listBoltTypes } from "@/lib/queries/bolt-types";
import { listAreas } from "@/lib/queries/list-areas";
import { listBatchWarnings } from "@/lib/queries/notices";
import type { Actor } from "@/lib/shared/actor";

export const metadata: Metadata = { title: "Batch warnings" };

export default async function BatchWarningsPage() {
  const actor = await getActor();
  const warnings = await listBatchWarnings(actor);
  return (
    <Page
      title="Batch warnings"
      intro="What makers, laboratories and stewards warn of. Each is a reason against every bolt it matches until it is closed."
      width="read"
    >
      <div className="grid gap-8">
        {warnings.length === 0 ? (
          <EmptyState title="No warning">Nobody warns of anything that is in the rock here.</EmptyState>
        ) : (
          <WarningList
            close={closeWarning}
            warnings={warnings.map((warning) => ({
              ...warning,
              mayClose: can(actor, "warning.write", { areaId: warning.areaId }),
            }))}
          />
        )}
        <Publishing actor={actor} />
      </div>
    </Page>
  );
}

async function Publishing({ actor }: { actor: Actor }) {
  const everywhere = can(actor, "warning.write", { areaId: null });
  const areas = (await listAreas(actor)).filter(({ id }) => can(actor, "warning.write", { areaId: id }));
  if (areas.length === 0 && !everywhere) return null;
  const [types, adhesives] = await Promise.all([listBoltTypes(actor), listAdhesives()]);
  const choice = ({ id, name }: { id: string; name: string }) => ({ value: id, label: name });
  return (
    <Disclosure summary="Publish a warning">
      <WarningForm
        action={publishWarning}
        newId={v7()}
        areas={[...areas.map(choice), ...(everywhere ? [{ value: "", label: "Every area" }] : [])]}
        types={types.map(choice)}
        adhesives={adhesives.map(choice)}
      />
    </Disclosure>
  );
}

import type { Metadata } from "next";
import { TypeList } from "@/components/catalogue/type-list";
import { Page } from "@/components/layout/page";
import { getActor } from "@/lib/auth/get-actor";
import { listBoltTypes } from "@/lib/queries/bolt-types";

export const metadata: Metadata = { title: "Types" };

export default async function TypesPage() {
  const types = await listBoltTypes(await getActor());
  return (
    <Page
      title="Types"
      intro="What hardware is like. A rating is a breaking load and says nothing about when a bolt bends: the two stand apart, each with where its number comes from."
    >
      <TypeList types={types} />
    </Page>
  );
}

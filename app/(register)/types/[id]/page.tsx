import type { Metadata } from "next";
import { TypeFacts } from "@/components/catalogue/type-facts";
import { TypeMatrix } from "@/components/catalogue/type-matrix";
import { SheetFrame } from "@/components/layout/sheet-frame";
import { SheetSection } from "@/components/layout/sheet-section";
import { getActor } from "@/lib/auth/get-actor";
import { now } from "@/lib/config/clock";
import { FORM_LABELS, metalLabel, sentence, TYPE_STATUS_LABELS } from "@/lib/domain/labels";
import { idOrNotFound, orNotFound } from "@/lib/http/or-not-found";
import { getBoltType, typeMatrix } from "@/lib/queries/bolt-types";

interface TypePageProps {
  params: Promise<{ id: string }>;
}

export async function generateMetadata({ params }: TypePageProps): Promise<Metadata> {
  const id = idOrNotFound((await params).id);
  return { title: (await orNotFound(getBoltType(await getActor(), id))).name };
}

export default async function TypePage({ params }: TypePageProps) {
  const id = idOrNotFound((await params).id);
  const type = await orNotFound(getBoltType(await getActor(), id));
  return (
    <SheetFrame
      title={{
        name: type.name,
        kind: "Bolt type",
        cells: [
          { name: "Form", value: sentence(FORM_LABELS[type.form]) },
          { name: "Metal", value: metalLabel(type.boltMetal) },
          { name: "Standard", value: type.standard ?? "none claimed" },
          { name: "Status", value: TYPE_STATUS_LABELS[type.status] },
          { name: "In the rock", value: String(type.inForce) },
        ],
      }}
    >
      <div className="grid gap-8">
        <SheetSection title="Numbers">
          <TypeFacts type={type} />
        </SheetSection>
        <SheetSection title="By use and place">
          <TypeMatrix matrix={typeMatrix(type, now().toISOString().slice(0, 10))} name={type.name} />
        </SheetSection>
      </div>
    </SheetFrame>
  );
}

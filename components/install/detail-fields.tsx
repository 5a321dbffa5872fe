import type { ErrorOf, Kept } from "@/components/install/install-types";
import { Disclosure } from "@/components/ui/disclosure";
import { NumberField } from "@/components/ui/number-field";
import { SelectField } from "@/components/ui/select-field";
import { TextField } from "@/components/ui/text-field";
import { FORM_LABELS, METAL_CHOICES, sentence } from "@/lib/domain/labels";
import { FORMS } from "@/lib/domain/vocabulary";

interface DetailFieldsProps {
  prefix: string;
  /** No type was chosen: say at least what it looks like. */
  untyped: boolean;
  kept: Kept;
  errorOf: ErrorOf;
}

/** Form and metals where the catalogue does not say them, batch and standard. */
export function DetailFields({ prefix, untyped, kept, errorOf }: DetailFieldsProps) {
  const p = (name: string) => prefix + name;
  const metal = (name: string, label: string) => (
    <SelectField
      name={p(name)}
      label={label}
      emptyLabel={untyped ? "Not known" : "As the type says"}
      choices={METAL_CHOICES}
      defaultValue={kept[p(name)] ?? ""}
      error={errorOf(p(name))}
      optional
    />
  );
  const magnet = [
    { value: "true", label: "A magnet sticks" },
    { value: "false", label: "A magnet does not stick" },
  ];
  return (
    <>
      {untyped ? (
        <SelectField
          name={p("form")}
          label="What it looks like"
          emptyLabel="Choose"
          choices={FORMS.map((value) => ({ value, label: sentence(FORM_LABELS[value]) }))}
          defaultValue={kept[p("form")] ?? ""}
          error={errorOf(p("form"))}
        />
      ) : null}
      <TextField
        name={p("batch")}
        label="Batch of the hardware"
        code
        hint="Stamped on it or printed on the bag"
        defaultValue={kept[p("batch")]}
        error={errorOf(p("batch"))}
        optional
      />
      <Disclosure
        open={untyped}
        summary={untyped ? "Metals, standard, magnet" : "Where it differs from its type"}
      >
        <div className="grid gap-5 pt-2 sm:grid-cols-2">
          {metal("boltMetal", "Metal of the bolt")}
          {metal("hangerMetal", "Metal of the hanger")}
          {metal("linkMetal", "Metal of ring or link")}
          <TextField
            name={p("claimedStandard")}
            label="Standard stamped on it"
            defaultValue={kept[p("claimedStandard")]}
            error={errorOf(p("claimedStandard"))}
            optional
          />
          <SelectField
            name={p("magnetic")}
            label="Magnet"
            emptyLabel="Not tried"
            choices={magnet}
            defaultValue={kept[p("magnetic")] ?? ""}
            error={errorOf(p("magnetic"))}
            optional
          />
          <NumberField
            name={p("rustGrade")}
            label="Rust as it is"
            unit="of 4"
            hint="0 none to 4 section lost"
            defaultValue={kept[p("rustGrade")]}
            error={errorOf(p("rustGrade"))}
            optional
          />
        </div>
      </Disclosure>
    </>
  );
}

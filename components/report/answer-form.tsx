"use client";

import { useState } from "react";
import { Checkbox } from "@/components/ui/checkbox";
import { ErrorSummary } from "@/components/ui/error-summary";
import { RadioCards } from "@/components/ui/radio-cards";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextareaField } from "@/components/ui/textarea-field";
import { useForm } from "@/components/ui/use-form";
import type { ReportView } from "@/lib/schemas/views/register";
import type { FormAction } from "@/lib/shared/action-state";

interface AnswerFormProps {
  report: Pick<ReportView, "id" | "version" | "confirmed" | "tookOutOfUse" | "kind" | "measured">;
  action: FormAction<void>;
}

/** A steward says what became of a report. Its writer gets the words by mail. */
export function AnswerForm({ report, action }: AnswerFormProps) {
  const form = useForm(action);
  const [answer, setAnswer] = useState<string | null>(null);
  const mayBeSalt = report.kind === "corrosion";
  return (
    <form {...form.formProps} className="grid max-w-3xl gap-5">
      <ErrorSummary problems={form.problems} title="Not answered yet" />
      <input type="hidden" name="id" value={report.id} readOnly />
      <input type="hidden" name="version" value={report.version} readOnly />
      <RadioCards
        name="answer"
        legend="What became of it"
        cards={answersFor(report)}
        value={answer}
        onChange={(event) => setAnswer(event.currentTarget.value)}
        error={form.errorOf("answer")}
      />
      <TextareaField
        name="how"
        label={answer === "found_wrong" ? "Why it is wrong" : "What was done, or found"}
        hint="Stands beside the report for everybody who sees it."
        error={form.errorOf("how")}
        maxLength={1000}
      />
      {mayBeSalt ? (
        <Checkbox
          name="stressCorrosionConfirmed"
          label="It is proven that salt cracked this metal here"
          hint="Only after the piece was looked at in a workshop or laboratory. It stops this metal at the whole site."
          error={form.errorOf("stressCorrosionConfirmed")}
        />
      ) : null}
      <SubmitButton pending={form.pending} pendingLabel="Storing…">
        Answer
      </SubmitButton>
    </form>
  );
}

function answersFor({ confirmed, tookOutOfUse }: AnswerFormProps["report"]) {
  return [
    ...(confirmed
      ? []
      : [{ value: "confirmed", label: "It is true", detail: "It stays open and counts from now on." }]),
    {
      value: "handled",
      label: "Dealt with",
      detail: tookOutOfUse
        ? "The anchor still stays out of use until every bolt was checked by hand."
        : "It no longer counts against the anchor.",
    },
    {
      value: "found_wrong",
      label: "Found wrong",
      detail: "It is struck through and stays in history.",
    },
  ];
}

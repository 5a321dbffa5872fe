"use client";

import { startTransition, useActionState, useEffect } from "react";
import type { TypeChoice } from "@/components/install/install-types";
import { ReasonItem, ReasonList } from "@/components/finding/reason-item";
import { VerdictBanner } from "@/components/finding/verdict-banner";
import { ComboboxField } from "@/components/ui/combobox-field";
import { Disclosure } from "@/components/ui/disclosure";
import { Notice } from "@/components/ui/notice";
import { ONSET_BASIS_LABELS, USE_LABELS } from "@/lib/domain/labels";
import type { WhatIfAnswer } from "@/lib/domain/finding/what-if";
import type { Use } from "@/lib/domain/vocabulary";
import type { ActionState, FormAction } from "@/lib/shared/action-state";
import { formatKn } from "@/lib/shared/format";

export interface Judged {
  answers: readonly { use: Use; answer: WhatIfAnswer }[];
  policyVersion: number;
}

interface TypeFieldProps {
  name: string;
  anchorId: string;
  types: readonly TypeChoice[];
  judge: FormAction<Judged>;
  value: string | null;
  onChange: (id: string | null) => void;
  /** What is typed so far and counts for the verdict. */
  typed: { method: string; embedmentMm: string; leverMm: string };
  error: string | undefined;
}

/** The type first, and at once what speaks against it at this anchor: before anybody drills. */
export function TypeField({ name, anchorId, types, judge, value, onChange, typed, error }: TypeFieldProps) {
  const [state, ask, pending] = useActionState<ActionState<Judged>, Record<string, string> | null>(
    async (before, sent) => (sent === null ? { state: "idle" } : judge(before, sent)),
    { state: "idle" },
  );
  const { method, embedmentMm, leverMm } = typed;
  useEffect(() => {
    // A short wait, so that a number being typed is not judged digit by digit.
    const timer = setTimeout(() => {
      startTransition(() =>
        ask(value === null ? null : { anchorId, boltTypeId: value, method, embedmentMm, leverMm }),
      );
    }, 350);
    return () => clearTimeout(timer);
  }, [ask, anchorId, value, method, embedmentMm, leverMm]);

  return (
    <div className="grid gap-4">
      <ComboboxField
        name={name}
        label="Type"
        hint="Type a few letters: a diameter, a metal, a form."
        choices={types.map((type) => ({ value: type.id, label: type.name, detail: detailOf(type) }))}
        value={value}
        onValueChange={onChange}
        placeholder="Not in the catalogue"
        emptyText="No type of that name. Leave it empty and describe what you see."
        error={error}
      />
      <div aria-live="polite" aria-busy={pending}>
        {value !== null && state.state === "done" ? <JudgedAnswers judged={state.result} /> : null}
        {value !== null && state.state === "idle" ? (
          <p className="text-muted">Holding it against this anchor…</p>
        ) : null}
        {value !== null && state.state === "refused" ? <Notice tone="warn">{state.message}</Notice> : null}
      </div>
    </div>
  );
}

function detailOf({
  ratedRadialKn,
  ratedAxialKn,
  bendOnsetLowKn,
  bendOnsetBasis,
  discontinued,
}: TypeChoice): string {
  const kn = (value: number | null) => (value === null ? "not known" : formatKn(value));
  const onset =
    bendOnsetLowKn === null
      ? "bend onset not known"
      : `bends from ${formatKn(bendOnsetLowKn)} (${ONSET_BASIS_LABELS[bendOnsetBasis]})`;
  return `rated ${kn(ratedRadialKn)} across, ${kn(ratedAxialKn)} along · ${onset}${discontinued ? " · discontinued" : ""}`;
}

function JudgedAnswers({ judged }: { judged: Judged }) {
  return (
    <div className="grid gap-4">
      {judged.answers.map(({ use, answer }) => {
        const [worst] = answer.findings;
        return (
          <div key={use} data-use={use}>
            <VerdictBanner
              verdict={answer.verdict}
              headingLevel={3}
              about={`as a new ${USE_LABELS[use]} bolt at this anchor, one bolt carrying all; area policy version ${judged.policyVersion}`}
              limits={answer.verdict === "within_limits" && worst ? `· ${worst.title}` : undefined}
              helpMost={worst?.title}
            />
            {answer.findings.length > 0 ? (
              <Disclosure
                open={answer.verdict === "do_not_use"}
                summary={`${answer.findings.length} ${answer.findings.length === 1 ? "reason" : "reasons"}`}
              >
                <ReasonList label={`Reasons for ${USE_LABELS[use]}`}>
                  {answer.findings.map((reason, index) => (
                    <ReasonItem
                      key={`${reason.code}-${reason.title}`}
                      number={index + 1}
                      reason={reason}
                      idPrefix={use}
                    />
                  ))}
                </ReasonList>
              </Disclosure>
            ) : null}
          </div>
        );
      })}
    </div>
  );
}

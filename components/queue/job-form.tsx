"use client";

import type { ReactNode } from "react";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import type { Form } from "@/components/ui/use-form";

export interface JobRef {
  id: string;
  version: number;
}

interface JobFormProps {
  form: Form<unknown>;
  job: JobRef;
  /** Keeps the ids of several small forms on one page apart; fields carry it as `${prefix}-${name}`. */
  prefix: string;
  submit: string;
  tone?: "primary" | "secondary" | "danger";
  children?: ReactNode;
}

/** A small form about one entry of the queue, in the version its reader saw. */
export function JobForm({ form, job, prefix, submit, tone = "secondary", children }: JobFormProps) {
  const problems = form.problems.map(({ path, message }) => ({
    path: path === "" ? "" : `${prefix}-${path}`,
    message,
  }));
  return (
    <form {...form.formProps} className="grid gap-4">
      <ErrorSummary problems={problems} title="Nothing was changed" />
      <input type="hidden" name="id" value={job.id} readOnly />
      <input type="hidden" name="version" value={job.version} readOnly />
      {children}
      <SubmitButton tone={tone} pending={form.pending} pendingLabel="Saving…">
        {submit}
      </SubmitButton>
    </form>
  );
}

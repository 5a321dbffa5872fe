"use client";

import { type ReactNode, useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SubmitButton } from "@/components/ui/submit-button";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";

interface ConfirmFormProps {
  action: FormAction<void>;
  /** What is sent, as hidden fields. */
  values?: Readonly<Record<string, string>>;
  label: string;
  /** Tells this button from its likes in a list; read out only. */
  about?: string;
  title: string;
  /** What will happen. */
  children: ReactNode;
  confirmLabel: string;
  /** Where to go afterwards, with a full load. */
  to?: string;
}

/** A step that is asked about once before it is taken. */
export function ConfirmForm({
  action,
  values = {},
  label,
  about,
  title,
  children,
  confirmLabel,
  to,
}: ConfirmFormProps) {
  const [open, setOpen] = useState(false);
  const form = useForm(action, () => {
    setOpen(false);
    if (to) window.location.assign(to);
  });
  return (
    <Dialog
      title={title}
      open={open}
      onOpenChange={setOpen}
      closeLabel={null}
      trigger={
        <Button tone="danger">
          <span>
            {label}
            {about ? <span className="sr-only"> {about}</span> : null}
          </span>
        </Button>
      }
    >
      <form {...form.formProps} className="grid gap-4">
        <ErrorSummary problems={form.problems} title="Nothing was changed" />
        <div>{children}</div>
        {Object.entries(values).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onClick={() => setOpen(false)}>Leave it</Button>
          <SubmitButton tone="danger" pending={form.pending}>
            {confirmLabel}
          </SubmitButton>
        </div>
      </form>
    </Dialog>
  );
}

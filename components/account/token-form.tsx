"use client";

import { Checkbox } from "@/components/ui/checkbox";
import { ErrorSummary } from "@/components/ui/error-summary";
import { FieldError } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { TextField } from "@/components/ui/text-field";
import { useForm } from "@/components/ui/use-form";
import { SCOPE_MEANS } from "@/components/account/scope-words";
import type { FormAction } from "@/lib/shared/action-state";
import { TOKEN_SCOPES } from "@/lib/shared/actor";

const LIFETIMES = [
  { value: "30", label: "30 days" },
  { value: "90", label: "90 days" },
  { value: "365", label: "a year" },
  { value: "never", label: "until it is revoked" },
];

/** Makes a token and shows it, once. `newId` is minted by the page, so a second press makes no second token. */
export function TokenForm({ action, newId }: { action: FormAction<{ token: string }>; newId: string }) {
  const form = useForm(action);
  return (
    <form {...form.formProps} className="grid gap-5">
      <ErrorSummary problems={form.problems} title="No token was made" />
      {form.state.state === "done" ? (
        <Notice tone="calm" role="status" title="Copy the token now; it is not shown again">
          <code className="type-code break-all">{form.state.result.token}</code>
        </Notice>
      ) : null}
      <input type="hidden" name="id" value={newId} />
      <TextField
        name="name"
        id="token-name"
        label="What is it for?"
        hint="For example: export to the group’s map"
        autoComplete="off"
        error={form.errorOf("name")}
      />
      <fieldset id="scopes" tabIndex={-1} className="min-w-0">
        <legend className="mb-1 font-semibold">What may it do?</legend>
        <p className="text-sm text-muted">Never more than you may yourself.</p>
        {TOKEN_SCOPES.map((scope) => (
          <Checkbox
            key={scope}
            name="scopes[]"
            id={`scope-${scope}`}
            value={scope}
            label={SCOPE_MEANS[scope].label}
            hint={SCOPE_MEANS[scope].detail}
          />
        ))}
        <FieldError inputId="scopes" error={form.errorOf("scopes")} />
      </fieldset>
      <SelectField
        name="expiresInDays"
        label="How long does it work?"
        choices={LIFETIMES}
        defaultValue="90"
        error={form.errorOf("expiresInDays")}
      />
      <div>
        <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Making it…">
          Make a token
        </SubmitButton>
      </div>
    </form>
  );
}

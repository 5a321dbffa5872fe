"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Field, fieldIds, inputLook } from "@/components/ui/field";

interface PasswordFieldProps {
  name: string;
  label: string;
  hint?: string;
  error?: string | undefined;
  optional?: boolean;
  autoComplete: "current-password" | "new-password";
}

/** A password that can be looked at while it is typed: easier than typing it twice with cold hands. */
export function PasswordField({ autoComplete, ...field }: PasswordFieldProps) {
  const [shown, setShown] = useState(false);
  const { inputId, describedBy, invalid } = fieldIds(field);
  return (
    <Field {...field}>
      <div className="flex gap-2">
        <input
          id={inputId}
          name={field.name}
          type={shown ? "text" : "password"}
          autoComplete={autoComplete}
          autoCapitalize="none"
          spellCheck={false}
          aria-describedby={describedBy}
          aria-invalid={invalid}
          className={inputLook}
        />
        <Button aria-pressed={shown} aria-controls={inputId} onClick={() => setShown(!shown)}>
          <span>
            {shown ? "Hide" : "Show"}
            <span className="sr-only"> {field.label.toLowerCase()}</span>
          </span>
        </Button>
      </div>
    </Field>
  );
}

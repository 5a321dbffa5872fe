"use client";

import { ConfirmForm } from "@/components/account/confirm-form";
import { ROLE_CHOICES } from "@/components/account/role-words";
import { Badge } from "@/components/ui/badge";
import { ErrorSummary } from "@/components/ui/error-summary";
import { SelectField } from "@/components/ui/select-field";
import { SubmitButton } from "@/components/ui/submit-button";
import { useForm } from "@/components/ui/use-form";
import type { FormAction } from "@/lib/shared/action-state";
import type { Role } from "@/lib/shared/actor";

interface MemberRowProps {
  areaId: string;
  areaName: string;
  member: { userId: string; name: string; email: string; role: Role; version: number; isYou: boolean };
  giveRole: FormAction<void>;
  endMembership: FormAction<void>;
}

/** One member: who, which role, and the two things a steward can do about it. */
export function MemberRow({ areaId, areaName, member, giveRole, endMembership }: MemberRowProps) {
  const form = useForm(giveRole);
  const fieldId = `role-${areaId}-${member.userId}`;
  return (
    <li className="grid gap-3 py-4">
      <div className="grid items-end gap-x-6 gap-y-3 lg:grid-cols-[1fr_auto]">
        <p className="grid min-w-0 self-center">
          <span className="font-semibold">
            {member.name} {member.isYou ? <Badge>you</Badge> : null}
          </span>
          <span className="type-code text-sm break-all text-muted">{member.email}</span>
        </p>
        <div className="flex flex-wrap items-end gap-2">
          <form {...form.formProps} className="flex flex-wrap items-end gap-2">
            <input type="hidden" name="areaId" value={areaId} />
            <input type="hidden" name="userId" value={member.userId} />
            <input type="hidden" name="version" value={member.version} />
            <SelectField
              key={member.version}
              name="role"
              id={fieldId}
              label={<span className="type-label">Role of {member.name}</span>}
              choices={ROLE_CHOICES}
              defaultValue={member.role}
              className="min-w-40"
            />
            <SubmitButton tone="secondary" pending={form.pending} pendingLabel="Saving…">
              Save<span className="sr-only"> the role of {member.name}</span>
            </SubmitButton>
          </form>
          <ConfirmForm
            action={endMembership}
            values={{ areaId, userId: member.userId }}
            label="Remove"
            about={`${member.name} from ${areaName}`}
            title={`Remove ${member.name} from ${areaName}?`}
            confirmLabel="Remove"
          >
            The account and everything {member.name} recorded stay. They lose what members see at once.
          </ConfirmForm>
        </div>
      </div>
      <ErrorSummary problems={form.problems} title="The role was not changed" />
    </li>
  );
}

import { ConfirmForm } from "@/components/account/confirm-form";
import { formatPastDate } from "@/lib/shared/format";
import type { FormAction } from "@/lib/shared/action-state";
import type { Role } from "@/lib/shared/actor";

interface InvitationListProps {
  invitations: readonly {
    id: string;
    email: string;
    role: Role;
    invitedBy: string | null;
    expiresAt: string;
  }[];
  takeBack: FormAction<void>;
}

/** Invitations that wait for an answer. */
export function InvitationList({ invitations, takeBack }: InvitationListProps) {
  return (
    <section className="grid gap-2">
      <h3>Waiting for an answer</h3>
      {invitations.length === 0 ? <p className="text-muted">Nobody is invited right now.</p> : null}
      <ul className="divide-y divide-line">
        {invitations.map(({ id, email, role, invitedBy, expiresAt }) => (
          <li key={id} className="grid gap-2 py-3">
            <p className="grid">
              <span className="type-code break-all">{email}</span>
              <span className="text-sm text-muted">
                as {role}
                {invitedBy ? `, invited by ${invitedBy}` : ""}; works until {formatPastDate(expiresAt)}
              </span>
            </p>
            <div>
              <ConfirmForm
                action={takeBack}
                values={{ id }}
                label="Take back"
                about={`the invitation of ${email}`}
                title="Take the invitation back?"
                confirmLabel="Take back"
              >
                The link in the mail to {email} stops working.
              </ConfirmForm>
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
}

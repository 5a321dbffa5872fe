import { ConfirmForm } from "@/components/account/confirm-form";
import { SCOPE_MEANS } from "@/components/account/scope-words";
import { formatList, formatPastDate } from "@/lib/shared/format";
import type { FormAction } from "@/lib/shared/action-state";
import type { TokenScope } from "@/lib/shared/actor";

interface TokenListProps {
  tokens: readonly {
    id: string;
    name: string;
    hint: string;
    scopes: readonly TokenScope[];
    createdAt: string;
    expiresAt: string | null;
    lastUsedAt: string | null;
  }[];
  revoke: FormAction<void>;
}

/** The tokens in force, each with when it last worked. */
export function TokenList({ tokens, revoke }: TokenListProps) {
  if (tokens.length === 0) return <p className="text-muted">There is none.</p>;
  return (
    <ul className="divide-y divide-line border-y border-line">
      {tokens.map((token) => (
        <li key={token.id} className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3">
          <div className="grid min-w-0 gap-0.5">
            <p className="font-semibold">
              {token.name} <span className="type-code font-normal text-muted">{token.hint}…</span>
            </p>
            <p className="text-sm text-muted">
              May {formatList(token.scopes.map((scope) => SCOPE_MEANS[scope].label.toLowerCase()))}. Made{" "}
              {formatPastDate(token.createdAt)}, works{" "}
              {token.expiresAt ? `until ${formatPastDate(token.expiresAt)}` : "until revoked"}.{" "}
              {token.lastUsedAt ? `Last used ${formatPastDate(token.lastUsedAt)}.` : "Never used."}
            </p>
          </div>
          <ConfirmForm
            action={revoke}
            values={{ id: token.id }}
            label="Revoke"
            about={token.name}
            title={`Revoke “${token.name}”?`}
            confirmLabel="Revoke"
          >
            Programs that use it are refused from now on. This cannot be undone; you can make a new one.
          </ConfirmForm>
        </li>
      ))}
    </ul>
  );
}

import { Badge } from "@/components/ui/badge";
import type { Operation } from "@/lib/schemas/openapi/operations";

/** One call: method, path, what it is for, what it takes, what it may answer. */
export function ApiOperation({ operation }: { operation: Operation }) {
  return (
    <li className="grid gap-1 py-3">
      <div className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
        <Badge tone={operation.method === "GET" ? "plain" : "info"}>{operation.method}</Badge>
        <span className="type-code break-all">{operation.path}</span>
        {operation.signedIn ? <span className="type-label text-muted">signed in</span> : null}
      </div>
      <p>{operation.summary}</p>
      {operation.parameters.length > 0 ? (
        <p className="text-sm text-muted">
          Takes <span className="type-code break-words">{operation.parameters.join(", ")}</span>
        </p>
      ) : null}
      <p className="text-sm text-muted">Answers {operation.answers.join(", ")}</p>
    </li>
  );
}

import type { Metadata } from "next";
import { ApiOperation } from "@/components/api/api-operation";
import { Page } from "@/components/layout/page";
import { SheetSection } from "@/components/layout/sheet-section";
import { publicUrl } from "@/lib/config/env";
import { ERROR_WORDS } from "@/lib/http/problem";
import { operationsOf } from "@/lib/schemas/openapi/operations";

export const metadata: Metadata = { title: "API" };

export default function ApiPage() {
  return (
    <Page
      title="API"
      width="read"
      intro="JSON under /api/v1. Units stand in the field names, null means not known, points are GeoJSON on WGS84."
    >
      <div className="grid gap-8">
        <p className="max-w-prose">
          The same for machines:{" "}
          <a className="underline underline-offset-2" href="/api/v1/openapi.json">
            OpenAPI 3.1
          </a>
          . Programs send <span className="type-code">Authorization: Bearer …</span> with a token made under{" "}
          <a className="underline underline-offset-2" href="/settings">
            Settings
          </a>
          . Creates carry an id you make (UUID): sent twice they answer the first answer again. Writes on
          existing records want <span className="type-code">If-Match</span> with the version you last read.
        </p>
        <SheetSection title="Calls">
          <ul className="divide-y divide-line border-y border-line">
            {operationsOf(publicUrl()).map((operation) => (
              <ApiOperation key={`${operation.method} ${operation.path}`} operation={operation} />
            ))}
          </ul>
        </SheetSection>
        <SheetSection title="Refusals" note="application/problem+json, RFC 9457">
          <dl className="divide-y divide-line border-y border-line">
            {Object.entries(ERROR_WORDS).map(([code, { status, title }]) => (
              <div
                key={code}
                id={code}
                className="grid scroll-mt-4 grid-cols-[4rem_1fr] gap-2 py-2 target:bg-calm-ground"
              >
                <dt className="type-figure">{status}</dt>
                <dd>
                  <span className="type-code">{code}</span> <span className="text-muted">· {title}</span>
                </dd>
              </div>
            ))}
          </dl>
        </SheetSection>
      </div>
    </Page>
  );
}

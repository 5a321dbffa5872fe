import Link from "next/link";
import { MarkShape } from "@/components/finding/condition-mark";
import { CONDITION_LABELS, SITE_VISIBILITY_LABELS } from "@/lib/domain/labels";
import { CONDITIONS } from "@/lib/domain/vocabulary";
import type { SiteSummary } from "@/lib/schemas/views/register";
import { readableText } from "@/lib/shared/readable-text";

/** Sites as rows of a schedule: name, rock, and how many anchors stand in which condition. */
export function SiteList({ sites }: { sites: readonly SiteSummary[] }) {
  return (
    <ul className="border-t-2 border-frame">
      {sites.map((site) => (
        <li
          key={site.id}
          className="grid gap-x-8 gap-y-2 border-b border-line py-4 md:grid-cols-[1fr_auto] md:items-center"
        >
          <div>
            <h2>
              <Link href={`/sites/${site.slug}`} className="inline-block py-1 text-link">
                {site.name}
              </Link>
            </h2>
            <p className="max-w-prose text-muted">
              {site.exact
                ? readableText(site.summary)
                : "The group keeps this place to its members; the point is rounded to about 1 km."}
            </p>
            <p className="type-label text-muted">
              <Link href={`/areas/${site.areaSlug}`} className="inline-block py-1 text-link">
                {site.areaName}
              </Link>
              {site.rockType ? ` · ${site.rockType}` : ""}
              {site.visibility === "public" ? "" : ` · ${SITE_VISIBILITY_LABELS[site.visibility]}`}
              {site.openReports > 0
                ? ` · ${site.openReports} open ${site.openReports === 1 ? "report" : "reports"}`
                : ""}
            </p>
          </div>
          <ConditionCounts conditions={site.conditions} />
        </li>
      ))}
    </ul>
  );
}

/** "17 in service, 2 check first": marks with their numbers. */
export function ConditionCounts({ conditions }: { conditions: Readonly<Record<string, number>> }) {
  const present = CONDITIONS.filter((condition) => (conditions[condition] ?? 0) > 0);
  return (
    <ul className="flex flex-wrap gap-x-5 gap-y-1" aria-label="Anchors by condition">
      {present.map((condition) => (
        <li key={condition} className="flex items-center gap-1.5">
          <MarkShape mark={condition} />
          <span className="type-figure text-lg">{conditions[condition]}</span>
          <span className="type-label text-muted">{CONDITION_LABELS[condition]}</span>
        </li>
      ))}
    </ul>
  );
}

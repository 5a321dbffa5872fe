import Link from "next/link";
import { ClosureList } from "@/components/anchor/closure-list";
import { VerdictBanner } from "@/components/finding/verdict-banner";
import { Moment } from "@/components/ui/date-text";
import { Notice } from "@/components/ui/notice";
import { CONDITION_LABELS, usesLabel } from "@/lib/domain/labels";
import type { AnchorSheet } from "@/lib/schemas/views/anchor";
import { formatList } from "@/lib/shared/format";
import { readableText } from "@/lib/shared/readable-text";

/** Where the anchor stands today: verdict, what took it out of use, what a steward decided, closures. */
export function SheetStanding({ sheet }: { sheet: AnchorSheet }) {
  const { timeZone } = sheet.area;
  return (
    <div className="grid gap-3">
      {sheet.verdict ? (
        <VerdictBanner
          verdict={sheet.verdict}
          about={`for ${usesLabel(sheet.uses)}, with what is recorded today`}
          limits={limitsOf(sheet)}
          helpMost={sheet.helpMost ? readableText(sheet.helpMost) : undefined}
        />
      ) : (
        <Notice tone="info" title="Not judged yet" />
      )}
      {sheet.outOfUseSince ? (
        <Notice tone="stop" title="Out of use">
          Since <Moment at={sheet.outOfUseSince} timeZone={timeZone} />. It comes back only after every bolt
          that carried the event was checked by hand on site, with a photo.
          {sheet.jobs.length > 0 ? <Jobs jobs={sheet.jobs} /> : null}
        </Notice>
      ) : null}
      {sheet.decided ? (
        <Notice tone="warn" title={`A steward decided: ${CONDITION_LABELS[sheet.decided.condition]}`}>
          {sheet.decided.reason} (<Moment at={sheet.decided.at} timeZone={timeZone} />; from the record alone
          it would be {CONDITION_LABELS[sheet.derivedCondition]})
        </Notice>
      ) : null}
      {sheet.closures.length > 0 ? (
        <Notice tone="warn" title="Closures">
          <ClosureList closures={sheet.closures} />
        </Notice>
      ) : null}
      {sheet.exact ? null : (
        <Notice tone="info" title="Members see the place">
          The group keeps this site to itself. You see the hardware, the verdict and a point rounded to about
          1 km; what the place could be found by is left out, in numbers, words and pictures.
        </Notice>
      )}
      {sheet.outOfUseSince === null && sheet.jobs.length > 0 ? (
        <Notice tone="info" title="In the rebolt queue">
          <Jobs jobs={sheet.jobs} />
        </Notice>
      ) : null}
    </div>
  );
}

function Jobs({ jobs }: { jobs: AnchorSheet["jobs"] }) {
  return (
    <ul>
      {jobs.map((job) => (
        <li key={job.id}>
          <Link href={`/queue/${job.id}`} className="inline-block py-1.5 text-link">
            {job.title}
          </Link>{" "}
          <span className="type-label text-muted">
            {job.state}, priority {Math.round(job.priority)}
          </span>
        </li>
      ))}
    </ul>
  );
}

/** "what reasons 1 and 2 say": the limits themselves stand there, with their numbers. */
function limitsOf({ findings }: AnchorSheet): string {
  const numbers = [...new Set(findings.filter(({ level }) => level === "limit").map(({ number }) => number))];
  if (numbers.length === 1) return `what reason ${numbers[0]} says`;
  return `what reasons ${formatList(numbers.map(String))} say`;
}

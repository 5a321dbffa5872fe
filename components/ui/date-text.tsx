import { formatInstant, formatPastDate, type PastDatePrecision } from "@/lib/shared/format";

/** A day in the past, as well as it is known: "4 May 2019", "May 2019", "2019", "before 2005". */
export function PastDate({
  on,
  precision = "day",
  unknown = "not known",
}: {
  on: string | null;
  precision?: PastDatePrecision;
  unknown?: string;
}) {
  if (on === null) return <span className="text-muted">{unknown}</span>;
  return (
    <time dateTime={precision === "year" || precision === "before" ? on.slice(0, 4) : on}>
      {formatPastDate(on, precision)}
    </time>
  );
}

/** A moment, told in the time zone of the place it belongs to. */
export function Moment({ at, timeZone }: { at: string; timeZone: string }) {
  return <time dateTime={at}>{formatInstant(at, timeZone)}</time>;
}

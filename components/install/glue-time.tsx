import { Notice } from "@/components/ui/notice";
import { usableFrom } from "@/lib/domain/bolt/usable-from";
import type { GlueChoice } from "@/components/install/install-types";

interface GlueTimeProps {
  glue: GlueChoice | null;
  glueTempC: string;
  rockTempC: string;
  /** UTC instant the glue went in. */
  setAt: string;
}

/** From when the bolt may be loaded, by the adhesive's step table and the colder temperature. */
export function GlueTime({ glue, glueTempC, rockTempC, setAt }: GlueTimeProps) {
  if (!glue) return null;
  const result = usableFrom({
    installedAt: setAt,
    table: glue.cureSteps,
    glueTempC: numberOf(glueTempC),
    rockTempC: numberOf(rockTempC),
  });
  if (!result.ok) {
    return (
      <Notice tone={glueTempC && rockTempC ? "stop" : "info"} role="status">
        {result.reason}
      </Notice>
    );
  }
  const when = new Date(result.usableFrom);
  return (
    <Notice
      tone="warn"
      role="status"
      title={`Out of use until ${when.toLocaleString([], { dateStyle: "medium", timeStyle: "short" })}`}
    >
      At {result.coldestC} °C: workable {result.row.workMin} min, cures in {result.row.cureMin} min. The
      maker&rsquo;s own sheet decides; ours says: {glue.sourceNote}
    </Notice>
  );
}

function numberOf(typed: string): number | null {
  const value = Number(typed.replace(",", ".").replace("−", "-"));
  return typed.trim() === "" || !Number.isFinite(value) ? null : value;
}

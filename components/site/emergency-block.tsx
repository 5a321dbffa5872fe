import { Fact, Facts } from "@/components/ui/facts";
import type { AreaView } from "@/lib/schemas/views/register";

/** What a rescuer needs. What nobody has written down is said, not left out. */
export function EmergencyBlock({ emergency }: { emergency: AreaView["emergency"] }) {
  const say = (value: string | null | undefined) =>
    value ?? <span className="text-muted">nobody has written it down yet</span>;
  return (
    <Facts>
      <Fact name="Emergency call">{say(emergency?.number)}</Fact>
      <Fact name="Meeting point">{say(emergency?.meetingPoint)}</Fact>
      <Fact name="With a stretcher">{say(emergency?.stretcherAccess)}</Fact>
      <Fact name="Signal">{say(emergency?.signal)}</Fact>
    </Facts>
  );
}

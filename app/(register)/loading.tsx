import { LoadingState } from "@/components/ui/state-panel";

/** Not at the root of the app: a page behind a loading state needs a script to be read, and the map must not. */
export default function Loading() {
  return <LoadingState title="Reading the register…" />;
}

"use client";

import { Button } from "@/components/ui/button";
import { ErrorState } from "@/components/ui/state-panel";

export default function ErrorPage({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <ErrorState
      headingLevel={1}
      title="Something broke on our side"
      actions={<Button onClick={reset}>Try again</Button>}
    >
      Nothing you stored is lost. {error.digest ? `Quote ${error.digest} when you report it.` : null}
    </ErrorState>
  );
}

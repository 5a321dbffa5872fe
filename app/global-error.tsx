"use client";

import { ErrorState } from "@/components/ui/state-panel";
import { Button } from "@/components/ui/button";
import "@/app/globals.css";

/** The last resort: even the frame around the pages failed. */
export default function GlobalError({ reset }: { error: Error; reset: () => void }) {
  return (
    <html lang="en">
      <body>
        <main>
          <ErrorState
            headingLevel={1}
            title="Byssus does not answer"
            actions={
              <Button tone="primary" onClick={reset}>
                Try again
              </Button>
            }
          >
            Nothing you sent before is lost. Until it works again, go by what you see on the rock.
          </ErrorState>
        </main>
      </body>
    </html>
  );
}

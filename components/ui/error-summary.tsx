"use client";

import { useEffect, useRef } from "react";

export interface FieldMessage {
  /** Id of the field it belongs to; empty for the form as a whole. */
  path: string;
  message: string;
}

/** Everything that is wrong, at the top, each a link to its field. Takes the focus when it appears. */
export function ErrorSummary({
  problems,
  title = "Not saved yet",
}: {
  problems: readonly FieldMessage[];
  title?: string;
}) {
  const box = useRef<HTMLDivElement>(null);
  const key = problems.map((problem) => `${problem.path}:${problem.message}`).join("|");
  useEffect(() => {
    if (key !== "") box.current?.focus();
  }, [key]);
  if (problems.length === 0) return null;
  return (
    <div
      ref={box}
      tabIndex={-1}
      role="alert"
      className="rounded-md border-2 border-stop-fill bg-stop-ground p-4 text-stop"
    >
      <h2 className="text-lg">{title}</h2>
      <ul className="mt-2 grid gap-1">
        {problems.map((problem) => (
          <li key={`${problem.path}:${problem.message}`}>
            {problem.path === "" ? (
              problem.message
            ) : (
              <a
                href={`#${problem.path}`}
                className="inline-flex touch items-center underline underline-offset-2"
                onClick={focusField}
              >
                {problem.message}
              </a>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** A jump alone moves the page, not the cursor. */
function focusField(event: React.MouseEvent<HTMLAnchorElement>) {
  const field = document.getElementById(event.currentTarget.hash.slice(1));
  if (!field) return;
  event.preventDefault();
  field.scrollIntoView({ block: "center" });
  const radio = field.matches("fieldset") ? field.querySelector("input") : null;
  (radio ?? field).focus({ preventScroll: true });
}

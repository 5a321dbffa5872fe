import type { ReactNode } from "react";

/** One part of the settings: a ruled line, a heading, a sentence, what can be changed. */
export function SettingsSection({
  title,
  intro,
  children,
}: {
  title: string;
  intro?: ReactNode;
  children: ReactNode;
}) {
  return (
    <section className="grid gap-5 border-t-2 border-frame pt-4">
      <div className="grid max-w-prose gap-1">
        <h2>{title}</h2>
        {intro ? <p className="text-muted">{intro}</p> : null}
      </div>
      {children}
    </section>
  );
}

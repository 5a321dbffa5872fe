import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

interface StateProps {
  title: ReactNode;
  children?: ReactNode;
  /** What can be done now: buttons or links. */
  actions?: ReactNode;
  className?: string;
  /** 1 when the state is the whole page. */
  headingLevel?: 1 | 2 | 3;
}

/** Nothing here yet: an empty hole, marked for drilling. */
export function EmptyState(props: StateProps) {
  return (
    <StatePanel
      {...props}
      drawing={
        <>
          <circle cx="36" cy="26" r="9" strokeDasharray="3.5 3" />
          <path d="M36 8v9M36 35v9M18 26h9M45 26h9" strokeWidth="1" />
        </>
      }
    />
  );
}

/** Something of ours failed: a rod broken in two. */
export function ErrorState(props: StateProps) {
  return (
    <StatePanel
      {...props}
      role="alert"
      drawing={
        <>
          <path d="M8 30h22l4-6-5-3 6-5" strokeWidth="3" />
          <path d="M64 22H42l-5 6 5 3-6 5" strokeWidth="3" />
        </>
      }
    />
  );
}

/** Not for this reader: a square with a bar through it. */
export function ForbiddenState(props: StateProps) {
  return (
    <StatePanel
      {...props}
      drawing={
        <>
          <rect x="21" y="11" width="30" height="30" />
          <path d="M13 26h46" strokeWidth="4" />
        </>
      }
    />
  );
}

function StatePanel({
  title,
  children,
  actions,
  className,
  headingLevel = 2,
  role,
  drawing,
}: StateProps & { role?: "alert"; drawing: ReactNode }) {
  const Heading = `h${headingLevel}` as const;
  return (
    <div role={role} className={cx("grid justify-items-center gap-3 px-4 py-10 text-center", className)}>
      <svg
        viewBox="0 0 72 52"
        aria-hidden="true"
        className="h-16 text-muted"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
      >
        {drawing}
      </svg>
      <Heading>{title}</Heading>
      {children ? <div className="max-w-prose text-muted">{children}</div> : null}
      {actions ? <div className="flex flex-wrap justify-center gap-2 pt-1">{actions}</div> : null}
    </div>
  );
}

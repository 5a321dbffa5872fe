import Link from "next/link";
import { CAUTION } from "@/lib/domain/finding/engine";

/** Last line of every page, on screen and on paper. */
export function SiteFooter() {
  return (
    <footer className="mt-12 border-t border-line pb-[calc(var(--nav-height)+1.5rem)] lg:pb-6 print:mt-4 print:pb-0">
      <div className="mx-auto flex max-w-[96rem] flex-wrap items-baseline justify-between gap-x-8 gap-y-2 px-3 pt-4 text-sm text-muted sm:px-6 print:px-0">
        <p className="max-w-[80ch]">{CAUTION}</p>
        <ul className="no-print flex gap-x-5">
          <li>
            <Link href="/caution" className="inline-block py-2.5 text-link">
              What a verdict means
            </Link>
          </li>
          <li>
            <Link href="/api-docs" className="inline-block py-2.5 text-link">
              API
            </Link>
          </li>
        </ul>
      </div>
    </footer>
  );
}

import Link from "next/link";
import type { ReactNode } from "react";
import { Breadcrumbs, type Crumb } from "../ui/Breadcrumbs";
import { Logo } from "../ui/Logo";

export type AppHeaderProps = {
  /** Where the logo leads: the landing page, or the projects for somebody signed in. */
  home: string;
  crumbs?: readonly Crumb[];
  /** Who is here now, what waits to be sent; quiet, before the buttons. */
  status?: ReactNode;
  search?: ReactNode;
  theme?: ReactNode;
  account?: ReactNode;
  /** The places of a project, directly under the header's line. */
  nav?: ReactNode;
};

export function AppHeader({ home, crumbs = [], status, search, theme, account, nav }: AppHeaderProps) {
  return (
    <header data-chrome className="border-b border-rule bg-sheet">
      <a
        href="#content"
        className="absolute left-3 top-2 z-50 -translate-y-20 rounded bg-ink px-3 py-2 text-paper focus:translate-y-0"
      >
        Skip to the content
      </a>
      <div className="mx-auto flex min-h-14 max-w-sheet items-center gap-3 px-3 sm:gap-5 sm:px-6">
        <Link href={home} className="flex min-h-10 items-center gap-2.5 rounded" aria-label="Boardwake, home">
          <Logo />
          <span
            className={crumbs.length > 0 ? "font-head text-lg font-bold max-sm:hidden" : "font-head text-lg font-bold"}
          >
            Boardwake
          </span>
        </Link>
        {crumbs.length > 0 && <Breadcrumbs crumbs={crumbs} className="min-w-0 flex-1" />}
        <div className="ml-auto flex shrink-0 items-center gap-0.5 sm:gap-2">
          {status && <div className="mr-2 text-sm text-ink-soft max-md:hidden">{status}</div>}
          {search}
          {theme}
          {account}
        </div>
      </div>
      {nav && <div className="mx-auto max-w-sheet px-3 sm:px-6">{nav}</div>}
    </header>
  );
}

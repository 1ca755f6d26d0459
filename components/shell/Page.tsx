import clsx from "clsx";
import type { ReactNode } from "react";

export type PageProps = {
  title: ReactNode;
  /** One or two sentences under the title: what stands here and how it stands. */
  lede?: ReactNode;
  actions?: ReactNode;
  /** A second column on a desktop, after the content on a phone. */
  aside?: ReactNode;
  width?: "sheet" | "prose";
  className?: string;
  children: ReactNode;
};

/** The one frame of every page: title, lede, actions, content. Leaves room for the bar on a phone. */
export function Page({ title, lede, actions, aside, width = "sheet", className, children }: PageProps) {
  return (
    <main
      id="content"
      tabIndex={-1}
      className={clsx(
        "mx-auto px-4 pb-28 pt-6 sm:px-6 sm:pb-16 sm:pt-7 print:p-0",
        width === "sheet" ? "max-w-sheet" : "max-w-3xl",
        className,
      )}
    >
      <header className="mb-5 flex flex-wrap items-end justify-between gap-x-8 gap-y-3.5">
        <div className="min-w-0 max-w-prose">
          <h1 className="text-2xl sm:text-3xl">{title}</h1>
          {lede && <p className="mt-1.5 text-pretty text-ink-soft">{lede}</p>}
        </div>
        {actions && <div className="flex flex-wrap gap-2 print:hidden">{actions}</div>}
      </header>
      {aside ? (
        <div className="grid grid-cols-1 items-start gap-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
          <div className="flex min-w-0 flex-col gap-5">{children}</div>
          <aside className="flex min-w-0 flex-col gap-4">{aside}</aside>
        </div>
      ) : (
        children
      )}
    </main>
  );
}

import type { ReactNode } from "react";
import { Panel } from "@/components/ui/Panel";

type Props = { title: string; lede?: ReactNode; foot?: ReactNode; children: ReactNode };

/** The one sheet of a page before one is signed in: a title, what it is for, one thing to do. */
export function AccountSheet({ title, lede, foot, children }: Props) {
  return (
    <main id="content" tabIndex={-1} className="mx-auto w-full max-w-lg px-4 pb-16 pt-8 outline-none sm:px-6 sm:pt-14">
      <h1 className="text-2xl sm:text-3xl">{title}</h1>
      {lede && <p className="mt-1.5 max-w-prose text-pretty text-ink-soft">{lede}</p>}
      <Panel className="mt-5">{children}</Panel>
      {foot && <div className="mt-4 flex flex-col gap-1.5 px-1 text-[0.9375rem] text-ink-soft">{foot}</div>}
    </main>
  );
}

import type { ReactNode } from "react";
import { SettingsTabs } from "./SettingsTabs";

type Props = { title: string; lede: string; actions?: ReactNode; children: ReactNode };

/** The frame of a person's own settings: the tabs stand above the title, so that they stay where they are. */
export function SettingsPage({ title, lede, actions, children }: Props) {
  return (
    <main id="content" tabIndex={-1} className="mx-auto max-w-sheet px-4 pb-20 pt-3 outline-none sm:px-6">
      <SettingsTabs />
      <header className="mb-5 mt-6 flex max-w-3xl flex-wrap items-end justify-between gap-x-8 gap-y-3.5">
        <div className="min-w-0 max-w-prose">
          <h1 className="text-2xl sm:text-3xl">{title}</h1>
          <p className="mt-1.5 text-pretty text-ink-soft">{lede}</p>
        </div>
        {actions}
      </header>
      <div className="flex max-w-3xl flex-col gap-5">{children}</div>
    </main>
  );
}

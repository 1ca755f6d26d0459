import Link from "next/link";
import type { ReactNode } from "react";
import { StateGlyph, type GlyphState } from "../ui/glyphs/StateGlyph";
import { Logo } from "../ui/Logo";

export type StandAloneProps = {
  state?: GlyphState;
  /** A small figure over the title, e.g. the status. */
  code?: string;
  title: string;
  home?: string;
  children: ReactNode;
};

/** One sheet alone on the bench: error pages, sign-in and its relatives. */
export function StandAlone({ state, code, title, home = "/", children }: StandAloneProps) {
  return (
    <main id="content" className="mx-auto flex min-h-dvh w-full max-w-lg flex-col justify-center px-4 py-8">
      <Link
        href={home}
        className="mb-5 flex min-h-10 items-center gap-2.5 self-start rounded"
        aria-label="Boardwake, home"
      >
        <Logo />
        <span className="font-head text-lg font-bold">Boardwake</span>
      </Link>
      <div className="rounded-lg border border-rule bg-sheet px-5 py-6 sm:px-8 sm:py-8">
        {(state || code) && (
          <p className="mb-3 flex items-center gap-3">
            {state && <StateGlyph state={state} size={28} />}
            {code && <span className="mono text-sm text-ink-soft">{code}</span>}
          </p>
        )}
        <h1 className="mb-3 text-2xl">{title}</h1>
        {children}
      </div>
    </main>
  );
}

import type { ReactNode } from "react";
import Link from "next/link";
import { Providers } from "../Providers";
import { WorkshopHeader } from "../(workshop)/WorkshopHeader";

export default function PublicLayout({ children }: { children: ReactNode }) {
  return (
    <Providers>
      <WorkshopHeader />
      {children}
      <footer className="border-t border-rule">
        <p className="mx-auto flex max-w-sheet flex-wrap gap-x-6 gap-y-1 px-4 py-5 text-sm text-ink-soft sm:px-6">
          <span>Boardwake, free software under the Apache License 2.0.</span>
          <Link href="/safety" className="link">
            Safety notes
          </Link>
        </p>
      </footer>
    </Providers>
  );
}

"use client";

import { faces } from "./fonts";
import "./globals.css";
import { errorNumber } from "@/components/shell/error-number";

/** The root layout itself failed: nothing of it is here, so it follows the system's colours and needs no provider. */
export default function GlobalError({ error, retry }: { error: unknown; retry: () => void }) {
  const number = errorNumber(error);
  return (
    <html lang="en-GB" data-theme="system" className={faces}>
      <body>
        <title>Out of order · Boardwake</title>
        <main className="mx-auto flex min-h-dvh max-w-lg flex-col justify-center px-4">
          <div className="rounded-lg border border-rule bg-sheet px-5 py-6 sm:px-8 sm:py-8">
            <h1 className="mb-3 text-2xl">Boardwake did not come up</h1>
            <p>Something went wrong on our side. What was recorded before is kept.</p>
            {number && (
              <p className="mt-2 text-sm text-ink-soft">
                Tell whoever runs this server the number <span className="mono">{number}</span>.
              </p>
            )}
            <button
              type="button"
              onClick={() => retry()}
              className="mt-5 min-h-10 rounded-md bg-copper px-4 font-semibold text-on-copper hover:bg-copper-deep"
            >
              Try again
            </button>
          </div>
        </main>
      </body>
    </html>
  );
}

"use client";

import Link from "next/link";
import { useEffect, useState } from "react";
import { reach } from "@/components/ui/form/reply";
import { Panel } from "@/components/ui/Panel";
import type { SimilarFault } from "@/lib/fault/find-similar";
import type { FaultActs } from "./fault-acts";
import { FaultStateMark } from "./FaultStateMark";

type Props = {
  project: string;
  except: number | null;
  words: string;
  signals: readonly string[];
  pins: readonly string[];
  find: FaultActs["similar"];
};

const PAUSE_MS = 500;
const WORDS = 2000;

/** Earlier faults like the one being written, looked for when the typing pauses. */
export function SimilarFaults({ project, except, words, signals, pins, find }: Props) {
  const [found, setFound] = useState<SimilarFault[]>();
  const line = words.replace(/\s+/g, " ").trim().slice(0, WORDS);
  const key = JSON.stringify({ except, words: line, signals, pins });

  useEffect(() => {
    let isGone = false;
    const timer = setTimeout(async () => {
      const asked: { except: number | null; words: string; signals: string[]; pins: string[] } = JSON.parse(key);
      const reply = await reach(() => find({ project, ...asked }));
      if (!isGone && reply.ok) setFound(reply.value);
    }, PAUSE_MS);
    return () => {
      isGone = true;
      clearTimeout(timer);
    };
  }, [project, key, find]);

  return (
    <Panel title="Seen before?">
      <div aria-live="polite">
        {found === undefined || found.length === 0 ? (
          <p className="text-ink-soft text-sm">
            {line === "" && signals.length + pins.length === 0
              ? "Earlier faults with the same signals or words stand here as you write."
              : found === undefined
                ? "Looking …"
                : "No earlier fault of this project is like it."}
          </p>
        ) : (
          <ul className="grid gap-3">
            {found.map((one) => (
              <li key={one.number} className="text-sm">
                <p className="flex flex-wrap items-baseline gap-x-2 gap-y-0.5">
                  <Link
                    href={`/projects/${project}/faults/${one.number}`}
                    target="_blank"
                    prefetch={false}
                    className="link font-semibold"
                  >
                    F{one.number} {one.title}
                  </Link>
                  <FaultStateMark state={one.state} />
                </p>
                <p className="text-ink-soft">
                  <span className="mono text-xs">{one.serial}</span>
                  {one.shared.length > 0 && (
                    <>
                      , shares <span className="mono text-xs">{one.shared.join(", ")}</span>
                    </>
                  )}
                </p>
                {one.says && <p className="mt-0.5 line-clamp-3">{one.says}</p>}
              </li>
            ))}
          </ul>
        )}
      </div>
    </Panel>
  );
}

"use client";

import { useEffect, useState } from "react";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { Notice } from "@/components/ui/Notice";
import { TextField } from "@/components/ui/TextField";
import { searchAnswer, type SearchHit } from "@/lib/search/schema";

type Props = {
  project: string;
  not: string;
  onPick: (checkId: string) => Promise<string | undefined>;
  onDone: () => void;
};

const QUIET_MS = 200;

/** A check of any unit of the project, found by words of its title or its unit's serial. */
export function PickCheck({ project, not, onPick, onDone }: Props) {
  const [words, setWords] = useState("");
  const [hits, setHits] = useState<SearchHit[]>();
  const [refused, setRefused] = useState<string>();

  useEffect(() => {
    if (words.trim() === "") return;
    const stop = new AbortController();
    const timer = setTimeout(async () => {
      try {
        const address = `/api/projects/${encodeURIComponent(project)}/search?q=${encodeURIComponent(words)}`;
        const response = await fetch(address, { signal: stop.signal });
        const answer = searchAnswer.safeParse(await response.json());
        setHits(answer.success ? answer.data.hits.filter((hit) => hit.kind === "check" && checkIdOf(hit) !== not) : []);
      } catch {
        // A newer search took over, or the network is away; what was found stays.
      }
    }, QUIET_MS);
    return () => {
      clearTimeout(timer);
      stop.abort();
    };
  }, [words, project, not]);

  async function pick(hit: SearchHit) {
    const sentence = await onPick(checkIdOf(hit));
    if (sentence) setRefused(sentence);
    else onDone();
  }

  return (
    <div className="grid gap-3">
      <TextField label="Words of its title, or a unit" value={words} onChange={setWords} autoFocus autoComplete="off" />
      {refused && <Notice kind="failed">{refused}</Notice>}
      <ul aria-live="polite">
        {hits?.length === 0 && <li className="text-ink-soft text-sm">No check has these words.</li>}
        {hits?.map((hit) => (
          <li key={hit.id}>
            <button
              type="button"
              onClick={() => void pick(hit)}
              className="hover:bg-copper-ground flex min-h-12 w-full items-center gap-3 rounded px-2 text-left"
            >
              {hit.state && <StateGlyph state={hit.state} label={hit.state} size={12} />}
              <span className="min-w-0">
                {hit.title}
                <span className="text-ink-soft block text-sm">{hit.detail}</span>
              </span>
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** The check's id stands in the address of the hit. */
function checkIdOf(hit: SearchHit): string {
  return new URLSearchParams(hit.href.split("?")[1] ?? "").get("check") ?? hit.id;
}

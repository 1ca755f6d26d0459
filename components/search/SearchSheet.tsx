"use client";

import clsx from "clsx";
import Link from "next/link";
import { useRouter } from "next/navigation";
import { useState, type KeyboardEvent } from "react";
import { Dialog, Modal, ModalOverlay } from "react-aria-components";
import { Kbd } from "@/components/ui/Kbd";
import { SearchField } from "@/components/ui/SearchField";
import { groupHits, HitLine } from "./HitList";
import { useSearch } from "./use-search";

type Props = { project: string; isOpen: boolean; onOpenChange: (isOpen: boolean) => void };

/** A sheet pulled down from the top edge: one line to type in, results by kind under it. Arrows choose, Enter goes. */
export function SearchSheet({ project, isOpen, onOpenChange }: Props) {
  const router = useRouter();
  const [typed, setTyped] = useState("");
  const [chosen, setChosen] = useState(0);
  const { data, isError, isFetching } = useSearch(project, typed);
  const hits = typed.trim() === "" ? [] : (data?.hits ?? []);
  const groups = groupHits(hits);
  const inOrder = groups.flatMap((group) => group.hits);
  const current = Math.min(chosen, Math.max(inOrder.length - 1, 0));
  const everything = `/projects/${project}/search?q=${encodeURIComponent(typed.trim())}`;

  function go(href: string) {
    onOpenChange(false);
    router.push(href);
  }

  function onKeyDown(event: KeyboardEvent) {
    const step = event.key === "ArrowDown" ? 1 : event.key === "ArrowUp" ? -1 : 0;
    if (step === 0 || inOrder.length === 0) return;
    event.preventDefault();
    const next = (current + step + inOrder.length) % inOrder.length;
    setChosen(next);
    document.getElementById(`hit-${next}`)?.scrollIntoView({ block: "nearest" });
  }

  return (
    <ModalOverlay
      isOpen={isOpen}
      onOpenChange={onOpenChange}
      isDismissable
      className="fixed inset-0 z-40 flex items-start justify-center bg-scrim"
    >
      <Modal className="motion-appear flex max-h-[min(44rem,100dvh)] w-full max-w-3xl flex-col bg-sheet shadow-float [--from-y:-12px] sm:rounded-b-lg">
        <Dialog aria-label="Search the project" className="flex min-h-0 flex-col outline-none">
          <div className="border-b border-rule px-4 pb-3 pt-4 sm:px-5" onKeyDown={onKeyDown}>
            <SearchField
              label="Boards, units, checks, signals, log"
              value={typed}
              onChange={(text) => {
                setTyped(text);
                setChosen(0);
              }}
              onSubmit={() => go(inOrder[current]?.href ?? everything)}
              autoFocus
            />
          </div>
          <div className="min-h-0 flex-1 overflow-y-auto px-4 py-3 sm:px-5" aria-busy={isFetching}>
            <p role="status" className="sr-only">
              {typed.trim() === "" || isFetching ? "" : `${inOrder.length} found. ${inOrder[current]?.title ?? ""}`}
            </p>
            {isError && <p className="text-failed">The search does not answer just now. Try again in a moment.</p>}
            {typed.trim() === "" && <Hints />}
            {typed.trim() !== "" && !isError && data && inOrder.length === 0 && (
              <p className="py-2 text-ink-soft">Nothing in this project matches “{typed.trim()}”.</p>
            )}
            {groups.map((group) => (
              <section key={group.kind} aria-label={group.heading} className="mb-3 last:mb-0">
                <h2 className="mb-1 font-text text-xs font-semibold tracking-normal text-ink-soft">{group.heading}</h2>
                <ul className="-mx-2 flex flex-col">
                  {group.hits.map((hit) => {
                    const index = inOrder.indexOf(hit);
                    return (
                      <li key={`${hit.kind} ${hit.id}`}>
                        <Link
                          id={`hit-${index}`}
                          href={hit.href}
                          onClick={() => onOpenChange(false)}
                          onMouseMove={() => setChosen(index)}
                          className={clsx(
                            "block rounded-md border-l-2 px-2 py-1.5 no-underline",
                            index === current ? "border-l-copper bg-copper-ground" : "border-l-transparent",
                          )}
                        >
                          <HitLine hit={hit} />
                        </Link>
                      </li>
                    );
                  })}
                </ul>
              </section>
            ))}
            {data?.cut && inOrder.length > 0 && (
              <Link href={everything} onClick={() => onOpenChange(false)} className="link text-sm">
                Everything that matches
              </Link>
            )}
          </div>
        </Dialog>
      </Modal>
    </ModalOverlay>
  );
}

function Hints() {
  return (
    <div className="flex flex-col gap-2 py-1 text-[0.9375rem] text-ink-soft">
      <p>
        A serial, a board, a word of a check, a signal or a pin such as <span className="mono text-sm">J1 a4</span>, a
        word of the log.
      </p>
      <p className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm max-sm:hidden">
        <span className="flex items-center gap-1.5">
          <Kbd>↑</Kbd>
          <Kbd>↓</Kbd> choose
        </span>
        <span className="flex items-center gap-1.5">
          <Kbd>Enter</Kbd> go there
        </span>
        <span className="flex items-center gap-1.5">
          <Kbd>Esc</Kbd> close
        </span>
      </p>
    </div>
  );
}

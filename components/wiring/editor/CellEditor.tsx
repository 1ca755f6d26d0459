"use client";

import clsx from "clsx";
import { useEffect, useId, useRef, useState, type KeyboardEvent } from "react";
import type { PinColumn } from "@/lib/pin-map/pin-columns";
import { isChosenFrom, suggestFor, type Words } from "../grid/suggest";
import type { Editing, Leaving } from "./use-pin-grid";

type Props = {
  /** "a10, Role" */
  label: string;
  column: PinColumn;
  editing: Editing;
  words: Words;
  /** Where the list of suggestions has room. */
  opens: "down" | "up";
  describedBy: string | undefined;
  onCommit: (text: string, leaving: Leaving, isForAll?: boolean) => boolean;
  onKeep: (text: string) => void;
  onCancel: () => void;
};

/** The field in a cell, with what could be meant below it. */
export function CellEditor({ label, column, editing, words, opens, describedBy, onCommit, onKeep, onCancel }: Props) {
  const id = useId();
  const [text, setText] = useState(editing.text);
  const [hasTyped, setTyped] = useState(editing.isFresh);
  const suggestions = hasTyped || isChosenFrom(column) ? suggestFor(column, hasTyped ? text : "", words) : [];
  const [chosen, setChosen] = useState<number>();
  const first = isChosenFrom(column) && hasTyped && text.trim() !== "" ? 0 : undefined;
  const marked = chosen ?? first;
  const field = useRef<HTMLInputElement>(null);
  const isDone = useRef(false);

  useEffect(() => {
    field.current?.focus({ preventScroll: true });
    const end = field.current?.value.length ?? 0;
    field.current?.setSelectionRange(end, end);
  }, []);

  // A page that goes away in the middle of a word keeps the word.
  const keep = useRef(() => undefined as void);
  useEffect(() => {
    keep.current = () => onKeep(text);
  });
  useEffect(() => {
    const keepIt = () => keep.current();
    window.addEventListener("pagehide", keepIt);
    return () => window.removeEventListener("pagehide", keepIt);
  }, []);

  function commit(leaving: Leaving, isForAll = false) {
    const taken = marked === undefined ? undefined : suggestions[marked];
    isDone.current = onCommit(taken ?? text, leaving, isForAll);
  }

  function onKeyDown(event: KeyboardEvent) {
    if (event.nativeEvent.isComposing) return;
    const { key } = event;
    const isControl = event.ctrlKey || event.metaKey;
    const hasList = suggestions.length > 0;
    const walks = hasList && (key === "ArrowDown" || key === "ArrowUp");
    const leaving = walks ? undefined : leavingBy(key, event.shiftKey, editing.isFresh);
    event.stopPropagation();
    if (key === "Escape") {
      isDone.current = true;
      event.preventDefault();
      onCancel();
    } else if (walks) {
      event.preventDefault();
      const step = key === "ArrowDown" ? 1 : -1;
      const from = marked ?? (step > 0 ? -1 : 0);
      setChosen((from + step + suggestions.length) % suggestions.length);
    } else if (leaving && !(isControl && key !== "Enter")) {
      event.preventDefault();
      commit(isControl ? "stay" : leaving, isControl);
    }
  }

  return (
    <>
      <input
        ref={field}
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          setTyped(true);
          setChosen(undefined);
        }}
        onKeyDown={onKeyDown}
        onBlur={() => {
          if (!isDone.current) onKeep(text);
        }}
        aria-label={label}
        aria-describedby={describedBy}
        role="combobox"
        aria-autocomplete="list"
        aria-expanded={suggestions.length > 0}
        aria-controls={suggestions.length > 0 ? id : undefined}
        aria-activedescendant={marked !== undefined && suggestions.length > 0 ? `${id}-${marked}` : undefined}
        autoComplete="off"
        autoCapitalize="off"
        spellCheck={false}
        className={clsx(
          "absolute inset-0 z-10 w-full min-w-0 bg-raised px-2 text-sm text-ink outline-2 -outline-offset-2 outline-copper",
          column === "note" || column === "role" ? "" : "mono",
        )}
      />
      {suggestions.length > 0 && (
        <ul
          id={id}
          role="listbox"
          aria-label={`Suggestions for ${label}`}
          className={clsx(
            "absolute left-0 z-30 min-w-full rounded-md bg-raised p-1 shadow-float",
            opens === "down" ? "top-full mt-0.5" : "bottom-full mb-0.5",
          )}
        >
          {suggestions.map((word, index) => (
            <li
              key={word}
              id={`${id}-${index}`}
              role="option"
              aria-selected={index === marked}
              // The field keeps the focus: a press on a suggestion must not count as leaving it.
              onPointerDown={(event) => {
                event.preventDefault();
                isDone.current = onCommit(word, "stay");
              }}
              className={clsx(
                "cursor-pointer whitespace-nowrap rounded px-2 py-1 text-sm",
                column === "role" ? "" : "mono",
                index === marked && "bg-copper-ground font-semibold",
              )}
            >
              {word}
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

/** How a key leaves the cell; the arrows only while one writes it anew, otherwise they move in the text. */
function leavingBy(key: string, isShift: boolean, isFresh: boolean): Leaving | undefined {
  if (key === "Enter") return isShift ? "up" : "down";
  if (key === "Tab") return isShift ? "previous" : "next";
  if (!isFresh) return undefined;
  const arrows: Record<string, Leaving> = { ArrowDown: "down", ArrowUp: "up", ArrowLeft: "left", ArrowRight: "right" };
  return Object.hasOwn(arrows, key) ? arrows[key] : undefined;
}

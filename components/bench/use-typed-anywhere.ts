import { useEffect, useRef, type RefObject } from "react";
import { startsReading } from "./starts-reading";

/** A figure typed anywhere on the page goes on in the field, which gets the focus. Answers the field's ref. */
export function useTypedAnywhere(typed: string, onTyped: (typed: string) => void): RefObject<HTMLInputElement | null> {
  const field = useRef<HTMLInputElement>(null);
  const latest = useRef({ typed, onTyped });
  useEffect(() => {
    latest.current = { typed, onTyped };
  });
  useEffect(
    () =>
      startsReading((character) => {
        if (!field.current || field.current.disabled) return;
        latest.current.onTyped(`${latest.current.typed}${character}`);
        field.current.focus();
      }),
    [],
  );
  return field;
}

"use client";

import { useCallback, useEffect, useRef } from "react";

/** The same function for as long as the part lives, which calls the newest one: what it is given to need not be drawn anew. */
export function useSteady<Args extends unknown[], Value>(act: (...args: Args) => Value): (...args: Args) => Value {
  const newest = useRef(act);
  useEffect(() => {
    newest.current = act;
  });
  return useCallback((...args: Args) => newest.current(...args), []);
}

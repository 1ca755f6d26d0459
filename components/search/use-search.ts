"use client";

import { keepPreviousData, useQuery } from "@tanstack/react-query";
import { useDeferredValue } from "react";
import { searchAnswer, type SearchAnswer } from "@/lib/search/schema";

/** Asks while one types; keeps the last results until the next arrive. */
export function useSearch(project: string, typed: string) {
  const q = useDeferredValue(typed.trim());
  return useQuery({
    queryKey: ["search", project, q],
    enabled: q.length > 0,
    placeholderData: keepPreviousData,
    queryFn: async ({ signal }): Promise<SearchAnswer> => {
      const response = await fetch(`/api/projects/${project}/search?q=${encodeURIComponent(q)}`, { signal });
      if (!response.ok) throw new Error(`the search answered ${response.status}`);
      return searchAnswer.parse(await response.json());
    },
  });
}

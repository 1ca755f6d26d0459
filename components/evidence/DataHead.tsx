"use client";

import { useQuery } from "@tanstack/react-query";
import clsx from "clsx";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { fileAddress } from "./file-address";
import { readDataHead } from "./read-data-head";

type Props = {
  project: string;
  evidence: EvidenceView;
  /** "stamp" is a still picture of the text, for inside a button; "sheet" can be scrolled and read out. */
  form?: "sheet" | "stamp";
  className?: string;
};

/** The first lines of a data file, as they stand in it. Only those bytes are fetched. */
export function DataHead({ project, evidence, form = "sheet", className }: Props) {
  const { data, isPending, isError } = useQuery({
    queryKey: ["data-head", project, evidence.id],
    queryFn: ({ signal }) => readDataHead(fileAddress(project, evidence.id), evidence.bytes, signal),
    staleTime: Infinity,
  });
  const text = isPending ? "Reading the first lines…" : isError ? "The first lines could not be read just now." : data;
  if (form === "stamp") {
    return (
      <span
        aria-hidden="true"
        className={clsx("mono block overflow-hidden whitespace-pre p-3 text-left text-2xs text-ink-soft", className)}
      >
        {text}
      </span>
    );
  }
  return (
    <pre
      tabIndex={0}
      aria-label={`First lines of ${evidence.fileName}`}
      aria-busy={isPending}
      className={clsx(
        "mono max-h-80 overflow-auto rounded border border-rule bg-raised p-3 text-xs leading-5",
        isPending && "motion-wait text-ink-soft",
        className,
      )}
    >
      {text}
    </pre>
  );
}

"use client";

import { IconButton } from "./IconButton";

export type PaginationProps = { page: number; pages: number; onPage: (page: number) => void; note?: string };

export function Pagination({ page, pages, onPage, note }: PaginationProps) {
  return (
    <nav aria-label="Pages" className="flex items-center justify-end gap-1 text-sm text-ink-soft print:hidden">
      {note && <span className="mr-auto">{note}</span>}
      <IconButton
        icon="chevron-left"
        label="Previous page"
        size="sm"
        isDisabled={page <= 1}
        onPress={() => onPage(page - 1)}
      />
      <span aria-live="polite" className="mono min-w-20 text-center text-xs">
        {page} of {pages}
      </span>
      <IconButton
        icon="chevron-right"
        label="Next page"
        size="sm"
        isDisabled={page >= pages}
        onPress={() => onPage(page + 1)}
      />
    </nav>
  );
}

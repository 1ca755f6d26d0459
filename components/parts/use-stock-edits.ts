"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { z } from "zod";
import { reach, type Refused } from "@/components/ui/form/reply";
import type { OrderLine } from "@/lib/parts-list/load-parts-list";
import type { StockAct } from "./parts-acts";

export type StockField = "stock" | "price";
type Known = { stock: string; price: string; version: number };
type Edit = { typed: Partial<Record<StockField, string>>; own?: Known; error?: string; isPending?: boolean };

const current = z.object({ stock: z.number(), price: z.string(), version: z.int() });

/** What is typed into the cells of stock and price, row by row; each row is saved alone. */
export function useStockEdits(project: string, save: StockAct) {
  const router = useRouter();
  const [edits, setEdits] = useState<Record<string, Edit>>({});
  const pending = useRef(new Set<string>());
  const change = (part: string, next: Partial<Edit>) =>
    setEdits((before) => ({ ...before, [part]: { ...(before[part] ?? { typed: {} }), ...next } }));

  /** What is kept: the page's, or what was saved from here since, whichever is newer. */
  function known(line: OrderLine): Known {
    const own = edits[line.part]?.own;
    if (own && own.version > line.version) return own;
    return { stock: String(line.stock), price: line.priceTyped, version: line.version };
  }

  const value = (line: OrderLine, field: StockField) => edits[line.part]?.typed[field] ?? known(line)[field];
  const type = (line: OrderLine, field: StockField, text: string) =>
    change(line.part, { typed: { ...edits[line.part]?.typed, [field]: text } });

  function revert(line: OrderLine) {
    setEdits((before) => ({ ...before, [line.part]: { ...before[line.part], typed: {}, error: undefined } as Edit }));
  }

  async function commit(line: OrderLine) {
    const { part } = line;
    const before = known(line);
    const typed = { stock: value(line, "stock"), price: value(line, "price") };
    if (typed.stock === before.stock && typed.price === before.price) return revert(line);
    if (pending.current.has(part)) return;
    pending.current.add(part);
    change(part, { isPending: true });
    const asked = { project, writeId: crypto.randomUUID(), number: part, version: before.version, ...typed };
    const reply = await reach(() => save(asked)).finally(() => pending.current.delete(part));
    if (reply.ok) {
      const { stock, price, version } = reply.value;
      setEdits((all) => ({ ...all, [part]: { typed: {}, own: { stock: String(stock), price, version } } }));
      router.refresh();
      return;
    }
    const theirs = reply.error.code === "conflict" ? current.safeParse(detailsOf(reply.error)).data : undefined;
    const own = theirs ? { ...theirs, stock: String(theirs.stock) } : undefined;
    change(part, { isPending: false, error: sentenceOf(reply.error), ...(own ? { own } : {}) });
  }

  return {
    value,
    type,
    revert,
    commit,
    errorOf: (line: OrderLine) => edits[line.part]?.error,
    isPending: (line: OrderLine) => edits[line.part]?.isPending ?? false,
  };
}

export type StockEdits = ReturnType<typeof useStockEdits>;

const detailsOf = (error: Refused & { details?: Record<string, unknown> }) => error.details?.current;

const sentenceOf = ({ message, fields }: Refused) => Object.values(fields ?? {})[0] ?? message;

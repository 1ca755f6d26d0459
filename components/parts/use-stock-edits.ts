"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { z } from "zod";
import { reach, type Refused } from "@/components/ui/form/reply";
import type { OrderLine } from "@/lib/parts-list/load-parts-list";
import type { StockAct } from "./parts-acts";

export type StockField = "stock" | "price";
type Known = { stock: string; price: string; version: number };
type Typed = Partial<Record<StockField, string>>;
/** What was refused, and in which cell; undefined: in both. */
type Failure = { text: string; field: StockField | undefined };
type Edit = { typed: Typed; own?: Known; failure?: Failure | undefined; isPending?: boolean };

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
    change(line.part, { typed: {}, failure: undefined });
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
      const own = { stock: String(stock), price, version };
      setEdits((all) => ({ ...all, [part]: { typed: typedSince(all[part]?.typed ?? {}, typed), own } }));
      router.refresh();
      return;
    }
    const theirs = reply.error.code === "conflict" ? current.safeParse(detailsOf(reply.error)).data : undefined;
    const own = theirs ? { ...theirs, stock: String(theirs.stock) } : undefined;
    change(part, { isPending: false, failure: failureOf(reply.error), ...(own ? { own } : {}) });
  }

  return {
    value,
    type,
    revert,
    commit,
    failureOf: (line: OrderLine) => edits[line.part]?.failure,
    isPending: (line: OrderLine) => edits[line.part]?.isPending ?? false,
  };
}

export type StockEdits = ReturnType<typeof useStockEdits>;

const detailsOf = (error: Refused & { details?: Record<string, unknown> }) => error.details?.current;

function failureOf({ message, fields = {} }: Refused): Failure {
  if (fields.stock) return { text: fields.stock, field: "stock" };
  if (fields.price) return { text: fields.price, field: "price" };
  return { text: message, field: undefined };
}

/** What was typed on while the row was being saved stays. */
function typedSince(now: Typed, sent: Record<StockField, string>): Typed {
  return Object.fromEntries(
    Object.entries(now).filter(([field, text]) => text !== sent[field === "stock" ? "stock" : "price"]),
  );
}

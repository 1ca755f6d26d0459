import { eq } from "drizzle-orm";
import { findConditions } from "@/db/queries/machine";
import { lockPart } from "@/db/queries/parts";
import { parts } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { money, priceText } from "./price";
import type { StockPartInput } from "./schema";

type Stocked = { stock: number; price: string; version: number };

/** Writes down what is in the drawer and what one costs, for any number on the parts list; the row is made when needed. */
export async function stockPart(scope: ProjectScope, input: StockPartInput): Promise<Answer<Stocked>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "stock-part" }, async (tx) => {
    const { number, stock, price } = input;
    const current = await lockPart(tx, scope, { number });
    if ((current?.version ?? 0) !== input.version) rejectStale(current);
    const version = input.version + 1;
    const values = { stock, priceCents: price };
    if (current) {
      await tx
        .update(parts)
        .set({ ...values, version })
        .where(eq(parts.id, current.id));
    } else {
      const made = await tx
        .insert(parts)
        .values({ projectId, number, ...values })
        .onConflictDoNothing()
        .returning({ id: parts.id });
      if (made.length === 0) rejectStale(await lockPart(tx, scope, { number }));
    }
    const { currency } = await findConditions(tx, scope);
    const written = price === null ? "" : money(price, currency);
    await recordEvent(tx, { projectId, actorId: viewer.userId }, "part.stocked", { number, stock, price: written });
    return { stock, price: priceText(price), version };
  });
}

function rejectStale(current: Awaited<ReturnType<typeof lockPart>>): never {
  const { stock, priceCents, version } = current ?? { stock: 0, priceCents: null, version: 0 };
  const words = priceCents === null ? "no price" : `a price of ${priceText(priceCents)}`;
  return reject(
    "conflict",
    `Somebody wrote down ${stock} and ${words} meanwhile. Press Enter again to put yours there.`,
    {
      details: { current: { stock, price: priceText(priceCents), version } },
    },
  );
}

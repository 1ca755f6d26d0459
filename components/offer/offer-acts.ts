import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import type { OfferTaken, offerToCheckInput } from "@/lib/offer/schema";

export type OfferInput = z.input<typeof offerToCheckInput>;
export type OfferAct = (input: OfferInput) => Promise<Reply<OfferTaken>>;

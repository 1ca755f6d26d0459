import type { Refusal } from "@/lib/actions/answer";

/** Why a link of the account does not work, and what to do. Shared by the pages and the use cases behind them. */
export const LINK_REFUSALS: Record<"unknown" | "used" | "expired", Refusal> = {
  unknown: {
    code: "not-found",
    message: "This link is not complete or was never sent by us. Open it from the mail once more.",
  },
  used: {
    code: "gone",
    message: "This link was used already, or a newer one replaced it. Ask for a new one if you need it.",
  },
  expired: { code: "gone", message: "This link has expired. Ask for a new one." },
};

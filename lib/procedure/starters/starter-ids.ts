/** In the order in which they are offered. Apart from the texts, so that a form's schema does not carry them along. */
export const STARTER_IDS = ["supply-card", "logic-card", "passive-backplane", "mixed-signal-card"] as const;

export type StarterId = (typeof STARTER_IDS)[number];

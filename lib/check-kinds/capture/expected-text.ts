import type { Spec } from "./schema";

/** "A0 to S15 at 50 %: 120 … 260 ns"; empty without a window. */
export const windowText = ({ window }: Spec): string => (window ? `${window.of}: ${window.limits.typed}` : "");

/** What the capture must show, and within which limits. */
export const expectedText = (spec: Spec): string => [spec.expects, windowText(spec)].filter(Boolean).join("; ");

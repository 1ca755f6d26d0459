import { z } from "zod";
import { parseLimits } from "@/lib/calc/units";
import { optionalLine } from "@/lib/form/text";
import { typedLimitsShape } from "../typed-limits";

/**
 * expects: what the capture must show, e.g. "CLK at U3 pin 9, 20 ns/div". window: what is measured in it, and within
 * which limits it must lie; specs from before there were windows have none.
 */
export const specShape = z.object({
  expects: z.string(),
  window: z.object({ of: z.string(), limits: typedLimitsShape }).optional(),
});
export type Spec = z.infer<typeof specShape>;

export const typedShape = z.object({
  expects: z.string(),
  windowOf: z.string().default(""),
  window: z.string().default(""),
});
export type Typed = z.output<typeof typedShape>;

export const specFromTyped = z
  .object({
    expects: optionalLine(200),
    windowOf: optionalLine(120).default(""),
    window: z.string().max(80, "At most 80 characters fit here.").default(""),
  })
  .transform(({ expects, windowOf, window }, context): Spec => {
    const typed = window.trim();
    const say = (path: string, message: string) => {
      context.addIssue({ code: "custom", path: [path], message });
      return { expects };
    };
    if (typed === "") {
      return windowOf === "" ? { expects } : say("window", "Say within which limits it must lie, e.g. 120 … 260 ns.");
    }
    if (windowOf === "") return say("windowOf", "Say what the limits are of, e.g. A0 to S15 at 50 %.");
    const limits = parseLimits(typed);
    if (!limits.ok) return say("window", limits.message);
    if (limits.value.unit === "") return say("window", "Write the unit too, e.g. 120 … 260 ns.");
    return { expects, window: { of: windowOf, limits: { typed, value: limits.value } } };
  });

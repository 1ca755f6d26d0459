import type { z } from "zod";

type RawIssue = Parameters<z.core.$ZodErrorMap>[0];

/** Sentences for what a script gets wrong most often; schemas that say something of their own go before. */
export function sayIssue(issue: RawIssue): string | undefined {
  if (issue.code === "invalid_type") return wrongType(issue);
  if (issue.code === "too_small") return bound(issue.origin, "least", Number(issue.minimum), issue.inclusive !== false);
  if (issue.code === "too_big") return bound(issue.origin, "most", Number(issue.maximum), issue.inclusive !== false);
  if (issue.code === "invalid_value") return `One of ${issue.values.map(String).join(", ")}.`;
  if (issue.code === "invalid_union") return "None of the forms that this field may have fits.";
  return undefined;
}

const KINDS: Record<string, string> = {
  number: "a number",
  int: "a whole number",
  string: "text",
  boolean: "true or false",
  array: "a list",
  object: "an object with fields",
  record: "an object with fields",
};

function wrongType({ input, expected }: RawIssue & { code: "invalid_type" }): string {
  const wanted = KINDS[expected] ?? expected;
  if (input === undefined) return `This is missing: give ${wanted}.`;
  if (typeof input === "string" && (expected === "number" || expected === "int")) {
    return `Give ${wanted} without quotes, in the unit that the name ends with; “${input.slice(0, 40)}” is text.`;
  }
  return `Give ${wanted}.`;
}

function bound(origin: string, end: "least" | "most", limit: number, isInclusive: boolean): string {
  const figure = limit.toLocaleString("en-GB", { maximumSignificantDigits: 6 });
  if (origin === "array" || origin === "set") return `At ${end} ${figure} here.`;
  if (origin === "string") return `At ${end} ${figure} characters.`;
  if (isInclusive) return `At ${end} ${figure}.`;
  return end === "least" ? `More than ${figure}.` : `Less than ${figure}.`;
}

/** One sentence by path: "boards.0.pins.3.role". A field that nobody knows is named itself, not its parent. */
export function inputErrors(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {};
  const say = (path: readonly PropertyKey[], message: string) => {
    fields[path.map(String).join(".") || "body"] ??= message;
  };
  for (const issue of error.issues.slice(0, MOST_TOLD)) {
    if (issue.code !== "unrecognized_keys") say(issue.path, issue.message);
    else
      for (const key of issue.keys.slice(0, MOST_TOLD))
        say([...issue.path, key.slice(0, 80)], "There is no such field here.");
  }
  return fields;
}

/** Somebody who sent one wrong column of ten thousand rows does not want to read it ten thousand times. */
const MOST_TOLD = 50;

import { z } from "zod";
import { line, optionalLines } from "@/lib/form/text";

function isTimeZone(value: string): boolean {
  try {
    return new Intl.DateTimeFormat("en-GB", { timeZone: value }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}

const projectFields = {
  name: line(120, "Give the project a name."),
  summary: optionalLines(2000),
  timeZone: z
    .string({ message: "Choose a time zone." })
    .refine(isTimeZone, "This is no time zone. Choose one from the list."),
  decisionRule: z.enum(["simple", "guarded"], { message: "Choose how readings are judged." }),
  layout: z.enum(["rack", "tower"], { message: "Choose how the cards stand." }),
};

const writeId = z.uuid({ message: "The write id is missing." });

export const createProjectInput = z.object({ writeId, ...projectFields });
export type CreateProjectInput = z.output<typeof createProjectInput>;

export const editProjectInput = z.object({
  project: z.string(),
  writeId,
  version: z.int({ message: "The version is missing." }),
  ...projectFields,
});
export type EditProjectInput = z.output<typeof editProjectInput>;

export const changeProjectInput = z.object({ project: z.string(), writeId });
export type ChangeProjectInput = z.output<typeof changeProjectInput>;

export const purgeProjectInput = z.object({
  project: z.string(),
  writeId,
  /** The name of the project, typed by hand. */
  confirmation: z.string({ message: "Type the name of the project." }).trim(),
});
export type PurgeProjectInput = z.output<typeof purgeProjectInput>;

/** What an edit that came too late is told. */
export const currentProject = z.object({ ...projectFields, version: z.int() });

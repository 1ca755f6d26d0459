import { z } from "zod";
import type { Requirement } from "@/lib/access/permissions";
import type { Viewer } from "@/lib/access/scope";
import { currentViewer } from "@/lib/auth/current-viewer";
import { currentCall, type Call } from "@/lib/http/call";
import { refuse, type Answer } from "./answer";
import { authorise, type ScopeFor } from "./authorise";
import { fieldErrors } from "./field-errors";
import { answerForError } from "./unexpected";

type Definition<Need extends Requirement, Schema extends z.ZodType, Value> = {
  /** Name in logs and in the permission test, e.g. "reopen-check". */
  name: string;
  permission: Need;
  /** For a permission of a project the input has a field `project` with its slug. */
  input: Schema;
  run: (scope: ScopeFor<Need>, input: z.output<Schema>, call: Call) => Promise<Answer<Value>>;
};

export type Action<Input, Value> = ((input: Input) => Promise<Answer<Value>>) & {
  /** For tests: the same chain for a given person instead of the session's. */
  as: (viewer: Viewer | undefined, raw: unknown) => Promise<Answer<Value>>;
  definition: { name: string; permission: Requirement };
};

const namesProject = z.object({ project: z.string() });

/** The one chain of a server action: session → schema → permission → use case → answer. */
export function defineAction<Need extends Requirement, Schema extends z.ZodType, Value>(
  definition: Definition<Need, Schema, Value>,
): Action<z.input<Schema>, Value> {
  async function perform(viewer: Viewer | undefined, raw: unknown, call: Call): Promise<Answer<Value>> {
    try {
      if (definition.permission !== "public" && !viewer) {
        return refuse("signed-out", "Sign in first. What you typed is still here.");
      }
      const named = namesProject.safeParse(raw);
      const granted = await authorise(definition.permission, viewer, named.success ? named.data.project : undefined);
      if (!granted.ok) return granted;
      const parsed = await definition.input.safeParseAsync(raw);
      if (!parsed.success) {
        return refuse("invalid", "Something in the form needs another look.", { fields: fieldErrors(parsed.error) });
      }
      // authorise() answers with the scope that this requirement names; the compiler cannot follow the correlation.
      return await definition.run(granted.value as ScopeFor<Need>, parsed.data, call);
    } catch (error) {
      return answerForError(error, call, definition.name);
    }
  }

  const action = async (input: z.input<Schema>) => {
    const call = await currentCall();
    let viewer: Viewer | undefined;
    try {
      viewer = await currentViewer();
    } catch (error) {
      return answerForError(error, call, definition.name);
    }
    return perform(viewer, input, call);
  };
  return Object.assign(action, {
    as: (viewer: Viewer | undefined, raw: unknown) => perform(viewer, raw, { requestId: "test", ip: "local" }),
    definition: { name: definition.name, permission: definition.permission },
  });
}

import { z } from "zod";
import type { Requirement } from "@/lib/access/permissions";
import type { Viewer } from "@/lib/access/scope";
import { currentViewer } from "@/lib/auth/current-viewer";
import { callFrom, type Call } from "@/lib/http/call";
import { sameOrigin } from "@/lib/http/same-origin";
import { problem } from "@/lib/http/problem";
import { readJson } from "@/lib/http/read-body";
import { refuse, type Answer } from "./answer";
import { authorise, type ScopeFor } from "./authorise";
import { fieldErrors } from "./field-errors";
import { answerForError } from "./unexpected";

type Definition<Need extends Requirement, Schema extends z.ZodType> = {
  name: string;
  permission: Need;
  /** Of path parameters, query and JSON body together; the path wins. */
  input: Schema;
  /** Most routes answer JSON; a Response (a file, a redirect) is passed on as it is. */
  run: (
    scope: ScopeFor<Need>,
    input: z.output<Schema>,
    call: Call,
    request: Request,
  ) => Promise<Answer<unknown> | Response>;
  /** Set false only for posts that change nothing, or that prove themselves otherwise (one-click unsubscribe). */
  browserOnly?: boolean;
  /** Of the JSON body, in bytes. */
  bodyLimit?: number;
};

type Context = { params: Promise<Record<string, string | string[] | undefined>> };
export type Route = ((request: Request, context: Context) => Promise<Response>) & {
  definition: { name: string; permission: Requirement };
};

/** The one chain of a route handler: session → permission → schema → use case → JSON or an RFC 9457 problem. */
export function defineRoute<Need extends Requirement, Schema extends z.ZodType>(
  definition: Definition<Need, Schema>,
): Route {
  async function perform(request: Request, context: Context, call: Call): Promise<Answer<unknown> | Response> {
    const changes = request.method !== "GET" && request.method !== "HEAD";
    if (changes && definition.browserOnly !== false && !sameOrigin(request)) {
      return refuse("forbidden", "The request came from another site. Nothing was changed.");
    }
    // A route without a part in brackets is given none.
    const params = (await context.params) ?? {};
    const viewer: Viewer | undefined = await currentViewer();
    const granted = await authorise(
      definition.permission,
      viewer,
      typeof params.project === "string" ? params.project : undefined,
    );
    if (!granted.ok) return granted;
    const body =
      changes && request.headers.get("content-type")?.includes("json")
        ? await readJson(request, definition.bodyLimit)
        : undefined;
    if (body && !body.ok) return body;
    const query = Object.fromEntries(new URL(request.url).searchParams);
    const fromBody = z.record(z.string(), z.unknown()).safeParse(body?.value ?? {});
    if (!fromBody.success) return refuse("invalid", "The body must be one JSON object. Nothing was changed.");
    const parsed = await definition.input.safeParseAsync({ ...query, ...fromBody.data, ...params });
    if (!parsed.success) {
      return refuse("invalid", "Something in the request is not valid. Nothing was changed.", {
        fields: fieldErrors(parsed.error),
      });
    }
    // authorise() answers with the scope that this requirement names; the compiler cannot follow the correlation.
    return definition.run(granted.value as ScopeFor<Need>, parsed.data, call, request);
  }

  const handler = async (request: Request, context: Context): Promise<Response> => {
    const call = callFrom(request.headers);
    const answer = await perform(request, context, call).catch((error: unknown) =>
      answerForError(error, call, definition.name),
    );
    if (answer instanceof Response) return answer;
    if (!answer.ok) return problem(answer.error, call.requestId);
    return Response.json(answer.value ?? null, {
      headers: { "cache-control": "no-store", "x-request-id": call.requestId },
    });
  };
  return Object.assign(handler, { definition: { name: definition.name, permission: definition.permission } });
}

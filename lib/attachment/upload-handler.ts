import { NextRequest } from "next/server";
import { createRouteHandler } from "uploadthing/next";
import { refuse } from "@/lib/actions/answer";
import { answerForError } from "@/lib/actions/unexpected";
import { currentViewer } from "@/lib/auth/current-viewer";
import { callFrom, type Call } from "@/lib/http/call";
import { problem } from "@/lib/http/problem";
import { readBytes } from "@/lib/http/read-body";
import { sameOrigin } from "@/lib/http/same-origin";
import { refusalOfRequest, uploadRouter, viewerOfRequest } from "./upload-router";

const NAME = "upload-evidence";
/** The SDK reads the body whole; what it is sent is a few hundred bytes. */
const BODY_LIMIT = 64_000;

let sdk: ReturnType<typeof createRouteHandler> | undefined;
const sdkHandler = () => (sdk ??= createRouteHandler({ router: uploadRouter, config: { logLevel: "Error" } }));

/**
 * Two callers: our own page, which asks for a link to send a file to and is checked like any other change, and the
 * object store, which tells by a signed message that a file is there and has neither session nor origin.
 */
async function handle(request: Request, call: Call): Promise<Response> {
  const fromStore = request.headers.has("uploadthing-hook");
  if (!fromStore && !sameOrigin(request)) {
    return problem(
      { code: "forbidden", message: "The request came from another site. Nothing was changed." },
      call.requestId,
    );
  }
  const body = await readBytes(request, BODY_LIMIT);
  if (!body.ok) return problem(body.error, call.requestId);
  const inner = new NextRequest(request.url, {
    method: "POST",
    headers: request.headers,
    body: new Uint8Array(body.value),
  });
  const viewer = fromStore ? undefined : await currentViewer();
  if (!fromStore && !viewer) {
    return problem({ code: "signed-out", message: "Sign in first. The file is still on this device." }, call.requestId);
  }
  if (viewer) viewerOfRequest.set(inner, viewer);

  const response = await sdkHandler().POST(inner);
  if (response.ok) return response;
  const refusal = refusalOfRequest.get(inner);
  if (refusal) return problem(refusal, call.requestId);
  if (response.status < 500)
    return problem({ code: "invalid", message: "The upload request is not valid. Nothing was kept." }, call.requestId);
  return problem(
    { code: "unavailable", message: "The server cannot take files just now. The file is still on this device." },
    call.requestId,
  );
}

const handler = async (request: Request): Promise<Response> => {
  const call = callFrom(request.headers);
  return handle(request, call).catch((error: unknown) => {
    const answer = answerForError(error, call, NAME);
    return problem(answer.ok ? refuse("failed", "Something went wrong.").error : answer.error, call.requestId);
  });
};

/** Carries its permission like every route; the permission itself is asked in admitUpload(). */
export const receiveUploadRequest = Object.assign(handler, {
  definition: { name: NAME, permission: "evidence.attach" as const },
});

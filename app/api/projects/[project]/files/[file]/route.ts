import { defineRoute } from "@/lib/actions/define-route";
import { openFile } from "@/lib/attachment/open-file";
import { openFileInput } from "@/lib/attachment/schema";

export const GET = defineRoute({
  name: "open-file",
  permission: "project.see",
  input: openFileInput,
  run: (scope, input, _call, request) => openFile(scope, input, request),
});

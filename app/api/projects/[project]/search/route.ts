import { defineRoute } from "@/lib/actions/define-route";
import { searchInput } from "@/lib/search/schema";
import { searchProject } from "@/lib/search/search-project";

export const GET = defineRoute({
  name: "search-project",
  permission: "project.see",
  input: searchInput,
  run: (scope, input) => searchProject(scope, input),
});

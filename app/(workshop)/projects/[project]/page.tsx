import { redirect } from "next/navigation";
import { definePage } from "@/lib/actions/define-page";

/** A project begins with its rack. */
export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}`,
  render: async (scope) => redirect(`/projects/${scope.slug}/rack`),
});

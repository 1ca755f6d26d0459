import type { Metadata } from "next";
import { Landing } from "@/components/landing/Landing";
import { definePage } from "@/lib/actions/define-page";
import { env } from "@/lib/env";

export const metadata: Metadata = {
  title: { absolute: "Boardwake: build log and bring-up of machines made of circuit boards" },
};

export default definePage({
  permission: "public",
  path: () => "/",
  render: async (scope) => <Landing isSignedIn={scope.viewer !== undefined} isOpen={env().SIGN_UP === "open"} />,
});

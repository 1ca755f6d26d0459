import { cache } from "react";
import type { Viewer } from "@/lib/access/scope";
import { auth } from "./auth";

/** Who is signed in, from the session row; the same answer for the whole request. */
export const currentViewer = cache(async (): Promise<Viewer | undefined> => {
  const session = await auth();
  return session?.viewer;
});

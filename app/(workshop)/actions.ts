"use server";

import { signOut as endSession } from "@/lib/auth/auth";

/** Ends this session; the row is deleted, so the cookie is worth nothing any more. */
export async function signOut(): Promise<void> {
  await endSession({ redirectTo: "/" });
}

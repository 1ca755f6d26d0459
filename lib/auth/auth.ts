import NextAuth from "next-auth";
import type { Viewer } from "@/lib/access/scope";
import { authConfig } from "./config";

declare module "next-auth" {
  interface Session {
    viewer: Viewer;
  }
}

export const { handlers, auth, signIn, signOut } = NextAuth(() => authConfig());

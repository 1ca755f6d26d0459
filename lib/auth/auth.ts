import NextAuth from "next-auth";
import { authConfig } from "./config";

/** Who is signed in is asked of currentViewer(), never of the library: see there. */
export const { handlers, signIn, signOut } = NextAuth(() => authConfig());

import { env, EnvError } from "@/lib/env";
import { notePeers } from "./note-peers";

/** Stops the start with the names of the variables that are missing or malformed, before anybody is served. */
export function startApp(): void {
  try {
    env();
  } catch (error) {
    if (!(error instanceof EnvError)) throw error;
    process.stderr.write(`${error.message}\n`);
    process.exit(1);
  }
  notePeers();
}

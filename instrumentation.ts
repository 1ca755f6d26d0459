/** Runs once before the first request. Node only: the check of the environment must not be bundled for anything else. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { startApp } = await import("@/lib/http/start-app");
  startApp();
}

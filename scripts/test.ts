import { stopOnSignals } from "./processes/stop-on-signals";
import { browserStage } from "./test/browser-stage";
import { build } from "./test/build-stage";
import { printSummary } from "./test/print-summary";
import { runStage, runTogether, type Finished } from "./test/stage";
import { format, lint, types, unused } from "./test/static-stages";
import { freshEnvironment, startThrowAwayServices } from "./test/throw-away-services";
import { vitestStage } from "./test/vitest-stage";

/*
 * npm test                          everything
 * npm test -- unit integration      only these stages
 * npm test -- integration fakes     a stage, and of it only files whose path contains the word
 * npm test -- access                the permission table, in the two stages that hold the program to it
 */
const alone = [lint, types, vitestStage("unit"), vitestStage("standards"), format, unused];
const withServices = ["integration", "build", "browser"];
const known = [...alone.map(({ name }) => name), ...withServices];

const words = process.argv.slice(2);
const chosen = words.filter((word) => known.includes(word));
const filters = words.filter((word) => !known.includes(word));
if (chosen.length === 0 && filters.includes("access")) chosen.push("integration", "browser");
const isWanted = (name: string) => chosen.length === 0 || chosen.includes(name);

async function runWithServices(): Promise<Finished[]> {
  const services = await startThrowAwayServices();
  stopOnSignals({ ...services.supervisor, stopAll: services.stop }, "Stopping the tests.");
  const finished: Finished[] = [];
  try {
    if (isWanted("integration")) {
      const env = { ...(await freshEnvironment(services, "integration")), APP_URL: "http://localhost:3000" };
      finished.push(
        await runStage(
          vitestStage("integration", () => env, true),
          filters,
        ),
      );
    }
    const wantsBrowser = isWanted("browser");
    if (isWanted("build") || wantsBrowser) finished.push(await runStage(build, []));
    if (wantsBrowser && finished.at(-1)?.failed === 0) finished.push(await runStage(browserStage(services), filters));
  } finally {
    await services.stop();
  }
  return finished;
}

const finished = await runTogether(
  alone.filter(({ name }) => isWanted(name)),
  filters,
  2,
);
try {
  if (withServices.some(isWanted)) finished.push(...(await runWithServices()));
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  finished.push({ name: "services", passed: 0, failed: 1, skipped: 0, seconds: 0, note: "could not be started" });
}
process.exit(printSummary(finished));

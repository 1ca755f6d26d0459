import { mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import type postgres from "postgres";
import { runToEnd } from "../processes/run-to-end";
import { nextCommand, root } from "../run-typescript";
import { makeLargeProject } from "./large-project";
import { kilobytes, times, type Row } from "./row";

const scripts = (html: string) => [
  ...new Set([...html.matchAll(/<script[^>]+src="([^"]+\.js[^"]*)"/g)].flatMap((match) => match[1] ?? [])),
];

/** Compressed JavaScript that the page names, as a browser with an empty cache loads it. Old-browser polyfills (noModule) are left out on both sides. */
async function loadedBytes(app: string, html: string): Promise<number> {
  const modern = html.replace(/<script[^>]*noModule[^>]*>/gi, "");
  let sum = 0;
  for (const source of scripts(modern)) {
    const response = await fetch(new URL(source, app));
    sum += gzipSync(Buffer.from(await response.arrayBuffer())).length;
  }
  return sum;
}

/** Builds a page with nothing on it by the same framework and adds up what it names. */
async function emptyPageBytes(): Promise<number> {
  const folder = join(root, ".data", "bench-empty-page");
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(join(folder, "app"), { recursive: true });
  writeFileSync(join(folder, "package.json"), JSON.stringify({ private: true, type: "module" }));
  writeFileSync(join(folder, "next.config.mjs"), `export default { turbopack: { root: ${JSON.stringify(root)} } };\n`);
  writeFileSync(
    join(folder, "app/layout.jsx"),
    "export default function Layout({ children }) { return <html><body>{children}</body></html>; }\n",
  );
  writeFileSync(join(folder, "app/page.jsx"), "export default function Page() { return <p />; }\n");
  const built = await runToEnd(process.execPath, [nextCommand, "build"], {
    cwd: folder,
    env: { NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" },
  });
  if (built.code !== 0) throw new Error(`the empty page does not build:\n${built.output}`);
  const server = join(folder, ".next/server/app");
  const page = readdirSync(server).find((name) => name === "index.html");
  if (!page) throw new Error("the empty page was not rendered at build time");
  const html = readFileSync(join(server, page), "utf8").replace(/<script[^>]*noModule[^>]*>/gi, "");
  return scripts(html).reduce(
    (sum, source) =>
      sum + gzipSync(readFileSync(join(folder, source.split("?")[0]?.replace("/_next/", ".next/") ?? ""))).length,
    0,
  );
}

export async function benchPageScript(app: string, cookieName: string, sql: postgres.Sql): Promise<Row[]> {
  const project = await makeLargeProject(sql, { slug: "bench-script", boards: 1, checks: 20, attempts: 0 });
  const response = await fetch(`${app}/projects/${project.slug}/bench/B1-01`, {
    headers: { cookie: `${cookieName}=${project.cookie}` },
  });
  if (!response.ok) throw new Error(`the bench page answered ${response.status}`);
  const ours = await loadedBytes(app, await response.text());
  const floor = await emptyPageBytes();
  const ratio = ours / floor;
  return [
    {
      work: "JavaScript of the bench page, compressed",
      ours: kilobytes(ours),
      floor: kilobytes(floor),
      ratio: times(ratio),
      toReach: "1.8 ×",
      reached: ratio <= 1.8,
    },
  ];
}

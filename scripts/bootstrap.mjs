import { spawn, spawnSync } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

// Plain Node.js without packages: it installs them when they are missing, then hands over to TypeScript.
const root = join(dirname(fileURLToPath(import.meta.url)), "..");

function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  console.error(`Node.js 20.19 or later is needed; this is ${process.versions.node}.`);
  process.exit(1);
}

function packagesIn(file) {
  return JSON.parse(readFileSync(join(root, file), "utf8")).packages;
}

/** Whether node_modules holds what the lock file says, by content: times of files change with every checkout. */
function isInstalled() {
  if (!existsSync(join(root, "node_modules/.package-lock.json"))) return false;
  const installed = packagesIn("node_modules/.package-lock.json");
  return Object.entries(packagesIn("package-lock.json")).every(([name, wanted]) => {
    if (name === "" || wanted.link) return true;
    const found = installed[name];
    if (!found) return Boolean(wanted.optional || wanted.devOptional || wanted.peer);
    return found.version === wanted.version;
  });
}

/** npm started us and says where it is; without it, the one on the path. */
function npm(args) {
  const itself = process.env.npm_execpath;
  const [command, first] = itself ? [process.execPath, [itself]] : ["npm", []];
  return spawnSync(command, [...first, ...args], { cwd: root, stdio: "inherit" }).status ?? 1;
}

function install() {
  if (isInstalled()) return;
  console.log("Installing the packages of the lock file.");
  if (npm(["ci", "--no-audit", "--no-fund"]) === 0) return;
  console.error("\nInstalling the packages failed (see above). Please run `npm ci` and start again.");
  process.exit(1);
}

/** Installs what is missing and runs a TypeScript file to its end, passing signals and the exit code on. */
export function runTypeScript(file) {
  requireNode();
  install();
  const child = spawn(process.execPath, ["--import", "tsx", join(root, file), ...process.argv.slice(2)], {
    cwd: root,
    stdio: "inherit",
  });
  // Ctrl-C reaches the child from the terminal too; it takes the second one as the same.
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, () => child.kill(signal));
  child.once("close", (code, signal) => process.exit(code ?? (signal ? 1 : 0)));
}

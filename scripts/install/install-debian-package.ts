import { existsSync } from "node:fs";
import { runToEnd } from "../processes/run-to-end";

class CannotInstall extends Error {
  override name = "CannotInstall";
}

async function privilege(): Promise<string[] | undefined> {
  if (process.getuid?.() === 0) return [];
  const sudo = await runToEnd("sudo", ["-n", "true"]);
  return sudo.code === 0 ? ["sudo", "-n"] : undefined;
}

async function run(words: string[]): Promise<number> {
  const [command = "", ...args] = words;
  return (await runToEnd(command, args, { show: true, env: { DEBIAN_FRONTEND: "noninteractive" } })).code;
}

/** Installs a package with apt-get when we may; otherwise says which command a person has to run. */
export async function installDebianPackage(name: string, purpose: string): Promise<void> {
  const byHand = `sudo apt-get update && sudo apt-get install -y ${name}`;
  if (!existsSync("/usr/bin/apt-get")) {
    throw new CannotInstall(
      `${purpose} is missing, and this machine has no apt-get. Install it with the machine's own package manager.`,
    );
  }
  const prefix = await privilege();
  if (!prefix) throw new CannotInstall(`${purpose} is missing. Please run:\n\n  ${byHand}\n\nand start again.`);

  console.log(`${purpose} is missing: installing the package ${name}.`);
  await run([...prefix, "apt-get", "update", "-q"]);
  const code = await run([
    ...prefix,
    "env",
    "DEBIAN_FRONTEND=noninteractive",
    "apt-get",
    "install",
    "-y",
    "-q",
    "--no-install-recommends",
    name,
  ]);
  if (code !== 0)
    throw new CannotInstall(`Installing ${name} failed (see above). Please run:\n\n  ${byHand}\n\nand start again.`);
}

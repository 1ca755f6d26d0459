import { createWriteStream } from "node:fs";
import type { Readable } from "node:stream";

const colours = [36, 33, 35, 32, 34, 96, 93, 95, 92, 94];

function colourOf(name: string): number {
  let sum = 0;
  for (const letter of name) sum = (sum * 31 + letter.charCodeAt(0)) % 9973;
  return colours[sum % colours.length] ?? 36;
}

function prefixFor(name: string): string {
  const label = name.padEnd(13);
  const coloured = process.stdout.isTTY && process.env["NO_COLOR"] === undefined;
  return coloured ? `\u001b[${colourOf(name)}m${label}\u001b[0m ` : `${label} `;
}

export type Lines = {
  /** Takes the output of a process. */
  follow(stream: Readable): void;
  /** The newest lines, for a failure's report. */
  tail(): string[];
  close(): void;
};

type Options = { name: string; quiet: boolean; logFile?: string };

/** Splits a process's output into lines, prints them behind its name, and keeps them in a log file. */
export function prefixLines({ name, quiet, logFile }: Options): Lines {
  const prefix = prefixFor(name);
  const recent: string[] = [];
  const file = logFile ? createWriteStream(logFile, { flags: "w", mode: 0o600 }) : undefined;
  file?.on("error", () => undefined);

  const take = (line: string) => {
    recent.push(line);
    if (recent.length > 60) recent.shift();
    file?.write(`${line}\n`);
    if (!quiet) process.stdout.write(`${prefix}${line}\n`);
  };

  return {
    follow(stream) {
      let rest = "";
      stream.setEncoding("utf8");
      stream.on("data", (chunk: string) => {
        const parts = (rest + chunk).split(/\r?\n/);
        rest = parts.pop() ?? "";
        parts.forEach(take);
      });
      stream.on("end", () => {
        if (rest !== "") take(rest);
        rest = "";
      });
    },
    tail: () => [...recent],
    close: () => file?.end(),
  };
}

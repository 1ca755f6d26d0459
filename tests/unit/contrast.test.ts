import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/** WCAG 2.2: 1.4.3 (text 4.5:1) and 1.4.11 (controls, focus and marks 3:1), over the tokens of app/globals.css. */
const css = readFileSync(new URL("../../app/globals.css", import.meta.url), "utf8");

type Tokens = Map<string, string>;

function tokensAfter(selector: string): Tokens {
  const start = css.indexOf(`${selector} {`);
  expect(start, `globals.css has a block ${selector}`).toBeGreaterThan(-1);
  const block = css.slice(start, css.indexOf("}", start));
  return new Map(
    [...block.matchAll(/--([\w-]+):\s*([^;]+);/g)].map(([, name = "", value = ""]) => [name, value.trim()]),
  );
}

const light = tokensAfter(":root");
const chosenDark = tokensAfter(':root[data-theme="dark"]');
const systemDark = tokensAfter(':root:not([data-theme="light"], [data-theme="dark"])');

function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(tokens: Tokens, one: string, other: string): number {
  const [lighter = 0, darker = 0] = [one, other]
    .map((name) => {
      const value = tokens.get(name);
      expect(value, `--${name} is a plain colour`).toMatch(/^#[0-9a-f]{6}$/i);
      return luminance(value ?? "#000000");
    })
    .sort((a, b) => b - a);
  return (lighter + 0.05) / (darker + 0.05);
}

const STATES = ["passed", "failed", "reopened", "doubtful", "waiting", "untested", "conceded"];
const SHEETS = ["paper", "sheet", "raised"];
const GROUNDS = STATES.map((state) => `${state}-ground`);
const ALL_GROUNDS = [...SHEETS, "copper-ground", ...GROUNDS];

const TEXT_PAIRS: [string, string][] = [
  ...["ink", "ink-soft", "ink-faint"].flatMap((ink) => ALL_GROUNDS.map((ground): [string, string] => [ink, ground])),
  ...["copper", "copper-deep", ...STATES].flatMap((hue) => SHEETS.map((ground): [string, string] => [hue, ground])),
  ...STATES.map((state): [string, string] => [state, `${state}-ground`]),
  ["copper", "copper-ground"],
  ["failed", "doubtful-ground"],
  ["on-copper", "copper"],
  ["on-copper", "copper-deep"],
  ...STATES.map((state): [string, string] => ["on-state", state]),
  ["mask-ink", "mask"],
  ["paper", "ink"],
];

const MARK_PAIRS: [string, string][] = [
  ...ALL_GROUNDS.map((ground): [string, string] => ["focus", ground]),
  ...SHEETS.map((ground): [string, string] => ["edge", ground]),
  ...SHEETS.map((ground): [string, string] => ["solder", ground]),
];

describe.each([
  ["light", light],
  ["dark", chosenDark],
])("the %s colours", (_name, tokens) => {
  it.each(TEXT_PAIRS)("let one read %s on %s", (text, ground) => {
    expect(contrast(tokens, text, ground)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(MARK_PAIRS)("let one see %s on %s", (mark, ground) => {
    expect(contrast(tokens, mark, ground)).toBeGreaterThanOrEqual(3);
  });
});

describe("the two dark sets", () => {
  it("are the same, chosen or taken from the system", () => {
    expect([...systemDark]).toEqual([...chosenDark]);
  });

  it("leave no light colour behind", () => {
    expect([...chosenDark.keys()].sort()).toEqual([...light.keys()].sort());
  });
});

import type { Config } from "tailwindcss";

/** Utilities name the variables of app/globals.css, so a class can never introduce a colour of its own. */
const token = (name: string) => `var(--${name})`;
const tokens = (...names: string[]) => Object.fromEntries(names.map((name) => [name, token(name)]));

const states = ["passed", "failed", "reopened", "doubtful", "waiting", "untested", "conceded"];

const config: Config = {
  content: [],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      ...tokens("paper", "sheet", "raised", "rule", "rule-strong", "edge", "ink", "ink-soft", "ink-faint"),
      ...tokens("copper", "copper-deep", "copper-ground", "on-copper", "solder", "solder-light"),
      ...tokens("mask", "mask-ink", "silk", "on-state", "focus", "scrim"),
      ...tokens(...states, ...states.map((state) => `${state}-ground`)),
    },
    fontFamily: { text: token("text"), head: token("head"), mono: token("mono") },
    fontSize: {
      "2xs": ["0.6875rem", "1rem"],
      xs: ["0.78125rem", "1.125rem"],
      sm: ["0.875rem", "1.3125rem"],
      base: ["1rem", "1.5rem"],
      lg: ["1.125rem", "1.6rem"],
      xl: ["1.3125rem", "1.65rem"],
      "2xl": ["1.625rem", "1.9rem"],
      "3xl": ["2.125rem", "2.35rem"],
      "4xl": ["2.75rem", "3rem"],
    },
    borderRadius: { none: "0", sm: "2px", DEFAULT: "4px", md: "5px", lg: "7px", full: "999px" },
    boxShadow: { none: "none", lift: token("lift"), float: token("float") },
    extend: { maxWidth: { sheet: "1264px", prose: "66ch" } },
  },
};

export default config;

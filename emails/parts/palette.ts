/** The tokens of app/globals.css as plain hex, since mail readers know no variables. */
export const light = {
  paper: "#efe9dc",
  sheet: "#faf7ef",
  raised: "#fffdf8",
  rule: "#d8cfbb",
  ink: "#1d211e",
  inkSoft: "#555b52",
  copper: "#9a4a17",
  onCopper: "#fffdf8",
  passed: "#1d6a4f",
  failed: "#b0241b",
  reopened: "#6b3b9c",
  doubtful: "#835a00",
  conceded: "#1f5a88",
} as const;

export const TEXT_FONT = '"Atkinson Hyperlegible Next", "Segoe UI", Helvetica, Arial, sans-serif';
export const FIGURE_FONT = '"Martian Mono", Menlo, Consolas, monospace';

/** Readers that honour it (and only those) get the dark sheet; the rest keep the light one. */
export const DARK_STYLE = `
:root { color-scheme: light dark; supported-color-schemes: light dark; }
@media (prefers-color-scheme: dark) {
  .bw-paper { background-color: #141210 !important; }
  .bw-sheet { background-color: #1c1916 !important; border-color: #38322a !important; }
  .bw-ink, .bw-ink a { color: #efe8d8 !important; }
  .bw-soft, .bw-soft a { color: #b3aa98 !important; }
  .bw-copper, .bw-copper a { color: #eb9a5c !important; }
  .bw-button { background-color: #eb9a5c !important; color: #141210 !important; }
  .bw-rule { border-color: #38322a !important; }
}`;

/** The tokens of app/globals.css as plain hex, since mail readers know no variables. */
export const light = {
  paper: "#efe9dc",
  sheet: "#faf7ef",
  raised: "#fffdf8",
  rule: "#d8cfbb",
  ink: "#1d211e",
  inkSoft: "#4f554c",
  copper: "#94460f",
  onCopper: "#fffdf8",
  passed: "#1a6449",
  failed: "#aa2018",
  reopened: "#683a98",
  doubtful: "#785100",
  conceded: "#1c5684",
} as const;

export const TEXT_FONT = '"Atkinson Hyperlegible Next", "Segoe UI", Helvetica, Arial, sans-serif';
export const FIGURE_FONT = '"Martian Mono", Menlo, Consolas, monospace';

/** Readers that honour it (and only those) get the dark sheet; the rest keep the light one. */
export const DARK_STYLE = `
:root { color-scheme: light dark; supported-color-schemes: light dark; }
@media (prefers-color-scheme: dark) {
  .bw-paper, .bw-paper > table > tbody > tr > td { background-color: #141210 !important; }
  .bw-sheet { background-color: #1c1916 !important; border-color: #38322a !important; }
  .bw-ink, .bw-ink a { color: #efe8d8 !important; }
  .bw-soft, .bw-soft a { color: #b8af9d !important; }
  .bw-copper, .bw-copper a { color: #eb9a5c !important; }
  .bw-button { background-color: #eb9a5c !important; color: #141210 !important; }
  .bw-rule { border-color: #38322a !important; }
  .bw-raised { background-color: #25211c !important; border-color: #38322a !important; }
  .bw-passed, .bw-passed a { color: #69c79b !important; }
  .bw-failed, .bw-failed a { color: #ff8674 !important; }
  .bw-reopened, .bw-reopened a { color: #c7a0f2 !important; }
  .bw-doubtful, .bw-doubtful a { color: #e6b84a !important; }
  .bw-bar-passed { border-color: #69c79b !important; }
  .bw-bar-failed { border-color: #ff8674 !important; }
  .bw-bar-copper { border-color: #eb9a5c !important; }
  .bw-conceded, .bw-conceded a { color: #7fbbe8 !important; }
}`;

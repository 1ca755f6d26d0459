import localFont from "next/font/local";

/*
 * The faces ship with the application; nothing is fetched from elsewhere. The latin files carry ±, −, ×, ½, ² (and µ,
 * except the text face); Ω, ≤, ≥ and → are in none of them and fall through to the system faces named in globals.css.
 * adjustFontFallback is off because its stand-in face would catch the extended letters before the ext file does.
 */
const text = localFont({
  src: [
    {
      path: "../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2",
      style: "normal",
      weight: "200 800",
    },
    {
      path: "../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-italic.woff2",
      style: "italic",
      weight: "200 800",
    },
  ],
  variable: "--face-text",
  adjustFontFallback: false,
});

const textExt = localFont({
  src: "../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-ext-wght-normal.woff2",
  weight: "200 800",
  variable: "--face-text-ext",
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: "unicode-range", value: "U+0100-02BA, U+02BD-02FF, U+1D00-1DBF, U+1E00-1EFF, U+2C60-2C7F" }],
});

const head = localFont({
  src: "../node_modules/@fontsource-variable/bricolage-grotesque/files/bricolage-grotesque-latin-opsz-normal.woff2",
  weight: "200 800",
  variable: "--face-head",
  adjustFontFallback: false,
});

const headExt = localFont({
  src: "../node_modules/@fontsource-variable/bricolage-grotesque/files/bricolage-grotesque-latin-ext-opsz-normal.woff2",
  weight: "200 800",
  variable: "--face-head-ext",
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: "unicode-range", value: "U+0100-02BA, U+02BD-02FF, U+1D00-1DBF, U+1E00-1EFF, U+2C60-2C7F" }],
});

const mono = localFont({
  src: "../node_modules/@fontsource-variable/martian-mono/files/martian-mono-latin-wdth-normal.woff2",
  weight: "100 800",
  variable: "--face-mono",
  adjustFontFallback: false,
  declarations: [{ prop: "font-stretch", value: "75% 112.5%" }],
});

const monoExt = localFont({
  src: "../node_modules/@fontsource-variable/martian-mono/files/martian-mono-latin-ext-wdth-normal.woff2",
  weight: "100 800",
  variable: "--face-mono-ext",
  adjustFontFallback: false,
  preload: false,
  declarations: [
    { prop: "font-stretch", value: "75% 112.5%" },
    { prop: "unicode-range", value: "U+0100-02BA, U+02BD-02FF, U+1D00-1DBF, U+1E00-1EFF, U+2C60-2C7F" },
  ],
});

/** Class names for <html>: they define the --face-… variables that globals.css puts into --text, --head and --mono. */
export const faces = [text, textExt, head, headExt, mono, monoExt].map((face) => face.variable).join(" ");

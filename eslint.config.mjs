import next from "eslint-config-next/core-web-vitals";
import tseslint from "typescript-eslint";

/** The arrows of DEVELOPERS.md: who may import whom. `from` is what the target must not import. */
const arrows = [
  {
    target: "./components",
    from: ["./app", "./db/client.ts", "./db/queries", "./scripts", "./emails"],
    message: "Components take data and actions as props.",
  },
  { target: "./lib", from: ["./app", "./scripts"], message: "lib knows nothing of pages." },
  { target: "./db", from: ["./app", "./components", "./emails", "./scripts"], message: "db imports nothing above it." },
  {
    target: ["./db/schema", "./db/queries", "./db/client.ts"],
    from: "./lib",
    except: ["./env.ts"],
    message: "db imports nothing of lib but lib/env.",
  },
  {
    target: "./lib/calc",
    from: ["./lib", "./db", "./components", "./app"],
    except: ["./calc"],
    message: "Calculations import only calculations.",
  },
  {
    target: "./emails",
    from: ["./app", "./components", "./db", "./lib", "./scripts"],
    message: "Mails get plain data and import only their own parts.",
  },
  {
    target: ["./app", "./components", "./lib", "./db"],
    from: "./scripts",
    message: "Scripts and fakes are never part of the app.",
  },
];

const zones = arrows.flatMap(({ target, from, except, message }) =>
  [from].flat().map((one) => ({ target, from: one, ...(except ? { except } : {}), message })),
);

const forbiddenNames = ["utils", "helpers", "misc", "common", "types", "constants"];

const plainNames = {
  regex: `(^|/)(${forbiddenNames.join("|")})(\\.tsx?|/|$)`,
  message: "Name the file by what it does.",
};
const noViews = { group: ["@/components/*"], message: "Only a check kind carries its views (lib/check-kinds)." };

/** Components take what use cases and loaders answer (types), never the use cases and loaders themselves. */
const noUseCases = {
  regex:
    "^@/(db/|lib/[^/]+/(add|archive|change|create|delete|discard|edit|find|grant|insert|issue|lift|load|move|open|place|purge|receive|record|release|remove|reopen|reorder|restore|save|send|start|update|void|withdraw|write)-)",
  allowTypeImports: true,
  message: "Components take data and actions as props.",
};

const config = [
  {
    ignores: [
      ".next*/**",
      ".data/**",
      "node_modules/**",
      "public/**",
      "next-env.d.ts",
      "db/migrations/**",
      "test-results/**",
      "playwright-report/**",
    ],
  },
  ...next,
  ...tseslint.configs.recommended,
  {
    files: ["**/*.{ts,tsx,mjs}"],
    settings: { "import/resolver": { typescript: { project: "./tsconfig.json" } } },
    rules: {
      "import/no-restricted-paths": ["error", { zones }],
      "no-restricted-imports": ["error", { patterns: [plainNames] }],
    },
  },
  {
    files: ["**/*.{ts,tsx}"],
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/no-non-null-assertion": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      "@typescript-eslint/consistent-type-imports": ["error", { fixStyle: "inline-type-imports" }],
      eqeqeq: "error",
    },
  },
  { files: ["tests/**/*.{ts,tsx}"], rules: { "react-hooks/rules-of-hooks": "off" } },
  {
    files: ["components/**/*.{ts,tsx}"],
    rules: { "@typescript-eslint/no-restricted-imports": ["error", { patterns: [noUseCases] }] },
  },
  {
    files: ["lib/**/*.{ts,tsx}"],
    ignores: ["lib/check-kinds/**"],
    rules: { "no-restricted-imports": ["error", { patterns: [plainNames, noViews] }] },
  },
];

export default config;

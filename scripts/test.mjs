import { runTypeScript } from "./bootstrap.mjs";

runTypeScript("scripts/test.ts");

import { runTypeScript } from "./bootstrap.mjs";

runTypeScript("scripts/demo.ts");

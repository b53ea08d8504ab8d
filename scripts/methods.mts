/** Brings the computed parts of the methods page (shared-lib/README.md) up to date. Run with `npm run methods`. */
import { readFile, writeFile } from "node:fs/promises";
import { renewed } from "./fit/methods-page.mts";

const page = new URL("../shared-lib/README.md", import.meta.url);
await writeFile(page, await renewed(await readFile(page, "utf8")));

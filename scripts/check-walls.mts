/** Checks the walls of .dependency-cruiser.cjs, and that the checker really saw the code: no module seen is no wall checked. */
import { createRequire } from "node:module";
import { cruise, type ICruiseOptions, type ICruiseResult } from "dependency-cruiser";
import extractTSConfig from "dependency-cruiser/config-utl/extract-ts-config";

const require = createRequire(import.meta.url);
const config = require("../.dependency-cruiser.cjs") as ICruiseOptions["ruleSet"] & {
  options: object;
};
const LEAST_MODULES = 40;

const { output } = await cruise(
  ["shared-lib", "server", "client"],
  { ...config.options, validate: true, ruleSet: { forbidden: config.forbidden ?? [] } },
  undefined,
  { tsConfig: extractTSConfig("tsconfig.json") },
);
const result = output as ICruiseResult;
for (const violation of result.summary.violations)
  console.error(`${violation.rule.name}: ${violation.from} -> ${violation.to}`);
const seen = result.modules.filter((module) => /^(shared-lib|server|client)\//.test(module.source)).length;
console.log(`walls: ${seen} modules of ours, ${result.summary.violations.length} violations`);
if (seen < LEAST_MODULES) console.error(`walls: only ${seen} modules were seen; the checker did not read TypeScript`);
if (result.summary.violations.length > 0 || seen < LEAST_MODULES) process.exitCode = 1;

/** Hydration constants by parent structure and charge state, the alcohols' terms, and the references they name. */
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, readTsv } from "./read-tsv.mts";
import { citations, oneOf, parentIn, READ, referenceIn } from "./table-cells.mts";

const STATES = new Set(["neutral", "anion", "cation"]);

export const compile: CompileTables = async () => {
  const known = await citations();
  const hydration: Record<string, object[]> = {};
  for (const row of await readTsv("shared-lib/constants/hydration.tsv", [
    "name",
    "smiles",
    "state",
    "log10_K",
    "T_C",
    "source",
    "read",
    "use",
    "limit",
    "fit",
  ])) {
    const key = `${parentIn(row)} ${oneOf(row, "state", STATES)}`;
    const limit = oneOf(row, "limit", new Set(["", ">", "<"]));
    hydration[key] ??= [];
    hydration[key].push({
      log10: numberIn(row, "log10_K"),
      celsius: numberIn(row, "T_C"),
      source: referenceIn(row, known),
      read: oneOf(row, "read", READ),
      use: oneOf(row, "use", new Set(["yes", "no"])) === "yes" && limit === "",
      ...(limit === "" ? {} : { limit }),
      ...(oneOf(row, "fit", new Set(["", "no"])) === "no" ? { external: true } : {}),
    });
  }
  const terms: Record<string, object> = {};
  for (const row of await readTsv("shared-lib/constants/alcohol-terms.tsv", [
    "alcohol",
    "log10_ratio",
    "sd",
    "source",
    "read",
  ])) {
    const citation = known.get(referenceIn(row, known));
    const read = oneOf(row, "read", new Set(["source", "recalled", "judgement"]));
    terms[row.cells.alcohol as string] = {
      log10: numberIn(row, "log10_ratio"),
      sd: numberIn(row, "sd"),
      source:
        citation ??
        (read === "recalled" ? "recalled from the literature" : "our judgement from its neighbours, wide bound"),
    };
  }
  return {
    "hydration.json": JSON.stringify(hydration),
    "alcohol-terms.json": JSON.stringify(terms),
    "citations.json": JSON.stringify(Object.fromEntries(known)),
  };
};

/** The parts of the methods page that are computed: number of rows of each table, coefficients, accuracy. */

import coefficients from "../../shared-lib/equilibrium/constants/coefficients.json" with { type: "json" };
import { TERMS } from "../../shared-lib/equilibrium/constants/terms.ts";
import { readTsv } from "../tables/read-tsv.mts";
import { accuracyReport } from "./accuracy-report.mts";

/** Tables of the constants, and the column that names what a row is about. */
const TABLES = [
  ["hydration.tsv", "smiles", "hydration constants"],
  ["hemiacetal.tsv", "smiles", "hemiacetal constants"],
  ["alcohol-terms.tsv", "alcohol", "alcohols' terms"],
  ["ring-chain.tsv", "smiles", "ring–chain constants"],
  ["enthalpy.tsv", "compound", "reaction enthalpies"],
  ["acidity.tsv", "smiles", "acidity constants"],
  ["kinetics.tsv", "compound", "rate constants"],
  ["taft.tsv", "group", "σ* of groups"],
  ["hammett.tsv", "group", "σ and σ⁺ of groups"],
] as const;

async function tableCounts(): Promise<string> {
  const lines = ["| table | holds | rows | of different | read in a source |", "| --- | --- | --- | --- | --- |"];
  for (const [file, column, holds] of TABLES) {
    const rows = await readTsv(`shared-lib/constants/${file}`, [column]);
    const different = new Set(rows.map((row) => row.cells[column])).size;
    const read = rows.filter((row) => row.cells.read === "source").length;
    const share = rows.some((row) => row.cells.read) ? `${read}` : "all";
    lines.push(`| [${file}](constants/${file}) | ${holds} | ${rows.length} | ${different} | ${share} |`);
  }
  return lines.join("\n");
}

const signed = (value: number): string => value.toFixed(2).replace("-", "−");

function coefficientTable(): string {
  const lines = ["| term | coefficient | before the fit | why |", "| --- | --- | --- | --- |"];
  TERMS.forEach((term, i) => {
    const sd = Math.sqrt(coefficients.covariance[i]?.[i] ?? 0);
    const { mean, sd: before, why } = term.prior;
    lines.push(
      `| ${term.name} | ${signed(coefficients.beta[i] ?? 0)} ± ${sd.toFixed(2)} | ${signed(mean)} ± ${before.toFixed(2)} | ${why} |`,
    );
  });
  return lines.join("\n");
}

/** The page with its computed parts (between `<!-- computed: NAME -->` and `<!-- end -->`) brought up to date. */
export async function renewed(page: string): Promise<string> {
  const parts: Readonly<Record<string, string>> = {
    tables: await tableCounts(),
    coefficients: coefficientTable(),
    accuracy: accuracyReport(),
  };
  return Object.entries(parts).reduce((text, [name, content]) => {
    const open = `<!-- computed: ${name} -->`;
    const from = text.indexOf(open);
    const to = text.indexOf("<!-- end -->", from);
    if (from < 0 || to < 0) throw new Error(`the methods page lacks the part ${open} … <!-- end -->`);
    return `${text.slice(0, from + open.length)}\n\n${content}\n\n${text.slice(to)}`;
  }, page);
}

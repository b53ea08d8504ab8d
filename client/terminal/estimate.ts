/** `oxomargin estimate`: one compound in one medium. */

import type { Compound, StructureToolkit } from "../../shared-lib/compounds/types.ts";
import { estimate } from "../../shared-lib/equilibrium/estimate.ts";
import type { Estimate } from "../../shared-lib/model/contract.ts";
import { readTemperature } from "../../shared-lib/notes/conditions.ts";
import { readMedium } from "../../shared-lib/notes/read-medium.ts";
import { estimatesAsTable } from "../../shared-lib/report/estimate-table.ts";
import { estimateAsText } from "../../shared-lib/report/estimate-text.ts";
import { Engine } from "./engine.ts";
import { valuesOf } from "./ranges.ts";
import type { Streams } from "./streams.ts";
import { UsageError } from "./usage-error.ts";

export interface EstimateCall {
  readonly what: string;
  readonly medium: string;
  readonly temperature: string;
  readonly pH?: string;
  readonly concentration?: string;
  readonly format: "text" | "json";
  readonly correlationOnly: boolean;
}

interface Conditions {
  readonly temperatureK: number;
  readonly pH?: number;
  readonly concentration?: number;
}

const MOST_CONDITIONS = 1000;

/** A solvent's row holds no formula: it follows from the structure. */
function withFormula(compound: Compound, structures: StructureToolkit): Compound {
  if (compound.formula !== "") return compound;
  const reading = structures.read(compound.smiles);
  return reading.ok ? { ...compound, formula: reading.formula, molarMass: reading.molarMass } : compound;
}

/** The compound that a SMILES, a name or a CAS number says; the toolkit is loaded only for what the tables do not know. */
async function compoundOf(what: string, engine: Engine): Promise<Compound> {
  const tabled = engine.lexicon.find(what);
  if (tabled && tabled !== "needs structures" && tabled.compound.formula !== "") return tabled.compound;
  const structures = await engine.structures();
  const named = engine.lexicon.find(what, structures);
  if (named && named !== "needs structures") return withFormula(named.compound, structures);
  const reading = structures.read(what);
  if (!reading.ok) {
    const at = reading.at === undefined ? "" : ` (at character ${reading.at + 1})`;
    throw new UsageError(`"${what}" is no name that is known, and as a SMILES: ${reading.problem}${at}`);
  }
  const known = engine.lexicon.bySmiles(reading.canonicalSmiles);
  if (known) return withFormula(known, structures);
  return {
    id: reading.canonicalSmiles,
    name: what,
    smiles: reading.canonicalSmiles,
    formula: reading.formula,
    molarMass: reading.molarMass,
    tags: [],
    ...(reading.carbonyl ? { carbonyl: reading.carbonyl } : {}),
    origin: "structure",
  };
}

function numberOf(option: string, text: string, low: number, high: number, unit: string): number {
  const value = Number(text.replace(",", "."));
  if (text.trim() === "" || !Number.isFinite(value) || value < low || value > high)
    throw new UsageError(`${option} must be a number from ${low} to ${high}${unit}, not "${text}"`);
  return value;
}

function temperatureOf(text: string): number {
  const kelvin = readTemperature(text);
  if (kelvin === undefined)
    throw new UsageError(`--at must be a temperature such as 25, "25 °C", 298K or rt, not "${text}"`);
  if (kelvin <= 0) throw new UsageError(`--at ${text}: no temperature lies below −273.15 °C`);
  if (kelvin < 173 || kelvin > 573) throw new UsageError(`--at ${text}: the constants hold from −100 to 300 °C`);
  return kelvin;
}

function concentrationOf(text: string): number {
  return numberOf("--conc", text.replace(/ ?(?:M|mol\/L)$/, ""), 0, 60, " mol/L");
}

/** The conditions asked for: one set, or every combination of the ranges. */
function conditionsOf(call: EstimateCall, pHOfMedium: number | undefined): readonly Conditions[] {
  const temperatures = valuesOf("--at", call.temperature, temperatureOf);
  const pHs =
    call.pH === undefined ? [pHOfMedium] : valuesOf("--pH", call.pH, (one) => numberOf("--pH", one, -2, 16, ""));
  const concentrations =
    call.concentration === undefined ? [undefined] : valuesOf("--conc", call.concentration, concentrationOf);
  const count = temperatures.length * pHs.length * concentrations.length;
  if (count > MOST_CONDITIONS)
    throw new UsageError(
      `the ranges make ${count} combinations; at most ${MOST_CONDITIONS} are computed: take fewer steps`,
    );
  return temperatures.flatMap((temperatureK) =>
    pHs.flatMap((pH) =>
      concentrations.map((concentration) => ({
        temperatureK,
        ...(pH === undefined ? {} : { pH }),
        ...(concentration === undefined ? {} : { concentration }),
      })),
    ),
  );
}

/** Prints an estimate, or a table of them over ranges. @returns 0 @throws UsageError naming the option or the structure and the mend */
export async function estimateCommand(call: EstimateCall, streams: Streams): Promise<number> {
  const engine = new Engine();
  const medium = readMedium(call.medium, engine.lexicon);
  if (!medium.ok) throw new UsageError(`--in: ${medium.problem}`);
  const conditions = conditionsOf(call, medium.pH);
  const compound = await compoundOf(call.what, engine);
  const query = {
    input: call.what,
    mediumText: call.medium,
    medium: medium.amounts,
    correlationOnly: call.correlationOnly,
  };
  const estimates = conditions.map((one) => estimate(compound, { ...query, ...one }));
  await streams.print(call.format === "json" ? asJson(estimates) : asText(estimates));
  return 0;
}

/** One estimate in the contract's shape; several as `estimates` of them. */
function asJson(estimates: readonly Estimate[]): string {
  return `${JSON.stringify(estimates.length === 1 ? estimates[0] : { schema: 1, estimates })}\n`;
}

function asText(estimates: readonly Estimate[]): string {
  const [only] = estimates;
  return estimates.length === 1 && only ? estimateAsText(only) : estimatesAsTable(estimates);
}

/** `oxomargin estimate`: one compound in one medium. */

import type { Compound } from "../../shared-lib/compounds/types.ts";
import { estimate } from "../../shared-lib/equilibrium/estimate.ts";
import { readTemperature } from "../../shared-lib/notes/conditions.ts";
import { readMedium } from "../../shared-lib/notes/read-medium.ts";
import { estimateAsText } from "../../shared-lib/report/estimate-text.ts";
import { Engine } from "./engine.ts";
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

/** The compound that a SMILES, a name or a CAS number says. A structure of the catalogue keeps its name. */
async function compoundOf(what: string, engine: Engine): Promise<Compound> {
  const structures = await engine.structures();
  const named = engine.lexicon.find(what, structures);
  if (named && named !== "needs structures") return named.compound;
  const reading = structures.read(what);
  if (!reading.ok) {
    const at = reading.at === undefined ? "" : ` (at character ${reading.at + 1})`;
    throw new UsageError(`"${what}" is no name that is known, and as a SMILES: ${reading.problem}${at}`);
  }
  const known = engine.lexicon.bySmiles(reading.canonicalSmiles);
  if (known) return known;
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

/** Prints an estimate. @returns 0 @throws UsageError naming the option or the structure and the mend */
export async function estimateCommand(call: EstimateCall, streams: Streams): Promise<number> {
  const engine = new Engine();
  const compound = await compoundOf(call.what, engine);
  const medium = readMedium(call.medium, engine.lexicon);
  if (!medium.ok) throw new UsageError(`--in: ${medium.problem}`);
  const pH = call.pH === undefined ? medium.pH : numberOf("--pH", call.pH, -2, 16, "");
  const concentration =
    call.concentration === undefined
      ? undefined
      : numberOf("--conc", call.concentration.replace(/ ?(?:M|mol\/L)$/, ""), 0, 60, " mol/L");
  const result = estimate(compound, {
    input: call.what,
    mediumText: call.medium,
    medium: medium.amounts,
    temperatureK: temperatureOf(call.temperature),
    ...(pH === undefined ? {} : { pH }),
    ...(concentration === undefined ? {} : { concentration }),
    correlationOnly: call.correlationOnly,
  });
  await streams.print(call.format === "json" ? `${JSON.stringify(result)}\n` : estimateAsText(result));
  return 0;
}

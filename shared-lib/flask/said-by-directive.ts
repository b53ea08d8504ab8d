/** What the writer's directives say of a step's medium, temperature and pH, and of a charge's assay: they win over what is read. */

import type { Lexicon } from "../compounds/lexicon.ts";
import { readTemperature } from "../notes/conditions.ts";
import { readMedium } from "../notes/read-medium.ts";
import type { Charge, Directive, NoteReading, Quantity } from "../notes/types.ts";
import type { SolventAmount } from "./phrase-amounts.ts";

export interface SaidOfStep {
  readonly temperatureK?: number;
  readonly pH?: number;
  /** mol of each solvent in one litre of the mixture. */
  readonly medium?: readonly SolventAmount[];
}

function numberOf(argument: string): number | undefined {
  const value = Number(argument.replace("%", "").replace(",", ".").trim());
  return argument.trim() === "" || !Number.isFinite(value) ? undefined : value;
}

function saying(said: SaidOfStep, { word, argument }: Directive, lexicon: Lexicon | undefined): SaidOfStep {
  if (word === "temperature") {
    const temperatureK = readTemperature(argument);
    return temperatureK !== undefined && temperatureK > 0 ? { ...said, temperatureK } : said;
  }
  if (word === "pH") {
    const pH = numberOf(argument);
    return pH === undefined ? said : { ...said, pH };
  }
  const medium = lexicon ? readMedium(argument, lexicon) : undefined;
  return medium?.ok ? { ...said, medium: medium.amounts, ...(medium.pH === undefined ? {} : { pH: medium.pH }) } : said;
}

const OF_STEPS = new Set(["temperature", "pH", "medium"]);

/** By number of the step: a directive speaks of the step that it stands in, or else of the next one. */
export function saidOfSteps(reading: NoteReading, lexicon?: Lexicon): ReadonlyMap<number, SaidOfStep> {
  const said = new Map<number, SaidOfStep>();
  const directives = reading.directives.filter(({ word }) => OF_STEPS.has(word));
  let next = 0;
  for (const directive of directives) {
    while (next < reading.steps.length && (reading.steps[next]?.end ?? 0) <= directive.start) next += 1;
    const step = reading.steps[next];
    if (step) said.set(step.number, saying(said.get(step.number) ?? {}, directive, lexicon));
  }
  return said;
}

/** Charges with the assay that a directive before them gives: it speaks of the next charge alone. */
export function withSaidAssays(reading: NoteReading): readonly Charge[] {
  const directives = reading.directives.filter(({ word }) => word === "assay");
  if (directives.length === 0) return reading.charges;
  const assays = new Map<number, Quantity>();
  let index = 0;
  for (const { start, end, argument } of directives) {
    const percent = numberOf(argument);
    while (index < reading.charges.length && (reading.charges[index]?.span.start ?? 0) < end) index += 1;
    if (percent === undefined || index >= reading.charges.length || !(percent > 0 && percent <= 100)) continue;
    const base = percent <= 1 && !argument.includes("%") ? percent : percent / 100;
    const span = { start, end };
    assays.set(index, {
      ...span,
      text: argument,
      of: "assay",
      value: percent,
      unit: "wt%",
      base,
      approximate: false,
      number: span,
    });
  }
  return reading.charges.map((charge, index) => {
    const assay = assays.get(index);
    return assay ? { ...charge, amounts: [...charge.amounts.filter(({ of }) => of !== "assay"), assay] } : charge;
  });
}

/** Answers an estimate from the words that a person typed; what cannot be read is answered with the field and the mend. */

import type { Compound } from "../shared-lib/compounds/types.ts";
import { estimate } from "../shared-lib/equilibrium/estimate.ts";
import { readMedium } from "../shared-lib/notes/read-medium.ts";
import { cardOfEstimate } from "../shared-lib/report/card/card.ts";
import { type CardOptions, cardMarkdown } from "../shared-lib/report/card/card-markdown.ts";
import { cardText } from "../shared-lib/report/card/card-text.ts";
import type { Engine } from "./engine.ts";
import type { EstimateReply, EstimateRequest } from "./protocol.ts";

type Problem = Extract<EstimateReply, { ok: false }>;

const problem = (field: Problem["field"], text: string): Problem => ({ ok: false, field, problem: text });

/** @param image draws structures into the card, for a client that shows them */
export async function answerEstimate(
  engine: Engine,
  request: EstimateRequest,
  image: CardOptions["image"],
): Promise<EstimateReply> {
  const compound = await compoundOf(engine, request.what);
  if ("ok" in compound) return compound;
  const mediumText = given(request.medium) ?? "water";
  const medium = readMedium(mediumText, engine.lexicon());
  if (!medium.ok) return problem("medium", `${medium.problem}.`.replace("..", "."));
  const temperature = figureIn(given(request.temperature) ?? "25", -100, 250);
  if (temperature === undefined)
    return problem("temperature", "Give degrees Celsius between −100 and 250, such as 25.");
  const pH = given(request.pH) === undefined ? undefined : figureIn(request.pH ?? "", -2, 16);
  if (given(request.pH) !== undefined && pH === undefined)
    return problem("pH", "Give a pH between −2 and 16, such as 7.4.");
  const concentration =
    given(request.concentration) === undefined ? undefined : figureIn(request.concentration ?? "", 0, 100);
  if (given(request.concentration) !== undefined && concentration === undefined)
    return problem("concentration", "Give mol/L between 0 and 100, such as 0.1.");
  const result = estimate(compound, {
    input: request.what,
    mediumText,
    medium: medium.amounts,
    temperatureK: temperature + 273.15,
    ...(pH === undefined ? {} : { pH }),
    ...(concentration === undefined ? {} : { concentration }),
  });
  if (image) await engine.loadStructures();
  const card = cardOfEstimate(result);
  return { ok: true, estimate: result, card: cardMarkdown(card, image ? { image } : {}), text: cardText(card) };
}

function given(text: string | undefined): string | undefined {
  return text === undefined || text.trim() === "" ? undefined : text.trim();
}

/** A number with or without its unit ("25", "25 °C", "−5°", "0,1 M"); undefined outside the ends. */
function figureIn(text: string, low: number, high: number): number | undefined {
  const plain = text.trim().replace("−", "-").replace("–", "-").replace(",", ".");
  const match = /^[-+]?\d{1,6}(?:\.\d{1,6})?(?=\s{0,3}(?:°\s?C?|C|M|mol\/L)?$)/.exec(plain);
  const value = match ? Number(match[0]) : Number.NaN;
  return value >= low && value <= high ? value : undefined;
}

async function compoundOf(engine: Engine, what: string): Promise<Compound | Problem> {
  const text = what.trim();
  if (text === "") return problem("what", "Give a SMILES, a name or a CAS number.");
  const first = engine.lexicon().find(text, engine.structures());
  if (first !== undefined && first !== "needs structures") return first.compound;
  const toolkit = await engine.loadStructures();
  const second = engine.lexicon().find(text, toolkit);
  if (second !== undefined && second !== "needs structures") return second.compound;
  const read = toolkit?.read(text);
  if (!read) return problem("what", `“${text}” is not known by name, and the structure toolkit could not be loaded.`);
  if (!read.ok) return problem("what", `“${text}” is no name that is known here, and as a SMILES: ${read.problem}.`);
  return {
    id: read.canonicalSmiles,
    name: text,
    smiles: read.canonicalSmiles,
    formula: read.formula,
    molarMass: read.molarMass,
    tags: [],
    ...(read.carbonyl ? { carbonyl: read.carbonyl } : {}),
    origin: "structure",
  };
}

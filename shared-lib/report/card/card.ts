/** What a card says of one carbonyl in one vessel, as data; card-markdown.ts and card-text.ts write it down. */

import type { Analysis } from "../../analyze.ts";
import type { CarbonylForms } from "../../equilibrium/types.ts";
import type { SpeciatedMoment } from "../../flask/types.ts";
import type { DerivationLine, Estimate, FormShare, Interval } from "../../model/contract.ts";
import { celsius, duration, percent, percentRange } from "./share-words.ts";

export interface Card {
  readonly name: string;
  /** The answer in one line, with its range. */
  readonly answer: string;
  /** Where it holds: medium, temperature, pH. */
  readonly conditions: string;
  /** What it means for the charge; one sentence each. */
  readonly meaning: readonly string[];
  /** The three main reasons. */
  readonly reasons: readonly DerivationLine[];
  readonly forms: readonly FormShare[];
  readonly derivation: readonly DerivationLine[];
  readonly cautions: readonly string[];
}

export interface CardContent {
  /** The reader shows the findings of the place beside the card: then the card does not say them again. */
  readonly findingsElsewhere?: boolean;
}

const MOST_REASONS = 3;
const MOST_MEANINGS = 2;

/** The moment that says most of a mention: the last one of its step that holds it, so that later solvents count. */
export function momentOf(analysis: Analysis, mention: number, preferred?: number): number | undefined {
  const holds = (index: number): boolean => analysis.moments[index]?.carbonylMentions.includes(mention) ?? false;
  if (preferred !== undefined && holds(preferred)) return preferred;
  const hinted = analysis.hints.find((hint) => hint.mention === mention)?.moment;
  if (hinted !== undefined && holds(hinted)) return hinted;
  for (let index = analysis.moments.length - 1; index >= 0; index--) if (holds(index)) return index;
  return undefined;
}

/** The forms of a mention's compound at a moment. */
export function formsAt(moment: SpeciatedMoment, mention: number): CarbonylForms | undefined {
  return moment.speciation.carbonyls[moment.carbonylMentions.indexOf(mention)];
}

/** The card of a mention, or undefined where there is nothing to say (no carbonyl, no vessel that holds it). */
export function cardOfMention(analysis: Analysis, mention: number, options: CardContent = {}): Card | undefined {
  const named = analysis.reading.mentions[mention];
  const index = momentOf(analysis, mention);
  const moment = index === undefined ? undefined : analysis.moments[index];
  const found = moment && formsAt(moment, mention);
  if (!named || !moment || !found) return undefined;
  const charge = analysis.charges.find((candidate) => candidate.mention === mention);
  const findings = options.findingsElsewhere ? [] : analysis.findings.filter((finding) => finding.mention === mention);
  const meaning = findings.map((finding) => finding.message);
  const time = found.time ? [timeSentence(found.time.halfLife, moment.heldSeconds)] : [];
  return {
    name: named.name || named.text,
    answer: answerOf(found),
    conditions: conditionsOf(moment),
    meaning: meaning.length > 0 ? meaning.slice(0, MOST_MEANINGS) : [plainMeaning(found), ...time],
    reasons: mainReasons(found.derivation),
    forms: found.forms,
    derivation: [...found.derivation, ...(charge?.how ?? []).map((says) => ({ says }))],
    cautions: found.cautions,
  };
}

/** The card of an estimate that was asked for. */
export function cardOfEstimate(estimate: Estimate): Card {
  const pH = estimate.medium.pH === undefined ? "" : `, pH ${estimate.medium.pH}`;
  return {
    name: estimate.compound.name ?? estimate.compound.smiles,
    answer: answerOf(estimate),
    conditions: `In ${estimate.medium.text}, ${celsius(estimate.temperature)}${pH}.`,
    meaning: [plainMeaning(estimate), ...(estimate.time ? [timeSentence(estimate.time.halfLife, undefined)] : [])],
    reasons: mainReasons(estimate.derivation),
    forms: estimate.forms,
    derivation: estimate.derivation,
    cautions: estimate.cautions,
  };
}

type Forms = Pick<CarbonylForms, "forms" | "free" | "outside">;

/** The largest form first, in one line. */
function answerOf(found: Forms): string {
  if (found.outside !== undefined) return `No estimate: ${found.outside}.`;
  const largest = largestOf(found.forms);
  if (!largest) return "No form was found.";
  return `${percent(largest.fraction.value)} ${largest.label} (95 % range ${percentRange(largest.fraction)})`;
}

function largestOf(forms: readonly FormShare[]): FormShare | undefined {
  return forms.reduce<FormShare | undefined>(
    (best, form) => (best === undefined || form.fraction.value > best.fraction.value ? form : best),
    undefined,
  );
}

function plainMeaning(found: Forms): string {
  if (found.outside !== undefined) return "Nothing is corrected for it.";
  const { free } = found;
  if (free.low > 0.95) return "Nearly all of it is the free carbonyl: the charge stands as written.";
  return `${percent(free.value)} of it is the free carbonyl at equilibrium (95 % range ${percentRange(free)}).`;
}

function timeSentence(halfLife: Interval, heldSeconds: number | undefined): string {
  const approach = `Half way to equilibrium in about ${duration(halfLife.value)} (${duration(halfLife.low)} to ${duration(halfLife.high)})`;
  const held = heldSeconds === undefined ? "" : `; the note holds it for ${duration(heldSeconds)}`;
  return `${approach}${held}.`;
}

function conditionsOf(moment: SpeciatedMoment): string {
  const total = moment.contents.solvents.reduce((sum, row) => sum + row.amount, 0);
  const solvents = moment.contents.solvents
    .filter((row) => row.amount > 0.005 * total)
    .map((row) => (row.amount > 0.995 * total ? row.solvent : `${row.solvent} ${percent(row.amount / total)}`));
  const medium =
    solvents.length === 0 ? "No solvent" : `In ${solvents.join(", ")}${solvents.length > 1 ? " (by mole)" : ""}`;
  const temperature = `${celsius(moment.contents.temperatureK)}${moment.temperatureStated ? "" : " (assumed)"}`;
  const pH = moment.contents.pH;
  const acidity = pH === undefined ? "" : `, pH ${Math.round(pH * 10) / 10}${moment.pHStated ? "" : " (assumed)"}`;
  return `${medium}, ${temperature}${acidity}.`;
}

/** Lines with a source come first: they carry the figure. Several sources of one thing count as one reason. */
function mainReasons(derivation: readonly DerivationLine[]): readonly DerivationLine[] {
  const said = new Set<string>();
  const distinct = derivation.filter((line) => !said.has(line.says) && said.add(line.says));
  const sourced = distinct.filter((line) => line.source !== undefined);
  const rest = distinct.filter((line) => line.source === undefined);
  return [...sourced, ...rest].slice(0, MOST_REASONS);
}

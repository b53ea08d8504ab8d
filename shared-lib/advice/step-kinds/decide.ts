/** Which kind a step is: the writer's directive, else what was charged, else its title, else unknown. */

import type { ResolvedCharge, SpeciatedMoment } from "../../flask/types.ts";
import { compositionOf } from "../../media/composition.ts";
import type { Directive, Step } from "../../notes/types.ts";
import type { StepKindDecision } from "../types.ts";
import { STEP_KINDS } from "./list.ts";
import type { StepFacts, StepKind } from "./types.ts";

const STEP_DIRECTIVE = "step";

/** Tags that make a charge no partner: it only sets the scene. */
const SCENERY = new Set([
  "salt",
  "aldehyde",
  "ketone",
  "drying agent",
  "acid",
  "strong acid",
  "base",
  "tertiary amine",
  "catalyst",
]);

/** What was charged, as a step kind sees it. */
export function factsOf(charges: readonly ResolvedCharge[], decisive: SpeciatedMoment | undefined): StepFacts {
  const tags = new Set(charges.flatMap((charge) => charge.compound.tags));
  const carbonyls = charges.filter((charge) => charge.compound.carbonyl);
  const parts = decisive ? compositionOf(decisive.contents.solvents, decisive.contents.temperatureK).components : [];
  const share = (nucleophile: "water" | "alcohol") =>
    parts.reduce((sum, part) => (part.solvent.nucleophile === nucleophile ? sum + part.volumeFraction : sum), 0);
  const others = charges.filter(({ compound }) => !compound.carbonyl && !compound.solvent && !compound.buffer);
  return {
    has: (tag) => tags.has(tag),
    aldehyde: carbonyls.some(({ compound }) => compound.carbonyl?.sites.some((site) => site.hydrogens > 0)),
    formaldehyde: carbonyls.some(({ compound }) => compound.carbonyl?.sites.some((site) => site.hydrogens === 2)),
    carbonyls: new Set(carbonyls.map(({ compound }) => compound.id)).size,
    waterShare: share("water"),
    alcoholShare: share("alcohol"),
    buffered: decisive?.contents.buffer !== undefined,
    alone:
      carbonyls.length > 0 &&
      others.every(({ compound }) => compound.tags.every((tag) => SCENERY.has(tag)) && compound.tags.length > 0),
  };
}

/**
 * @param text of the step: that nothing is consumed has to be said in words, for an unknown partner leaves no trace
 */
export function decideStepKind(
  step: Step | undefined,
  facts: StepFacts,
  directives: readonly Directive[],
  text: string,
): StepKindDecision {
  const said = directives.findLast((directive) => directive.word === STEP_DIRECTIVE && step && covers(directive, step));
  const named = said && STEP_KINDS.find((kind) => kind.id === said.argument.trim().toLowerCase());
  if (named) return { kind: named, by: "directive" };
  const words = text.toLowerCase();
  const seen = STEP_KINDS.find(
    (kind) => kind.sees(facts) && (!restsOnAbsence(kind) || kind.words.some((word) => holdsWord(words, word))),
  );
  if (seen && !restsOnAbsence(seen)) return { kind: seen, by: "partners" };
  const title = step?.title?.toLowerCase();
  const titled = title
    ? STEP_KINDS.find(
        (kind) => kind.words.some((word) => holdsWord(title, word)) && (!restsOnAbsence(kind) || kind.sees(facts)),
      )
    : undefined;
  if (titled) return { kind: titled, by: "title" };
  return seen ? { kind: seen, by: "partners" } : { by: "nothing" };
}

function restsOnAbsence(kind: StepKind): boolean {
  return kind.consequence === "nothing is consumed";
}

/** The word stands by itself, at most with a plural s. */
function holdsWord(title: string, word: string): boolean {
  for (let at = title.indexOf(word); at >= 0; at = title.indexOf(word, at + 1)) {
    const end = title[at + word.length] === "s" ? at + word.length + 1 : at + word.length;
    if (!isLetter(title[at - 1]) && !isLetter(title[end])) return true;
  }
  return false;
}

function isLetter(character: string | undefined): boolean {
  return character !== undefined && character.toLowerCase() !== character.toUpperCase();
}

function covers(directive: Directive, step: Step): boolean {
  return directive.scope.start < step.end && directive.scope.end > step.start;
}

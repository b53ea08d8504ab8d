/** Joins reading, flask and equilibrium step by step, so that each finding can look at one thing. */

import { writtenCount } from "../flask/charge-quantities.ts";
import { equivalentOfStep, type WrittenCount } from "../flask/equivalent-of-step.ts";
import type { ResolvedCharge, SpeciatedMoment } from "../flask/types.ts";
import type { NoteEvent } from "../notes/types.ts";
import { decideStepKind, factsOf } from "./step-kinds/decide.ts";
import type { AdviceContext, AdviceInput, CarbonylView, StepView } from "./types.ts";

/** Everything that findings look at. Time is linear in events and charges. */
export function contextOf(input: AdviceInput): AdviceContext {
  const charges = grouped(input.timeline.charges, (charge) => charge.step);
  const moments = grouped(input.moments, (moment) => moment.step);
  const events = grouped(input.reading.events, (event) => event.step);
  const titles = new Map(input.reading.steps.map((step) => [step.number, step]));
  const steps = [...charges.keys()].map((number): StepView => {
    const own = charges.get(number) ?? [];
    const states = moments.get(number) ?? [];
    const decisive = decisiveMoment(states);
    const step = titles.get(number);
    const equivalent = equivalentOfStep(own, writtenEquivalents(input, own));
    const decision = decideStepKind(
      step,
      factsOf(own, decisive),
      input.reading.directives,
      step ? input.text.slice(step.start, step.end) : "",
    );
    return {
      number,
      ...(step?.title ? { title: step.title } : {}),
      charges: own,
      events: events.get(number) ?? ([] as NoteEvent[]),
      moments: states,
      ...(decisive ? { decisive } : {}),
      ...(equivalent ? { equivalent } : {}),
      decision,
    };
  });
  const indices = new Map(input.moments.map((moment, index) => [moment, index]));
  return { ...input, steps, carbonyls: steps.flatMap((step) => carbonylsOf(input, step, indices)) };
}

function grouped<T>(rows: readonly T[], key: (row: T) => number): Map<number, T[]> {
  const groups = new Map<number, T[]>();
  for (const row of rows) {
    const group = groups.get(key(row));
    if (group) group.push(row);
    else groups.set(key(row), [row]);
  }
  return groups;
}

function writtenEquivalents(input: AdviceInput, charges: readonly ResolvedCharge[]): Map<number, WrittenCount> {
  const written = new Map<number, WrittenCount>();
  for (const { charge } of charges) {
    const source = input.reading.charges[charge];
    const count = source ? writtenCount(source) : undefined;
    if (count) written.set(charge, count);
  }
  return written;
}

/** The last state of the main flask with a solvent in it; else the last state of any vessel. */
function decisiveMoment(states: readonly SpeciatedMoment[]): SpeciatedMoment | undefined {
  const main = states.filter((state) => (state.vessel ?? 0) === 0);
  return main.findLast((state) => state.contents.solvents.length > 0) ?? main.at(-1) ?? states.at(-1);
}

/** By mention, the last state that holds it, with a solvent if there is one such. */
function lastStates(step: StepView): ReadonlyMap<number, SpeciatedMoment> {
  const last = new Map<number, SpeciatedMoment>();
  for (const moment of step.moments) {
    const empty = moment.contents.solvents.length === 0;
    for (const mention of moment.carbonylMentions) {
      if (!empty || (last.get(mention)?.contents.solvents.length ?? 0) === 0) last.set(mention, moment);
    }
  }
  return last;
}

function carbonylsOf(
  input: AdviceInput,
  step: StepView,
  indices: ReadonlyMap<SpeciatedMoment, number>,
): readonly CarbonylView[] {
  const last = lastStates(step);
  const decided = new Set(step.decisive?.carbonylMentions);
  return step.charges.flatMap((charge) => {
    const mention = input.reading.mentions[charge.mention];
    const written = input.reading.charges[charge.charge];
    if (!charge.compound.carbonyl || !mention || !written || mention.role !== "reagent") return [];
    // The decisive state if it holds the charge, for then the partners are in.
    const moment = decided.has(charge.mention) ? step.decisive : last.get(charge.mention);
    const forms = moment?.speciation.carbonyls[moment.carbonylMentions.indexOf(charge.mention)];
    if (!moment || !forms) return [];
    return [{ charge, written, mention, step, moment, momentIndex: indices.get(moment) ?? 0, forms }];
  });
}

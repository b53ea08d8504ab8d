/** Follows the events of a note and says what each vessel holds after each of them. */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { Settings } from "../model/settings.ts";
import type { NoteEvent, NoteReading } from "../notes/types.ts";
import { resolveCharges } from "./resolve-charges.ts";
import { saidOfSteps, withSaidAssays } from "./said-by-directive.ts";
import type { FlaskMoment, FlaskTimeline, ResolvedCharge } from "./types.ts";
import {
  asSaid,
  contentsOf,
  emptyVessel,
  isFull,
  poured,
  refluxTemperature,
  type Vessel,
  withCharge,
  withMedium,
  without,
  withTemperature,
} from "./vessel.ts";

const ZERO_CELSIUS_K = 273.15;

/** States of one step that are followed. A step with more is no step, and each state is worked out in full. */
const MOST_STATES = 200;

/**
 * The charges of a note in real amounts, and its vessels after each event that changes one.
 * A quench or a work-up ends a step: what follows it in the same step is not followed.
 *
 * @param lexicon for the supplied forms; without it only forms that the words name are known
 */
export function buildTimeline(reading: NoteReading, settings: Settings, lexicon?: Lexicon): FlaskTimeline {
  const charges = resolveCharges({ ...reading, charges: withSaidAssays(reading) }, lexicon);
  const said = saidOfSteps(reading, lexicon);
  const states = new Map<number, number>();
  const byCharge = new Map(charges.map((charge) => [charge.charge, charge]));
  const room = settings.roomTemperatureC + ZERO_CELSIUS_K;
  const vessels = new Map<string, Vessel>();
  const ended = new Set<number>();
  const moments: FlaskMoment[] = [];
  for (const [index, event] of reading.events.entries()) {
    if (event.kind === "quench" || event.kind === "work-up") ended.add(event.step);
    if (ended.has(event.step)) continue;
    if (event.kind === "hold") hold(moments, event.step, event.vessel, event.seconds);
    const key = keyOf(event.step, event.vessel);
    const before = vessels.get(key) ?? emptyVessel(room);
    const number = states.get(event.step) ?? 0;
    if (number >= MOST_STATES) continue;
    const after = afterEvent(before, event, reading, byCharge, vessels);
    if (after === before) continue;
    vessels.set(key, after);
    if (event.kind === "transfer") vessels.delete(keyOf(event.step, event.from));
    states.set(event.step, number + 1);
    moments.push(momentOf(asSaid(after, said.get(event.step)), event, index));
  }
  return { charges, moments };
}

function keyOf(step: number, vessel: number): string {
  return `${step}:${vessel}`;
}

function afterEvent(
  before: Vessel,
  event: NoteEvent,
  reading: NoteReading,
  charges: ReadonlyMap<number, ResolvedCharge>,
  vessels: ReadonlyMap<string, Vessel>,
): Vessel {
  switch (event.kind) {
    case "charge": {
      const charge = charges.get(event.charge);
      return charge && !isFull(before) ? withCharge(before, charge) : before;
    }
    case "medium": {
      const phrase = reading.media[event.medium];
      return phrase && !isFull(before) ? withMedium(before, phrase) : before;
    }
    case "temperature": {
      const kelvin = event.reflux ? (refluxTemperature(before) ?? event.kelvin) : event.kelvin;
      return Number.isFinite(kelvin) && kelvin > 0 ? withTemperature(before, kelvin) : before;
    }
    case "pH":
      return { ...before, pH: event.pH, pHStated: true };
    case "remove":
      return without(before, event.what);
    case "transfer": {
      const from = vessels.get(keyOf(event.step, event.from));
      return from && event.from !== event.vessel ? poured(from, before) : before;
    }
    default:
      return before;
  }
}

function momentOf(vessel: Vessel, event: NoteEvent, index: number): FlaskMoment {
  return {
    event: index,
    step: event.step,
    vessel: event.vessel,
    offset: event.start,
    ...contentsOf(vessel),
    temperatureStated: vessel.temperatureStated,
    pHStated: vessel.pHStated,
  };
}

/** A hold belongs to the vessel as it was left. */
function hold(moments: FlaskMoment[], step: number, vessel: number, seconds: number): void {
  if (!(seconds > 0) || !Number.isFinite(seconds)) return;
  const at = moments.findLastIndex((moment) => moment.step === step && moment.vessel === vessel);
  const moment = moments[at];
  if (moment) moments[at] = { ...moment, heldSeconds: (moment.heldSeconds ?? 0) + seconds };
}

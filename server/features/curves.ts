/** Curves of every form of one carbonyl against water share, pH, temperature, concentration or time, for the panel. */

import { speciate } from "../../shared-lib/equilibrium/speciate.ts";
import type { CarbonylForms, Contents } from "../../shared-lib/equilibrium/types.ts";
import type { SpeciatedMoment } from "../../shared-lib/flask/types.ts";
import type { Interval } from "../../shared-lib/model/contract.ts";
import { formsAt, momentOf } from "../../shared-lib/report/card/card.ts";
import { celsius, percent } from "../../shared-lib/report/card/share-words.ts";
import type { OpenNote } from "../notes.ts";
import type { Curve, CurveAxis, Curves, CurvesRequest } from "../protocol.ts";
import { positionOf } from "../ranges.ts";
import { AXES, applyAxis, controlsOf, type Stand, standOf, timeSpan, waterLabel } from "./curve-axes.ts";
import { carbonylMentionAt } from "./hover.ts";

const POINTS = 41;
const MOST_CURVES = 6;
const LEAST_SHOWN = 0.002;

/** Curves for the carbonyl at a place of a note; undefined where there is none. */
export function curvesOf(note: OpenNote, request: CurvesRequest): Curves | undefined {
  const offset = note.document.offsetAt({ line: request.line, character: request.character });
  const mention = carbonylMentionAt(note, offset) ?? nearestCarbonyl(note, offset);
  const index = mention === undefined ? undefined : momentOf(note.analysis, mention);
  const moment = index === undefined ? undefined : note.analysis.moments[index];
  if (mention === undefined || !moment || !formsAt(moment, mention)) return undefined;
  const row = moment.carbonylMentions.indexOf(mention);
  const axis = request.axis in AXES ? request.axis : "water";
  const stand = standOf(moment.contents, row, moment.heldSeconds);
  const changed = { ...stand, ...finiteOf(request.changed) };
  const x = axis === "time" ? timeSpan(formsFor(moment.contents, row, changed), POINTS) : AXES[axis].points(POINTS);
  const named = note.analysis.reading.mentions[mention];
  return {
    title: named?.name ?? "",
    axis,
    axisLabel: axis === "water" ? waterLabel(moment.contents) : AXES[axis].label,
    x,
    curves: collect(x.map((value) => pointAt(moment.contents, row, changed, axis, value))),
    here: changed[axis],
    conditions: conditionsLine(changed, axis),
    controls: controlsOf(changed),
    timeline: timelineOf(note, moment.step, mention),
  };
}

/** The last carbonyl charge before the cursor, else the first after it. */
function nearestCarbonyl(note: OpenNote, offset: number): number | undefined {
  const { charges, mentions } = note.analysis.reading;
  const carbonyls = charges.filter((charge) => mentions[charge.mention]?.carbonyl);
  return (carbonyls.findLast((charge) => charge.span.start <= offset) ?? carbonyls[0])?.mention;
}

function finiteOf(changed: CurvesRequest["changed"]): Partial<Stand> {
  const entries = Object.entries(changed ?? {}).filter(([axis, value]) => axis in AXES && Number.isFinite(value));
  return Object.fromEntries(entries);
}

function formsFor(contents: Contents, row: number, stand: Stand): CarbonylForms | undefined {
  return speciate(applyAxis(contents, row, stand)).carbonyls[row];
}

type Point = ReadonlyMap<string, Interval>;

function pointAt(contents: Contents, row: number, stand: Stand, axis: CurveAxis, value: number): Point {
  const forms = formsFor(contents, row, axis === "time" ? stand : { ...stand, [axis]: value });
  if (!forms || forms.outside !== undefined) return new Map();
  const shares = forms.forms.map((form) => [form.label, form.fraction, form.kind] as const);
  if (axis !== "time" || !forms.time) return new Map(shares.map(([label, share]) => [label, share]));
  const left = 0.5 ** (value / forms.time.halfLife.value);
  return new Map(
    shares.map(([label, share, kind]) => [label, approached(share, kind === "free carbonyl" ? 1 : 0, left)]),
  );
}

/** First-order approach from the start share to the share at equilibrium. */
function approached(equilibrium: Interval, start: number, left: number): Interval {
  const at = (end: number): number => end + (start - end) * left;
  return { value: at(equilibrium.value), low: at(equilibrium.low), high: at(equilibrium.high) };
}

function collect(points: readonly Point[]): Curve[] {
  const largest = new Map<string, number>();
  for (const point of points)
    for (const [label, share] of point) largest.set(label, Math.max(largest.get(label) ?? 0, share.value));
  return [...largest]
    .filter(([, most]) => most >= LEAST_SHOWN)
    .sort((a, b) => b[1] - a[1])
    .slice(0, MOST_CURVES)
    .map(([label]) => ({
      label,
      value: points.map((point) => point.get(label)?.value ?? 0),
      low: points.map((point) => point.get(label)?.low ?? 0),
      high: points.map((point) => point.get(label)?.high ?? 0),
    }));
}

function conditionsLine(stand: Stand, axis: CurveAxis): string {
  const parts = (["water", "temperature", "pH", "concentration"] as const)
    .filter((other) => other !== axis)
    .map((other) => AXES[other].says(stand[other]));
  return parts.join(", ");
}

function timelineOf(note: OpenNote, step: number, mention: number): Curves["timeline"] {
  const text = note.document.getText();
  return note.analysis.moments
    .filter((moment) => moment.step === step)
    .map((moment: SpeciatedMoment) => {
      const event = note.analysis.reading.events[moment.event];
      const words = event ? shortened(text.slice(event.start, event.end)) : "";
      const forms = formsAt(moment, mention);
      const free = forms && forms.outside === undefined ? forms.free.value : undefined;
      const state = free === undefined ? "" : `, ${percent(free)} free`;
      const says = `${words} (${celsius(moment.contents.temperatureK)}${state})`;
      return { line: positionOf(note.document, moment.offset).line, says, ...(free === undefined ? {} : { free }) };
    });
}

const LONGEST_WORDS = 60;

function shortened(words: string): string {
  const line = words.replaceAll(/\s+/g, " ");
  return line.length <= LONGEST_WORDS ? line : `${line.slice(0, LONGEST_WORDS - 1)}…`;
}

/** Which forms every carbonyl of a vessel takes: constants, medium, mass balance, bounds. Total and deterministic; never throws. */

import type { Compound } from "../compounds/types.ts";
import { activitiesOf } from "../media/activities.ts";
import { saltWaterActivity } from "../media/salts.ts";
import type { FormShare } from "../model/contract.ts";
import { bufferPartner } from "./adducts/buffer-partner.ts";
import { freeOf, outside, reportOf } from "./carbonyl-report.ts";
import { cautionsOf } from "./cautions.ts";
import type { NoConstant } from "./constants/types.ts";
import { compoundForms } from "./forms/compound-forms.ts";
import { type CompoundForms, type Conditions, WATER } from "./forms/species.ts";
import type { CarbonylForms, Contents, SpeciateOptions, Speciation } from "./types.ts";
import { equilibrate, type VesselSet } from "./vessel/equilibrium.ts";
import { formShares, sensitivities } from "./vessel/form-shares.ts";
import { soundAmount, type Vessel, vesselOf } from "./vessel/ligands.ts";

const NEUTRAL_PH = 7;
const STANDARD_K = 298.15;
/** mol/L that stands for "infinitely dilute". */
const TRACE_MOLARITY = 1e-10;
/** mol/L of carbonyl from which on longer chains are looked for. */
const CONCENTRATED = 0.1;
const TWO_PHASES = "These solvents form two liquid phases; the shares are those of one mixed phase.";
const NO_MEDIUM = "no medium is known here: name the solvent";

interface Row {
  readonly compound: Compound;
  readonly amount: number;
  readonly known: CompoundForms | NoConstant;
  /** Its sets in the vessel. */
  readonly sets: readonly number[];
}

/** Rows of one compound are one pool of molecules. */
function pooled(contents: Contents): { compounds: Compound[]; amounts: number[]; of: number[] } {
  const compounds: Compound[] = [];
  const amounts: number[] = [];
  const of = contents.carbonyls.map(({ compound, amount }) => {
    let i = compounds.findIndex((other) => other.id === compound.id && other.smiles === compound.smiles);
    if (i < 0) i = compounds.push(compound) - 1;
    amounts[i] = (amounts[i] ?? 0) + soundAmount(amount);
    return i;
  });
  return { compounds, amounts, of };
}

function conditionsOf(contents: Contents, vessel: Vessel, pH: number, options: SpeciateOptions): Conditions {
  const molarity =
    vessel.volumeL > 0 ? contents.carbonyls.reduce((s, row) => s + soundAmount(row.amount), 0) / vessel.volumeL : 0;
  return {
    temperatureK: contents.temperatureK,
    pH,
    correlationOnly: options.correlationOnly ?? false,
    water: vessel.ligands.some((ligand) => ligand.name === WATER),
    alcohols: vessel.ligands.flatMap(({ name }) => (name === WATER || name.startsWith("with:") ? [] : [name])),
    partners: vessel.partners,
    concentrated: molarity > CONCENTRATED,
  };
}

function saltActivityOf(contents: Contents, vessel: Vessel): number {
  const water = vessel.ligands.find((ligand) => ligand.name === WATER)?.total ?? 0;
  const solutes = contents.solutes.map(({ compound, amount }) => ({ cas: compound.cas, amount }));
  return water > 0 ? saltWaterActivity({ solutes, water, buffer: contents.buffer }, contents.temperatureK) : 1;
}

/** Solves the vessel once, with or without the partners that are told apart. */
function solve(contents: Contents, everyPartner: boolean, pH: number, options: SpeciateOptions) {
  const vessel = vesselOf(contents, everyPartner);
  const conditions = conditionsOf(contents, vessel, pH, options);
  const { compounds, amounts, of } = pooled(contents);
  const sets: VesselSet[] = [];
  const rows = compounds.map((compound, i): Row => {
    const known = compoundForms(compound, conditions);
    const amount = Math.max(amounts[i] ?? 0, TRACE_MOLARITY * vessel.volumeL);
    const own = "outside" in known ? [] : known.sets.map(({ species }) => sets.push({ species, total: amount }) - 1);
    return { compound, amount, known, sets: own };
  });
  if (sets.length === 0 || !(vessel.volumeL > 0)) return { vessel, rows, of };
  const saltActivity = saltActivityOf(contents, vessel);
  const solved = equilibrate(sets, vessel, contents.temperatureK, saltActivity);
  const moves = sensitivities(solved);
  return { vessel, rows, of, solved, saltActivity, forms: rows.map((row) => formShares(solved, row.sets, moves)) };
}

type Solve = ReturnType<typeof solve>;

function withPartners(contents: Contents, pH: number, options: SpeciateOptions, before: Solve): Solve | undefined {
  const partners = vesselOf(contents, true).partners.length;
  return partners > before.vessel.partners.length ? solve(contents, true, pH, options) : undefined;
}

function reportRow(
  index: number,
  contents: Contents,
  pH: number,
  found: Solve,
  beside: Solve | undefined,
  twoPhases: boolean,
): CarbonylForms {
  const row = found.rows[index] as Row;
  if ("outside" in row.known) return outside(row.known.outside);
  if (found.vessel.composition.components.length === 0 || !found.solved) return outside(NO_MEDIUM);
  const forms = found.forms[index] as FormShare[];
  const more = beside?.solved && beside.forms[index];
  const cautions = cautionsOf(contents, row.compound, forms, more);
  if (twoPhases) cautions.push(TWO_PHASES);
  const report = reportOf(row.compound, row.known, contents, pH, found.solved, forms, cautions);
  // Not spread: the derivation is written only when it is read.
  return more?.some((form) => form.label.includes(" with "))
    ? Object.assign(report, { withPartners: { forms: more, free: freeOf(more) } })
    : report;
}

function withSalts(activity: Readonly<Record<string, number>>, saltActivity: number): Readonly<Record<string, number>> {
  const water = activity.water;
  return water === undefined || saltActivity === 1 ? activity : { ...activity, water: water * saltActivity };
}

/** The buffer's amine as a dissolved partner. */
function withBufferPartner(contents: Contents, litres: number): Contents {
  const partner = bufferPartner(contents.buffer, litres);
  return partner && contents.solutes.every(({ compound }) => compound.smiles !== partner.compound.smiles)
    ? { ...contents, solutes: [...contents.solutes, partner] }
    : contents;
}

/**
 * Speciation of a vessel.
 *
 * @param contents amounts in mol, K, L; amounts that are not finite or not above 0 count as traces or are left out
 * @returns one entry per carbonyl of the contents, in their order; one that the model cannot answer says why in `outside`
 */
export function speciate(contents: Contents, options: SpeciateOptions = {}): Speciation {
  const temperatureK =
    contents.temperatureK > 0 && Number.isFinite(contents.temperatureK) ? contents.temperatureK : STANDARD_K;
  const pH =
    contents.pH !== undefined && Number.isFinite(contents.pH) ? Math.max(-2, Math.min(16, contents.pH)) : NEUTRAL_PH;
  const bare: Contents = temperatureK === contents.temperatureK ? contents : { ...contents, temperatureK };
  const vessel = bare.buffer ? withBufferPartner(bare, vesselOf(bare, false).composition.volumeL) : bare;
  const found = solve(vessel, false, pH, options);
  const beside = withPartners(vessel, pH, options, found);
  const { composition } = found.solved ?? found.vessel;
  const { activity, twoPhases } = activitiesOf(composition, temperatureK);
  return {
    carbonyls: found.of.map((index) => reportRow(index, vessel, pH, found, beside, twoPhases)),
    activities: withSalts(activity, found.saltActivity ?? saltActivityOf(vessel, found.vessel)),
    volumeL: contents.volumeL ?? found.vessel.composition.volumeL,
    settled: found.solved?.settled ?? true,
  };
}

/**
 * What the medium does to the ratios hydrate : carbonyl and hemiacetal : carbonyl. README.md beside this file has the evidence.
 *
 * Hydrate, against dilute water: ratio = K_w · φ_w · √max(1, a_w³/φ_w), the geometric mean between proportionality to the water's volume
 * fraction and the published third power of its activity for aliphatic aldehydes in dioxane–water and in salt solutions ("The Hydration of
 * Aliphatic Aldehydes and Pyruvic Acid in Mixed Solvents", Buschmann, Knoche and co-workers, Ber. Bunsenges. Phys. Chem.; abstract read).
 * Solvents that solvate the O–H of the diol themselves (alcohols, DMSO) leave it at φ_w. It is a judgement between two assessments, not a
 * measurement, and the bound says so.
 */

import type { DerivationLine } from "../model/contract.ts";
import { type Activities, activitiesOf } from "./activities.ts";
import type { Component, Composition } from "./composition.ts";
import { iceActivity } from "./ice.ts";
import {
  ALCOHOL_BESIDE_OTHERS,
  ALCOHOL_BESIDE_PROTIC,
  BESIDE_ALCOHOLS,
  BESIDE_OTHERS,
  errorAt,
  withTemperature,
} from "./medium-errors.ts";

export interface MediumFactor {
  readonly log10: number;
  readonly sd: number;
  /** Built only when read: a mass balance asks for thousands of factors and shows one. */
  readonly lines: readonly DerivationLine[];
  readonly flags: readonly string[];
}

/** A factor whose lines are written when they are read. */
class LazyFactor implements MediumFactor {
  readonly log10: number;
  readonly sd: number;
  readonly flags: readonly string[];
  readonly #write: () => readonly DerivationLine[];

  constructor(log10: number, sd: number, flags: readonly string[], write: () => readonly DerivationLine[]) {
    this.log10 = log10;
    this.sd = sd;
    this.flags = flags;
    this.#write = write;
  }

  get lines(): readonly DerivationLine[] {
    return this.#write();
  }
}

/** What of the compound and of the solutes changes the rule. */
export interface MediumTraits {
  /** An α-keto acid: its hydration falls with the sixth to seventh power of the activity of water. */
  readonly ketoAcid: boolean;
  /** A diol acidic enough for DMSO to hold it (aryl trifluoromethyl ketones without N–H, 2-nitrobenzaldehyde). */
  readonly acidicDiol: boolean;
  /** Activity of water over the salts and other solutes alone (`saltWaterActivity`); absent: 1. */
  readonly saltActivity?: number;
}

const NONE: MediumFactor = { log10: Number.NEGATIVE_INFINITY, sd: 0, lines: [], flags: [] };
/** Exponents of the activity of water: aliphatic aldehydes 3, pyruvic acid 6 to 7 (the paper of the head comment). */
const USUAL_EXPONENT = 3;
const KETO_ACID_EXPONENT = 6;
/** Down to this mole fraction of water DMSO hydrates trifluoroacetophenones at least as much as water does (Stewart, Van Dyke 1970). */
const DMSO_LIMIT = 0.15;

interface Shares {
  readonly water: number;
  readonly waterMoles: number;
  /** Volume shares of what is not water: alcohols, DMSO, all the rest. */
  readonly alcohol: number;
  readonly dmso: number;
  readonly rest: number;
}

function sharesOf(components: readonly Component[]): Shares {
  let water = 0;
  let waterMoles = 0;
  let alcohol = 0;
  let dmso = 0;
  let rest = 0;
  for (const { solvent, volumeFraction, moleFraction } of components) {
    if (solvent.nucleophile === "water") {
      water += volumeFraction;
      waterMoles += moleFraction;
    } else if (solvent.nucleophile === "alcohol") alcohol += volumeFraction;
    else if (solvent.key === "DMSO" || solvent.key === "DMSO-d6") dmso += volumeFraction;
    else rest += volumeFraction;
  }
  const other = Math.max(1e-12, alcohol + dmso + rest);
  return { water, waterMoles, alcohol: alcohol / other, dmso: dmso / other, rest: rest / other };
}

function waterActivity(composition: Composition, activities: Activities): number {
  let sum = 0;
  for (const { solvent } of composition.components)
    if (solvent.nucleophile === "water") sum += activities.activity[solvent.key] ?? 0;
  return Math.min(1, sum);
}

const ICE_FLAG = "ice forms at this temperature: the liquid holds less water than is written";

interface Rule {
  readonly log10: number;
  readonly sd: number;
}

function solventRule(shares: Shares, activity: number, twoPhases: boolean, traits: MediumTraits): Rule {
  const byVolume = Math.log10(shares.water);
  const byActivity = USUAL_EXPONENT * Math.log10(Math.max(activity, 1e-6));
  const apart = byActivity - byVolume;
  const lift = traits.ketoAcid ? 0 : (shares.rest * Math.max(0, apart)) / 2;
  // The two limits as a flat range between them, and a tenth for the rest; alcohols have their own, smaller error.
  const between = Math.hypot(Math.min(0.5, Math.abs(apart) / 2) / Math.sqrt(3), 0.1);
  const usual = Math.max(
    errorAt(BESIDE_OTHERS, shares.water),
    shares.rest * between * Math.min(1, 20 * (1 - shares.water)),
  );
  const protic = errorAt(BESIDE_ALCOHOLS, shares.water);
  let log10 = byVolume + lift;
  let sd = shares.alcohol * protic + (1 - shares.alcohol) * usual;
  if (traits.acidicDiol && shares.dmso > 0) {
    const held = shares.waterMoles >= DMSO_LIMIT ? 0 : Math.log10(shares.waterMoles / DMSO_LIMIT);
    log10 = (1 - shares.dmso) * log10 + shares.dmso * held;
    sd = (1 - shares.dmso) * sd + shares.dmso * 0.4;
  }
  if (traits.ketoAcid) sd = Math.max(sd, 0.7 * Math.min(1, 2 * (1 - shares.water)));
  if (twoPhases) sd = Math.max(sd, 0.5);
  return { log10, sd };
}

function saltRule(traits: MediumTraits): Rule {
  const activity = traits.saltActivity ?? 1;
  if (activity >= 1) return { log10: 0, sd: 0 };
  const log10 = (traits.ketoAcid ? KETO_ACID_EXPONENT : USUAL_EXPONENT) * Math.log10(Math.max(activity, 0.01));
  return { log10, sd: Math.min(0.4, 0.6 * Math.abs(log10)) };
}

function hydrationLines(
  shares: Shares,
  activity: number,
  solvent: Rule,
  salt: Rule,
  traits: MediumTraits,
): DerivationLine[] {
  const lines: DerivationLine[] = [];
  if (shares.water < 0.9999) {
    lines.push({
      says: `Water here: volume fraction ${shares.water.toPrecision(3)}, activity ${activity.toFixed(2)}`,
      source: "modified UNIFAC (Dortmund), parameters published to 2016",
    });
    const lifted = solvent.log10 > Math.log10(shares.water) + 0.005;
    lines.push({
      says:
        traits.acidicDiol && shares.dmso > 0.3
          ? "DMSO holds an acidic diol: hydration stays near that in water down to 15 mol % water"
          : lifted
            ? "Hydration scales between the volume fraction of water and the third power of its activity"
            : "Hydration scales with the volume fraction of water",
      value: `× ${(10 ** solvent.log10).toPrecision(2)}`,
      source:
        traits.acidicDiol && shares.dmso > 0.3
          ? "Stewart, Van Dyke, Can. J. Chem. 1970, 48, 3961 (abstract)"
          : "our rule between two published limits; see the methods page",
    });
  }
  if (salt.log10 < -0.005)
    lines.push({
      says: `Dissolved salts lower the activity of water to ${(traits.saltActivity ?? 1).toFixed(3)}, and hydration with its ${traits.ketoAcid ? "sixth" : "third"} power`,
      value: `× ${(10 ** salt.log10).toPrecision(2)}`,
      source: "exponent: Buschmann, Knoche and co-workers, Ber. Bunsenges. Phys. Chem. (abstract)",
    });
  return lines;
}

/** log10 of ([diol]/[C=O] here over [diol]/[C=O] in dilute water at the same temperature); −∞ without any water. */
export function hydrationFactor(composition: Composition, temperatureK: number, traits: MediumTraits): MediumFactor {
  const shares = sharesOf(composition.components);
  if (!(shares.water > 0)) return NONE;
  const activities = activitiesOf(composition, temperatureK);
  const activity = waterActivity(composition, activities);
  const solvent = solventRule(shares, activity, activities.twoPhases, traits);
  const salt = saltRule(traits);
  // Traces of water that freeze out of a cold organic liquid are no news.
  const ice = shares.water > 0.05 && activity * (traits.saltActivity ?? 1) > iceActivity(temperatureK) + 0.01;
  return new LazyFactor(
    solvent.log10 + salt.log10,
    withTemperature(Math.hypot(solvent.sd, salt.sd), temperatureK),
    ice ? [...activities.flags, ICE_FLAG] : activities.flags,
    () => hydrationLines(shares, activity, solvent, salt, traits),
  );
}

/** Solvents that do not solvate an O–H leave a dilute alcohol, and so the hemiacetal's ratio, up to this factor higher. */
const WEAK_SOLVENT_FACTOR = Math.log10(2);
const WEAK_SOLVENT_LIMIT = 0.15;

/**
 * log10 of ([hemiacetal]/[C=O] here over that in the neat alcohol): the volume fraction of the alcohol, which is its molar concentration.
 * Alkanes, arenes and chlorinated solvents with little alcohol raise it up to twofold.
 */
export function hemiacetalFactor(composition: Composition, alcohol: string, temperatureK = 298.15): MediumFactor {
  let phi = 0;
  let protic = 0;
  let weak = 0;
  for (const { solvent, volumeFraction } of composition.components) {
    if (solvent.key === alcohol) phi += volumeFraction;
    if (solvent.nucleophile !== "none") protic += volumeFraction;
    else if (solvent.weaklySolvating) weak += volumeFraction;
  }
  if (!(phi > 0)) return NONE;
  const dilute = Math.max(0, 1 - protic / WEAK_SOLVENT_LIMIT);
  const log10 = Math.log10(phi) + WEAK_SOLVENT_FACTOR * weak * dilute;
  const inProtic = errorAt(ALCOHOL_BESIDE_PROTIC, phi);
  const usual = errorAt(ALCOHOL_BESIDE_OTHERS, phi);
  const sd = withTemperature(protic * inProtic + (1 - protic) * usual, temperatureK);
  return new LazyFactor(log10, sd, activitiesOf(composition, temperatureK).flags, () =>
    phi > 0.9999
      ? []
      : [
          {
            says: `${alcohol} is ${(phi * 100).toPrecision(2)} % of the volume: the hemiacetal ratio scales with its concentration`,
            value: `× ${(10 ** log10).toPrecision(2)}`,
            source: "our rule; see the methods page",
          },
        ],
  );
}

/** Ring–chain constants of hydroxy-aldehydes, hydroxy-ketones and sugars: [cyclic hemiacetal]/[free C=O] in water. */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import { ringChainOf } from "../constants/ring-chains.ts";
import type { DerivationLine } from "../model/contract.ts";
import { vantHoff } from "./constants/temperature.ts";

export interface RingClosure {
  readonly log10: number;
  readonly sd: number;
  readonly label: string;
  readonly line: DerivationLine;
}

/** 4-, 5- and 6-hydroxyalkanals (Hurd, Saunders, J. Am. Chem. Soc. 1952, 74, 5324, in 75 % dioxane; recalled). */
const ALDEHYDE: Readonly<Record<5 | 6 | 7, number>> = { 5: 0.89, 6: 1.19, 7: -0.75 };
/** 5-Hydroxy-2-pentanone and 6-hydroxy-2-hexanone show no ring in water (abstract read). */
const KETONE: Readonly<Record<5 | 6 | 7, number>> = { 5: -1.6, 6: -1.6, 7: -2.5 };
/** o-Hydroxyalkylbenzaldehydes: 6.7 and 20 (Harron, McClelland, Thankachan, Tidwell, J. Org. Chem. 1981, 46, 903; abstract read). */
const ARYL = 0.9;
/** Aldoses and ketoses of like structure (Angyal, Adv. Carbohydr. Chem. Biochem. 1984, 42, 15; recalled). */
const SUGAR = { aldose: 3.7, ketose: 2.2 };
const SD = { kind: 0.35, sugar: 0.6 };
/** kJ/mol of closing a ring; sugars open when warmed (judgement). */
const ENTHALPY = { value: -20, sd: 10 };

function ofKind(site: CarbonylSite, size: 5 | 6 | 7): { log10: number; sd: number; source: string } {
  if (site.class === "sugar")
    return {
      log10: site.hydrogens > 0 ? SUGAR.aldose : SUGAR.ketose,
      sd: SD.sugar,
      source: "Angyal, Adv. Carbohydr. Chem. Biochem. 1984, 42, 15 (recalled; by kind of sugar)",
    };
  if (site.aryl && size < 7)
    return { log10: ARYL, sd: SD.kind, source: "Harron, McClelland, Thankachan, Tidwell, J. Org. Chem. 1981, 46, 903" };
  return {
    log10: (site.hydrogens > 0 ? ALDEHYDE : KETONE)[size],
    sd: SD.kind,
    source: "Hurd, Saunders, J. Am. Chem. Soc. 1952, 74, 5324 (recalled; by size of the ring)",
  };
}

/**
 * Ring–chain constant of a site at a temperature: published for the compound, else by kind; undefined when no hydroxyl can reach it.
 *
 * @param correlationOnly leave what was published for this compound aside
 */
export function ringClosure(
  site: CarbonylSite,
  smiles: string,
  temperatureK: number,
  correlationOnly: boolean,
): RingClosure | undefined {
  const { closure } = site;
  if (!closure) return undefined;
  const row = correlationOnly ? undefined : ringChainOf(smiles, site.parent);
  const known = row && row.closes !== "cyclic hydrate" ? row : undefined;
  const found = known ?? ofKind(site, closure.ringSize);
  const change = vantHoff(ENTHALPY, 273.15 + (known?.celsius ?? 25), temperatureK);
  const log10 = found.log10 + change.shift;
  const sugar = site.class === "sugar";
  return {
    log10,
    sd: Math.hypot(found.sd, change.sd),
    label: sugar ? "ring forms of the sugar" : `${closure.ringSize}-membered cyclic hemiacetal`,
    line: {
      says: sugar
        ? "The sugar is closed to its pyranose and furanose rings"
        : `A hydroxyl closes a ${closure.ringSize}-membered ring on the carbonyl`,
      value: `log K = ${log10.toFixed(2).replace("-", "−")} ± ${Math.hypot(found.sd, change.sd).toFixed(2)}`,
      source: found.source,
    },
  };
}

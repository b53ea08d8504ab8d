/** Ring–chain constants of hydroxy-aldehydes, hydroxy-ketones and sugars: [cyclic hemiacetal]/[free C=O] in water at 25 °C. */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import type { DerivationLine } from "../model/contract.ts";

export interface RingClosure {
  readonly log10: number;
  readonly sd: number;
  readonly label: string;
  readonly line: DerivationLine;
}

/** 4-, 5- and 6-hydroxyalkanals: 11.4, 6.1 and 85 % open (Hurd, Saunders, J. Am. Chem. Soc. 1952, 74, 5324, in 75 % dioxane; recalled). */
const ALDEHYDE: Readonly<Record<5 | 6 | 7, number>> = { 5: 0.89, 6: 1.19, 7: -0.75 };
/** 5-Hydroxy-2-pentanone and 6-hydroxy-2-hexanone show no ring in water (abstract read). */
const KETONE: Readonly<Record<5 | 6 | 7, number>> = { 5: -1.6, 6: -1.6, 7: -2.5 };
/** Pyranoses and furanoses: 0.002–0.05 % open for aldohexoses and pentoses, 0.3–0.8 % for ketohexoses (Angyal, Adv. Carbohydr. Chem. 1984, 42, 15; recalled). */
const SUGAR = { aldose: 3.7, ketose: 2.2 };

/** undefined when no hydroxyl can reach the carbonyl. */
export function ringClosure(site: CarbonylSite): RingClosure | undefined {
  const { closure } = site;
  if (!closure) return undefined;
  if (site.class === "sugar") {
    const log10 = site.hydrogens > 0 ? SUGAR.aldose : SUGAR.ketose;
    return {
      log10,
      sd: 0.5,
      label: "ring forms of the sugar",
      line: {
        says: "The sugar is closed to its pyranose and furanose rings",
        value: `log K = ${log10}`,
        source: "Angyal, Adv. Carbohydr. Chem. Biochem. 1984, 42, 15 (recalled)",
      },
    };
  }
  const aryl = site.aryl !== undefined;
  const log10 = aryl && closure.ringSize < 7 ? 0.9 : (site.hydrogens > 0 ? ALDEHYDE : KETONE)[closure.ringSize];
  return {
    log10,
    sd: 0.35,
    label: `${closure.ringSize}-membered cyclic hemiacetal`,
    line: {
      says: `A hydroxyl closes a ${closure.ringSize}-membered ring on the carbonyl`,
      value: `log K = ${log10.toFixed(2).replace("-", "−")}`,
      source: aryl
        ? "Harron, McClelland, Thankachan, Tidwell, J. Org. Chem. 1981, 46, 903 (o-hydroxymethyl- and o-hydroxyethylbenzaldehyde, 6.7 and 20)"
        : "Hurd, Saunders, J. Am. Chem. Soc. 1952, 74, 5324 (recalled)",
    },
  };
}

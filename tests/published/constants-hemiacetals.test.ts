/** Hemiacetal and ring–chain constants against published values, the source beside each ("recalled": not read there). */

import { describe, expect, it } from "vitest";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { acidityOf } from "../../shared-lib/constants/acidities.ts";
import { rateOf } from "../../shared-lib/constants/rates.ts";
import { ringChainOf } from "../../shared-lib/constants/ring-chains.ts";
import { hemiacetalConstant } from "../../shared-lib/equilibrium/constants/hemiacetal.ts";
import { hydrationConstant } from "../../shared-lib/equilibrium/constants/hydration.ts";

const toolkit = createStructureToolkit();

function inNeat(smiles: string, alcohol: string, fromHydration: boolean) {
  const reading = toolkit.read(smiles);
  const site = reading.ok ? reading.carbonyl?.sites.find((candidate) => candidate.leading) : undefined;
  if (!reading.ok || !site) throw new Error(smiles);
  const query = { temperatureK: 298.15, state: "neutral", correlationOnly: false } as const;
  const hydration = hydrationConstant(reading.canonicalSmiles, site, 1, query);
  if ("outside" in hydration) throw new Error(hydration.outside);
  const found = hemiacetalConstant(site, hydration, alcohol, 298.15, fromHydration);
  if (!found) throw new Error(alcohol);
  return found;
}

describe("hemiacetals, from the hydration constant and the alcohol's term", () => {
  it.each([
    [
      "4-nitrobenzaldehyde",
      "O=Cc1ccc(cc1)[N+](=O)[O-]",
      "methanol",
      2.4,
      "Young, Rodewald, Fuchs, Can. J. Chem. 1973, 51, 4122: 71 %",
    ],
    [
      "benzaldehyde",
      "O=Cc1ccccc1",
      "methanol",
      0.1,
      "Arora, Cox, Sørensen, J. Chem. Soc., Perkin Trans. 2 1979, 103 (recalled)",
    ],
    ["acetaldehyde", "CC=O", "methanol", 17, "Meadows, Darwent, Trans. Faraday Soc. 1952, 48, 1015 (recalled)"],
    ["acetaldehyde", "CC=O", "ethanol", 9, "Meadows, Darwent 1952 (recalled)"],
    ["2-methylpropanal", "CC(C)C=O", "methanol", 7, "Le Henaff 1968 (recalled)"],
    ["propanal", "CCC=O", "methanol", 12, "Le Henaff 1968 (recalled)"],
    [
      "formaldehyde",
      "C=O",
      "methanol",
      19500,
      "Schmitz et al., Ind. Eng. Chem. Res. 2015, 54, 12553: ln K = −1.9020 + 3512/T",
    ],
  ])("%s (%s) in %s: %d", (_, smiles, alcohol, k) => {
    const found = inNeat(smiles, alcohol, true);
    expect(found.method).toBe("correlated");
    expect(Math.abs(found.log10 - Math.log10(k))).toBeLessThan(1.96 * found.sd);
  });

  it("4-methoxy- and 4-dimethylaminobenzaldehyde: none seen in methanol (Young, Rodewald, Fuchs 1973)", () => {
    expect(inNeat("COc1ccc(C=O)cc1", "methanol", true).log10).toBeLessThan(Math.log10(0.02));
    expect(inNeat("CN(C)c1ccc(C=O)cc1", "methanol", true).log10).toBeLessThan(Math.log10(0.02));
  });

  it("methanol binds more than ethanol and 1-propanol, which are alike (NMR of aldehyde + alcohol mixtures, part II, abstract)", () => {
    const k = (alcohol: string): number => inNeat("CCCCCCC=O", alcohol, true).log10;
    expect(k("methanol")).toBeGreaterThan(k("ethanol"));
    expect(Math.abs(k("ethanol") - k("1-propanol"))).toBeLessThan(0.15);
  });

  it("chloral and fluoral are held as their alcoholates (common practice, no source)", () => {
    expect(inNeat("O=CC(Cl)(Cl)Cl", "ethanol", true).log10).toBeGreaterThan(4);
    expect(inNeat("O=CC(F)(F)F", "ethanol", true).log10).toBeGreaterThan(4);
  });
});

describe("ring–chain constants reach the compound however it is written", () => {
  const ring = (smiles: string) => {
    const reading = toolkit.read(smiles);
    const parent = reading.ok ? reading.carbonyl?.sites[0]?.parent : undefined;
    if (!reading.ok || parent === undefined) throw new Error(smiles);
    return ringChainOf(reading.canonicalSmiles, parent);
  };

  it("2-(hydroxymethyl)benzaldehyde 6.7, 2-(2-hydroxyethyl)benzaldehyde 20 (Harron et al., J. Org. Chem. 1981, 46, 903)", () => {
    expect(10 ** (ring("c1cccc(CO)c1C=O")?.log10 ?? 0)).toBeCloseTo(6.7, 0);
    expect(10 ** (ring("OCCc1ccccc1C=O")?.log10 ?? 0)).toBeGreaterThan(18);
  });

  it("glucose is far less open than idose; fructose between (Angyal, Adv. Carbohydr. Chem. Biochem. 1984, 42, 15; recalled)", () => {
    const glucose = ring("O=C[C@H](O)[C@@H](O)[C@H](O)[C@H](O)CO");
    const idose = ring("O=C[C@@H](O)[C@H](O)[C@@H](O)[C@H](O)CO");
    const fructose = ring("OCC(=O)[C@@H](O)[C@H](O)[C@H](O)CO");
    expect(glucose?.log10).toBeGreaterThan(4.4);
    expect(idose?.log10).toBeLessThan(3);
    expect(fructose?.log10).toBeLessThan(2.5);
    // Without stereo: the mean over the aldohexoses, with their scatter.
    const any = ring("O=CC(O)C(O)C(O)C(O)CO");
    expect(any?.sd).toBeGreaterThan(glucose?.sd ?? 1);
  });
});

describe("acidities and rates", () => {
  it("methanediol 13.27 (handbook table of dissociation constants), pyruvic acid apparent 2.2 to 2.5 (Pocker 1969; Fischer, Warneck 1991)", () => {
    expect(acidityOf("C=O", "gem-diol", "hydrate")?.pKa).toBeCloseTo(13.27, 2);
    const pyruvic = toolkit.read("CC(=O)C(=O)O");
    const parent = pyruvic.ok ? (pyruvic.carbonyl?.sites[0]?.parent ?? "") : "";
    const apparent = acidityOf(parent, "carboxylic acid", "apparent");
    expect(apparent?.pKa).toBeGreaterThan(2.1);
    expect(apparent?.pKa).toBeLessThan(2.6);
  });

  it("hydration over dehydration of formaldehyde is its constant (Winkelman et al. 2000 and 2002: 1270 at 25 °C)", () => {
    const forward = rateOf("C=O", "hydration", "water")?.k ?? 0;
    const back = rateOf("C=O", "dehydration", "water")?.k ?? 1;
    expect(forward / back).toBeGreaterThan(1100);
    expect(forward / back).toBeLessThan(1450);
  });
});

/** Activity of water, volumes and salt solutions against handbook data. */

import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { activitiesOf } from "../../shared-lib/media/activities.ts";
import { compositionOf } from "../../shared-lib/media/composition.ts";
import { iceActivity } from "../../shared-lib/media/ice.ts";
import { activityOverSalt, saltByKey, saltWaterActivity, saturatedActivity } from "../../shared-lib/media/salts.ts";
import { molesInMass, solventByKey } from "../../shared-lib/media/solvents.ts";
import { ethanolMassFraction } from "../../shared-lib/media/stock-media.ts";

function rowsOf(file: string): readonly (readonly string[])[] {
  return readFileSync(new URL(file, import.meta.url), "utf8")
    .split("\n")
    .filter((line) => line !== "" && !line.startsWith("#"))
    .slice(1)
    .map((line) => line.split("\t"));
}

describe("water beside an organic liquid, from freezing points and total pressures (sources in the table)", () => {
  const errors = rowsOf("./media-water-points.tsv").map(([type, organic = "", x, celsius, gamma]) => {
    const water = Number(x);
    const kelvin = Number(celsius) + 273.15;
    const composition = compositionOf(
      [
        { solvent: "water", amount: water },
        { solvent: organic, amount: 1 - water },
      ],
      kelvin,
    );
    const found = activitiesOf(composition, kelvin).activity.water ?? Number.NaN;
    return { type, organic, error: Math.abs(Math.log(found / (water * Number(gamma)))) };
  });
  const meanOf = (type: string): number => {
    const own = errors.filter((row) => row.type === type);
    return own.reduce((sum, row) => sum + row.error, 0) / own.length;
  };

  it("ln a of freezing solutions to 0.01 on average", () => {
    expect(errors.filter((row) => row.type === "freezing").length).toBeGreaterThan(50);
    expect(meanOf("freezing")).toBeLessThan(0.01);
  });
  it("and so the freezing point itself: the model's water is as active there as ice, to 0.03", () => {
    for (const [type, organic = "", x, celsius] of rowsOf("./media-water-points.tsv")) {
      if (type !== "freezing") continue;
      const kelvin = Number(celsius) + 273.15;
      const water = Number(x);
      const composition = compositionOf(
        [
          { solvent: "water", amount: water },
          { solvent: organic, amount: 1 - water },
        ],
        kelvin,
      );
      const found = activitiesOf(composition, kelvin).activity.water ?? Number.NaN;
      expect(Math.abs(found - iceActivity(kelvin)), `${organic} ${x}`).toBeLessThan(0.03);
    }
  });
  it("ln a of ethanol–water at 30 and 50 °C to 0.01 on average", () => {
    expect(meanOf("pressure")).toBeLessThan(0.01);
  });
});

describe("volumes", () => {
  it("are additive to 4 % against the densities of the CRC Handbook, and never too small by more than 0.5 %", () => {
    for (const [organic = "", share, density] of rowsOf("./media-densities.tsv")) {
      const solvent = solventByKey(organic);
      const water = solventByKey("water");
      if (!solvent || !water) throw new Error(`no solvent ${organic}`);
      const w = Number(share);
      const { volumeL } = compositionOf(
        [
          { solvent: "water", amount: molesInMass(water, 100 * (1 - w)) },
          { solvent: organic, amount: molesInMass(solvent, 100 * w) },
        ],
        293.15,
      );
      const measured = 0.1 / Number(density);
      expect(volumeL / measured, `${organic} ${share}`).toBeLessThan(1.04);
      expect(volumeL / measured, `${organic} ${share}`).toBeGreaterThan(0.995);
    }
  });

  // Mole fractions of water: 95 % by volume 0.173, 70 % 0.607, 50 % 0.776 (CRC Handbook densities, 20 °C).
  it.each([
    [95, 0.173],
    [70, 0.607],
    [50, 0.776],
  ])("ethanol of %d %% by volume", (percent, x) => {
    const w = ethanolMassFraction(percent);
    const water = (1 - w) / 18.015;
    expect(water / (water + w / 46.068)).toBeCloseTo(x, 2);
  });
});

describe("salts", () => {
  // Isopiestic data at 25 °C, independent of the freezing points in the table: Robinson, Stokes, Electrolyte Solutions (recalled). The table is
  // 0.012 high for 5 mol/kg of NaCl, where the freezing point lies 20 K below 0 °C.
  it.each([
    ["NaCl", 1, 0.9669],
    ["NaCl", 2, 0.9316],
    ["NaCl", 5, 0.8068],
    ["KCl", 1, 0.9682],
    ["KCl", 4, 0.868],
    ["LiCl", 1, 0.9636],
    ["CaCl2", 1, 0.9453],
    ["Na2SO4", 1, 0.966],
    ["H2SO4", 1, 0.962],
    ["HCl", 1, 0.9633],
    ["HCl", 3, 0.864],
    ["NaOH", 1, 0.9665],
    ["NaOH", 4, 0.852],
    ["sucrose", 1, 0.9806],
    ["urea", 5, 0.923],
  ])("%s at %d mol/kg: a_w = %f to 0.015", (key, molality, activity) => {
    const salt = saltByKey(key as string);
    if (!salt) throw new Error(`no salt ${key}`);
    expect(Math.abs(activityOverSalt(salt, molality as number, 298.15) - (activity as number))).toBeLessThan(0.015);
  });

  // Relative humidity at 25 °C over saturated solutions: Greenspan, J. Res. NBS 1977, 81A, 89, its own table (recalled).
  it.each([
    ["NaCl", 75.29],
    ["KCl", 84.34],
    ["LiCl", 11.3],
    ["MgCl2", 32.78],
    ["K2CO3", 43.16],
    ["Mg(NO3)2", 52.89],
    ["NaBr", 57.57],
    ["KI", 68.86],
    ["NH4Cl", 78.57],
    ["(NH4)2SO4", 80.99],
    ["KNO3", 93.58],
    ["K2SO4", 97.3],
    ["LiBr", 6.37],
    ["KOAc", 22.51],
  ])("saturated %s: %f %% to 0.6", (key, percent) => {
    const salt = saltByKey(key);
    if (!salt) throw new Error(`no salt ${key}`);
    expect(Math.abs((saturatedActivity(salt, 298.15) ?? 0) * 100 - percent)).toBeLessThan(0.6);
  });

  it("buffers below 0.2 M leave the water as it is; brine does not", () => {
    const over = (buffer: string, molarity?: number): number =>
      saltWaterActivity({ solutes: [], water: 55.5, buffer: { buffer, molarity } }, 298.15);
    expect(over("phosphate", 0.1)).toBeGreaterThan(0.995);
    expect(over("PBS")).toBeCloseTo(0.995, 3);
    expect(over("brine")).toBeCloseTo(0.753, 2);
  });
});

/** Processor time of a composition with its medium factor, beside a bare loop of the same number of logarithms: `npx tsx bench/media.mts`. */

import { mixtureBoilingPoint } from "../shared-lib/media/boiling.ts";
import { compositionOf } from "../shared-lib/media/composition.ts";
import { hemiacetalFactor, hydrationFactor } from "../shared-lib/media/medium-factor.ts";

const TRAITS = { ketoAcid: false, acidicDiol: false };
const MIXTURES: readonly (readonly string[])[] = [
  ["water"],
  ["water", "methanol"],
  ["water", "methanol", "acetone"],
  ["water", "DMSO"],
  ["water", "THF"],
  ["water", "acetonitrile", "methanol"],
  ["water", "DCM", "methanol"],
];
const RUNS = 20_000;

function microseconds(run: (k: number) => number): number {
  let sink = 0;
  for (let k = 0; k < RUNS; k++) sink += run(k);
  const start = process.cpuUsage();
  for (let k = 0; k < RUNS; k++) sink += run(k);
  const { user, system } = process.cpuUsage(start);
  return Number.isNaN(sink) ? Number.NaN : (user + system) / RUNS;
}

const baseline = microseconds((k) => {
  let sum = 0;
  for (let i = 1; i <= 100; i++) sum += Math.log(i + k);
  return sum;
});
console.log(`baseline, 100 logarithms: ${baseline.toFixed(2)} µs`);
for (const solvents of MIXTURES) {
  const time = microseconds((k) => {
    const parts = solvents.map((solvent, i) => ({ solvent, amount: 1 + i + k * 1e-7 }));
    const composition = compositionOf(parts, 298.15);
    const water = hydrationFactor(composition, 298.15, TRAITS).log10;
    return solvents.includes("methanol") ? water + hemiacetalFactor(composition, "methanol").log10 : water;
  });
  console.log(`${solvents.join(" + ")}: ${time.toFixed(2)} µs, ${(time / baseline).toFixed(1)} × baseline`);
}
const boiling = compositionOf(
  [
    { solvent: "water", amount: 1 },
    { solvent: "THF", amount: 1 },
  ],
  298.15,
);
const start = performance.now();
for (let k = 0; k < 100; k++) mixtureBoilingPoint(boiling);
console.log(`boiling point of THF–water: ${((performance.now() - start) / 100).toFixed(2)} ms`);

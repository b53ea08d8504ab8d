/**
 * Time of one warm estimate of a catalogue compound, and of a coupled flask of three carbonyls and four nucleophiles, beside a baseline of
 * this machine: JSON.stringify of the very answer. Time of the processor, not of the clock: medians of several rounds in microseconds.
 */
import { createLexicon } from "../shared-lib/compounds/create-lexicon.ts";
import type { Compound } from "../shared-lib/compounds/types.ts";
import { estimate } from "../shared-lib/equilibrium/estimate.ts";
import { speciate } from "../shared-lib/equilibrium/speciate.ts";
import type { Contents } from "../shared-lib/equilibrium/types.ts";

const ROUNDS = 15;
const CALLS = 2000;
const lexicon = createLexicon();

function known(name: string): Compound {
  const found = lexicon.find(name);
  if (!found || found === "needs structures") throw new Error(`${name} is not in the catalogue`);
  return found.compound;
}

/** Median over the rounds of the time of one call, µs. */
function microseconds(run: (call: number) => unknown): number {
  for (let call = 0; call < CALLS; call++) run(call);
  const rounds = Array.from({ length: ROUNDS }, () => {
    const start = process.cpuUsage();
    for (let call = 0; call < CALLS; call++) run(call);
    return process.cpuUsage(start).user / CALLS;
  });
  return rounds.sort((a, b) => a - b)[ROUNDS >> 1] as number;
}

const acetaldehyde = known("acetaldehyde");
const benzaldehyde = known("benzaldehyde");
const acetone = known("acetone");
const bisulfite = known("sodium bisulfite");
const cyanide = known("potassium cyanide");
const inWater = {
  input: "acetaldehyde",
  mediumText: "water",
  medium: [{ solvent: "water", amount: 55.3 }],
  temperatureK: 298.15,
};
const mixed = {
  ...inWater,
  mediumText: "THF/water",
  medium: [
    { solvent: "water", amount: 11 },
    { solvent: "THF", amount: 9.8 },
  ],
};
const answer = estimate(acetaldehyde, inWater);

/** Amounts change a little from call to call, so that no answer is a kept one. */
function flask(call: number, organic: string): Contents {
  const by = 1 + (call % 97) / 1000;
  return {
    temperatureK: 298.15,
    pH: 6,
    solvents: [
      { solvent: "water", amount: 1.1 * by },
      { solvent: "methanol", amount: 0.5 },
      { solvent: organic, amount: 0.2 },
    ],
    carbonyls: [
      { compound: acetaldehyde, amount: 0.05 },
      { compound: benzaldehyde, amount: 0.02 },
      { compound: acetone, amount: 0.03 },
    ],
    solutes: [
      { compound: bisulfite, amount: 0.02 },
      { compound: cyanide, amount: 0.01 },
    ],
  };
}

const rows: readonly (readonly [string, number])[] = [
  ["baseline: JSON.stringify of one estimate", microseconds(() => JSON.stringify(answer))],
  [
    "estimate, water, dilute (aim 50)",
    microseconds((call) => estimate(acetaldehyde, { ...inWater, concentration: call * 1e-12 })),
  ],
  [
    "estimate, water, 1 mol/L",
    microseconds((call) => estimate(acetaldehyde, { ...inWater, concentration: 1 + call * 1e-6 })),
  ],
  [
    "estimate, THF/water, 0.2 mol/L",
    microseconds((call) => estimate(acetaldehyde, { ...mixed, concentration: 0.2 + call * 1e-6 })),
  ],
  [
    "flask: 3 carbonyls, water, methanol, bisulfite, cyanide, ethanol (aim 100)",
    microseconds((call) => speciate(flask(call, "ethanol"))),
  ],
  ["the same with THF in place of ethanol", microseconds((call) => speciate(flask(call, "THF")))],
];
for (const [name, time] of rows) console.log(`${time.toFixed(1).padStart(8)} µs  ${name}`);

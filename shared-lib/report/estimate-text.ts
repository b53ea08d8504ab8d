/** An estimate as the terminal shows it. */

import { percentWithBounds } from "../advice/figures.ts";
import type { Estimate } from "../model/contract.ts";
import { duration } from "./card/share-words.ts";

/** Text of an estimate: forms with bounds, then how they were reached. */
export function estimateAsText(estimate: Estimate): string {
  const { compound, medium } = estimate;
  const lines = [
    `${compound.name ?? compound.input}  ${compound.smiles}  ${compound.formula}, ${compound.molarMass.toFixed(2)} g/mol`,
    `in ${medium.text} at ${(estimate.temperature - 273.15).toFixed(0)} °C${medium.pH === undefined ? "" : `, pH ${medium.pH}`}${estimate.concentration === undefined ? ", dilute" : `, ${estimate.concentration} mol/L`}`,
  ];
  if (estimate.outside !== undefined) return `${[...lines, `No estimate: ${estimate.outside}.`].join("\n")}\n`;
  lines.push("");
  for (const form of estimate.forms) lines.push(`  ${form.label.padEnd(34)} ${percentWithBounds(form.fraction)}`);
  if (estimate.time)
    lines.push(
      `  half-life of the approach to equilibrium: ${duration(estimate.time.halfLife.value)} (${duration(estimate.time.halfLife.low)} to ${duration(estimate.time.halfLife.high)}), from the ${estimate.time.basis}`,
    );
  lines.push("", "How it was reached (bounds: central 95 %)");
  for (const line of estimate.derivation)
    lines.push(`  - ${line.says}${line.value ? `: ${line.value}` : ""}${line.source ? ` [${line.source}]` : ""}`);
  for (const caution of estimate.cautions) lines.push(`  ! ${caution}`);
  return `${lines.join("\n")}\n`;
}

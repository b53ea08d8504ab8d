/** Where ice forms in a cooled aqueous liquid. */

/** Ice at 0 °C: enthalpy of fusion, J/mol, and heat capacity of water over that of ice, J/(mol K) (handbook values, recalled). */
const FUSION = 6008;
const FUSION_CAPACITY = 38.1;
const GAS = 8.314462618;
const MELTING_K = 273.15;

/** Activity of water in a liquid in equilibrium with ice (Schröder's equation with a constant difference of heat capacities); 1 from 0 °C on. */
export function iceActivity(temperatureK: number): number {
  if (temperatureK >= MELTING_K) return 1;
  const ratio = MELTING_K / temperatureK;
  return Math.exp(
    (-FUSION / (GAS * MELTING_K)) * (ratio - 1) + (FUSION_CAPACITY / GAS) * (ratio - 1 - Math.log(ratio)),
  );
}

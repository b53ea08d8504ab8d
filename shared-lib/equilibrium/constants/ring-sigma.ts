/**
 * Effective σ of a heteroaromatic ring in place of phenyl, by ring and place of the carbonyl. Replacement constants of the ring atom
 * as in the reviews of the Hammett equation for heterocycles (Jaffé, Jones, Adv. Heterocycl. Chem. 1964, 3, 209; recalled), so each
 * carries its own error; protonated rings from the pyridine values plus what protonation adds.
 */

export interface RingSigma {
  readonly sigma: number;
  readonly sd: number;
}

const TABLE: Readonly<Record<string, RingSigma>> = {
  benzene: { sigma: 0, sd: 0 },
  "pyridine-2": { sigma: 0.9, sd: 0.2 },
  "pyridine-3": { sigma: 0.65, sd: 0.12 },
  "pyridine-4": { sigma: 1.1, sd: 0.2 },
  "pyrimidine-2": { sigma: 1.7, sd: 0.35 },
  "pyrimidine-4": { sigma: 1.8, sd: 0.35 },
  "pyrimidine-5": { sigma: 1.2, sd: 0.3 },
  pyrazine: { sigma: 1.4, sd: 0.3 },
  "pyridazine-3": { sigma: 1.4, sd: 0.35 },
  "pyridazine-4": { sigma: 1.5, sd: 0.35 },
  triazine: { sigma: 2.4, sd: 0.5 },
  "pyridinium-2": { sigma: 2.2, sd: 0.35 },
  "pyridinium-3": { sigma: 1.7, sd: 0.35 },
  "pyridinium-4": { sigma: 2.2, sd: 0.35 },
  "imidazole-2": { sigma: 0.6, sd: 0.35 },
  "imidazole-4": { sigma: -0.3, sd: 0.35 },
  "imidazolium-2": { sigma: 2.6, sd: 0.4 },
  "imidazolium-4": { sigma: 0.9, sd: 0.35 },
  "pyrazole-3": { sigma: 0.1, sd: 0.35 },
  "pyrazole-4": { sigma: -0.5, sd: 0.35 },
  "thiazole-2": { sigma: 0.9, sd: 0.3 },
  "thiazole-4": { sigma: 0.5, sd: 0.3 },
  "thiazole-5": { sigma: 0.5, sd: 0.3 },
  "oxazole-2": { sigma: 1, sd: 0.35 },
  "oxazole-4": { sigma: 0.5, sd: 0.3 },
  "oxazole-5": { sigma: 0.6, sd: 0.3 },
  "isoxazole-3": { sigma: 0.9, sd: 0.35 },
  "isoxazole-4": { sigma: 0.4, sd: 0.35 },
  "isoxazole-5": { sigma: 0.9, sd: 0.35 },
  "furan-2": { sigma: -0.4, sd: 0.3 },
  "furan-3": { sigma: -0.3, sd: 0.3 },
  "thiophene-2": { sigma: -0.4, sd: 0.3 },
  "thiophene-3": { sigma: -0.3, sd: 0.3 },
  "pyrrole-2": { sigma: -1.5, sd: 0.35 },
  "pyrrole-3": { sigma: -1.5, sd: 0.35 },
};

/** A ring that the table lacks: nothing known of its direction, so a wide error. */
const UNKNOWN: RingSigma = { sigma: 0, sd: 0.6 };

/** Effective σ of the ring that perception names. */
export function ringSigma(ring: string): RingSigma {
  return TABLE[ring] ?? UNKNOWN;
}

/** The same ring with its N protonated, where the table knows it. */
export function protonated(ring: string): string | undefined {
  const name = ring.replace("pyridine", "pyridinium").replace("imidazole", "imidazolium");
  return name !== ring && TABLE[name] ? name : undefined;
}

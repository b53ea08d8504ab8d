/**
 * Formaldehyde in water and methanol: glycols HO(CH2O)nH, hemiformals HO(CH2O)nCH3 and a trace of free CH2O, by a chain model in ideal mole
 * fractions. Chain constants back-calculated from the distribution at 40 wt% and 35 °C (Reuss et al., Ullmann, "Formaldehyde");
 * exchange with methanol from the constants of Hahnenstein et al. and Schmitz et al. 2015. Both chain steps are nearly athermal.
 */

/** 2 HOCH2OH = HO(CH2O)2H + H2O, and each further unit. */
const DIMER = 2.71;
const CHAIN = 4.23;
/** HOCH2OH + CH3OH = HOCH2OCH3 + H2O; ln K = 0.423 + 933/T. */
function exchange(temperatureK: number): number {
  return Math.exp(0.423 + 933 / temperatureK);
}

export interface FormaldehydeForms {
  /** mol of formaldehyde units in each kind. */
  readonly glycol: number;
  readonly longerGlycols: number;
  readonly hemiformal: number;
  readonly longerHemiformals: number;
  /** mol left free. */
  readonly water: number;
  readonly methanol: number;
  /** mole fraction of water, for the trace of free CH2O. */
  readonly waterFraction: number;
}

interface Balance {
  readonly molecules: number;
  readonly units: number;
  readonly water: number;
  readonly methanol: number;
}

/** Sums of a chain whose n-th member is first·q^(n−1) from n = 2 on, with the dimer step differing: Σ members and Σ n·members. */
function chainSums(first: number, dimerRatio: number, q: number): { members: number; units: number } {
  const second = first * dimerRatio;
  const rest = second / (1 - q);
  return { members: first + rest, units: first + second * (2 / (1 - q) + q / (1 - q) ** 2) };
}

/** Per mole of all molecules: what the mole fractions x1 (glycol), xw and xm stand for. */
function balanceOf(
  x1: number,
  xw: number,
  xm: number,
  kExchange: number,
): Balance & { glycolUnits: number; hemi: number; hemiUnits: number } {
  const q = Math.min(0.999, (CHAIN * x1) / xw);
  const dimerRatio = (DIMER * x1) / xw;
  const glycols = chainSums(x1, dimerRatio, q);
  const hemi = (kExchange * x1 * xm) / xw;
  const hemis = chainSums(hemi, dimerRatio, q);
  return {
    molecules: xw + xm + glycols.members + hemis.members,
    units: glycols.units + hemis.units,
    // Each glycol holds one water, each hemiformal one methanol.
    water: xw + glycols.members,
    methanol: xm + hemis.members,
    glycolUnits: glycols.units,
    hemi,
    hemiUnits: hemis.units,
  };
}

const MOST_PASSES = 200;

/**
 * Distribution of formaldehyde over its forms.
 *
 * @param formaldehyde mol of CH2O in all forms; @param water and @param methanol mol in all forms
 * @returns undefined when there is neither water nor methanol to hold it
 */
export function formaldehydeForms(
  formaldehyde: number,
  water: number,
  methanol: number,
  temperatureK: number,
): FormaldehydeForms | undefined {
  if (!(water > 0) || !(formaldehyde > 0)) return undefined;
  const k = exchange(temperatureK);
  const wanted = { units: formaldehyde / water, methanol: methanol / water };
  // Outer bisection on x1/xw (monotone in the formaldehyde held), inner one on xm/xw (monotone in the methanol held): both always end.
  const solveMethanol = (s: number): number => {
    if (methanol <= 0) return 0;
    let low = 0;
    let high = wanted.methanol * (1 + wanted.units) + 10;
    for (let pass = 0; pass < MOST_PASSES / 2; pass++) {
      const t = (low + high) / 2;
      const b = balanceOf(s, 1, t, k);
      if (b.methanol / b.water > wanted.methanol) high = t;
      else low = t;
    }
    return (low + high) / 2;
  };
  // The ratios s = x1/xw and t = xm/xw determine everything: with xw = 1 as the unit, q = CHAIN·s must stay below 1.
  let low = 0;
  let high = 0.999 / CHAIN;
  for (let pass = 0; pass < MOST_PASSES / 2; pass++) {
    const s = (low + high) / 2;
    const b = balanceOf(s, 1, solveMethanol(s), k);
    if (b.units / b.water > wanted.units) high = s;
    else low = s;
  }
  const s = (low + high) / 2;
  const t = solveMethanol(s);
  const b = balanceOf(s, 1, t, k);
  const scale = formaldehyde / b.units;
  return {
    glycol: s * scale,
    longerGlycols: (b.glycolUnits - s) * scale,
    hemiformal: b.hemi * scale,
    longerHemiformals: (b.hemiUnits - b.hemi) * scale,
    water: scale,
    methanol: t * scale,
    waterFraction: 1 / b.molecules,
  };
}

/** All findings, in the order in which the margin and the README list them. */

import type { FindingRule } from "../types.ts";
import { acetalWillForm } from "./acetal-will-form.ts";
import { amountsDisagree } from "./amounts-disagree.ts";
import { boundByNucleophile } from "./bound-by-nucleophile.ts";
import { hazardCaution } from "./hazard-caution.ts";
import { impossibleConcentration } from "./impossible-concentration.ts";
import { longStandingSolution } from "./long-standing-solution.ts";
import { methanolFromFormalin } from "./methanol-from-formalin.ts";
import { mostlyHemiacetal } from "./mostly-hemiacetal.ts";
import { mostlyHydrated } from "./mostly-hydrated.ts";
import { noDensity } from "./no-density.ts";
import { notAtEquilibrium } from "./not-at-equilibrium.ts";
import { oligomerNotReleased } from "./oligomer-not-released.ts";
import { outOfDate } from "./out-of-date.ts";
import { outsideModel } from "./outside-model.ts";
import { readingProblem } from "./reading-problem.ts";
import { ringClosed } from "./ring-closed.ts";
import { waterCarriedIn } from "./water-carried-in.ts";
import { weighedAsAnotherForm } from "./weighed-as-another-form.ts";

export const FINDINGS: readonly FindingRule[] = [
  mostlyHydrated,
  mostlyHemiacetal,
  ringClosed,
  oligomerNotReleased,
  weighedAsAnotherForm,
  amountsDisagree,
  impossibleConcentration,
  noDensity,
  waterCarriedIn,
  methanolFromFormalin,
  boundByNucleophile,
  acetalWillForm,
  notAtEquilibrium,
  longStandingSolution,
  outsideModel,
  outOfDate,
  hazardCaution,
  readingProblem,
];

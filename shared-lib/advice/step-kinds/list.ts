/** The step kinds, the more special before the more general: the first that fits is taken. */

import { acetal } from "./acetal.ts";
import { bioconjugation } from "./bioconjugation.ts";
import { bisulfiteAdduct } from "./bisulfite-adduct.ts";
import { carbonAcidAddition } from "./carbon-acid-addition.ts";
import { crossLinking } from "./cross-linking.ts";
import { cyanohydrin } from "./cyanohydrin.ts";
import { dissolution } from "./dissolution.ts";
import { hydrazone } from "./hydrazone.ts";
import { hydrideReduction } from "./hydride-reduction.ts";
import { imine } from "./imine.ts";
import { mannich } from "./mannich.ts";
import { organometallic } from "./organometallic.ts";
import { oxidationOfHydrate } from "./oxidation-of-hydrate.ts";
import { oxime } from "./oxime.ts";
import { phosphonateOlefination } from "./phosphonate-olefination.ts";
import { reductiveAmination } from "./reductive-amination.ts";
import { strecker } from "./strecker.ts";
import { strongHydride } from "./strong-hydride.ts";
import type { StepKind } from "./types.ts";
import { ylideOlefination } from "./ylide-olefination.ts";

export const STEP_KINDS: readonly StepKind[] = [
  crossLinking,
  organometallic,
  strongHydride,
  ylideOlefination,
  phosphonateOlefination,
  oxidationOfHydrate,
  oxime,
  hydrazone,
  strecker,
  cyanohydrin,
  bisulfiteAdduct,
  reductiveAmination,
  hydrideReduction,
  mannich,
  carbonAcidAddition,
  imine,
  acetal,
  bioconjugation,
  dissolution,
];

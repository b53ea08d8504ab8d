/** All findings, in the order in which the margin and the README list them. */

import type { FindingRule } from "../types.ts";
import { mostlyHemiacetal } from "./mostly-hemiacetal.ts";
import { mostlyHydrated } from "./mostly-hydrated.ts";
import { ringClosed } from "./ring-closed.ts";

export const FINDINGS: readonly FindingRule[] = [mostlyHydrated, mostlyHemiacetal, ringClosed];

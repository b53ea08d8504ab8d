/** The structure toolkit as a script that the worker loads on first need. */

import { createStructureToolkit } from "../shared-lib/compounds/structure.ts";

(globalThis as { oxomarginStructures?: typeof createStructureToolkit }).oxomarginStructures = createStructureToolkit;

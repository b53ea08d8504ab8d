/** Versions of the program and of the tables it computes from. */

import { version } from "../../package.json";
import { tables } from "../../shared-lib/generated/tables-version.json";

export const VERSION: string = version;
/** Changes with any row of any table. */
export const TABLES_VERSION: string = tables;

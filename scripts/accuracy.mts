/**
 * Prints how well the correlation for hydration constants does: per class n, bias, RMSE, leave-one-out RMSE and the share of measured
 * constants inside the leave-one-out 95 % interval; then the constants that the fit never saw, and published bounds.
 * Run with `npm run accuracy`.
 */
import { accuracyReport } from "./fit/accuracy-report.mts";

console.log(accuracyReport());

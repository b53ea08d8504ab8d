/** σ* put together from parts against the table's published values (Taft in Newman (ed.), Steric Effects in Organic Chemistry, 1956). */

import { Molecule } from "openchemlib";
import { expect, it } from "vitest";
import { readTsv } from "../../../scripts/tables/read-tsv.mts";
import { atomAt } from "../../../shared-lib/compounds/perception/graph.ts";
import { sigmaStarFromParts, sigmaStarOf } from "../../../shared-lib/compounds/perception/sigma-star.ts";
import { graphOf } from "../../../shared-lib/compounds/structure.ts";

/** The table's groups that hang by an sp3 carbon, with the value from their parts and the value that perception gives. */
async function groups() {
  const rows = await readTsv("shared-lib/constants/taft.tsv", ["group", "fragment", "sigma_star"]);
  return rows.flatMap((row) => {
    const molecule = Molecule.fromSmiles(row.cells.fragment ?? "", { noCoordinates: true });
    molecule.ensureHelperArrays(Molecule.cHelperRings);
    const graph = graphOf(molecule);
    const mark = graph.atoms.findIndex((atom) => atom.element === "At");
    const root = atomAt(graph, mark).neighbours[0]?.atom ?? -1;
    const atom = atomAt(graph, root);
    if (atom.element !== "C" || atom.neighbours.some((bond) => bond.order > 1)) return [];
    const tabled = Number(row.cells.sigma_star);
    const found = sigmaStarOf(graph, root, mark);
    return [{ group: row.cells.group, tabled, parts: sigmaStarFromParts(graph, root, mark), found }];
  });
}

it("misses 60 and more published values by 0.13 at most, root mean square, without bias", async () => {
  const all = await groups();
  expect(all.length).toBeGreaterThan(60);
  const errors = all.map((row) => row.parts - row.tabled);
  expect(Math.sqrt(errors.reduce((sum, error) => sum + error ** 2, 0) / errors.length)).toBeLessThan(0.13);
  expect(Math.abs(errors.reduce((sum, error) => sum + error, 0) / errors.length)).toBeLessThan(0.05);
});

it("takes the published value where the table holds the group, and says so", async () => {
  for (const { group, tabled, found } of await groups())
    if (!found.extrapolated) expect(found.sigma, group).toBe(tabled);
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { buildTimeline } from "../../shared-lib/flask/timeline.ts";
import { DEFAULT_SETTINGS } from "../../shared-lib/model/settings.ts";
import type { NoteReading } from "../../shared-lib/notes/types.ts";
import { lexicon } from "../advice/analyse.ts";
import { medium, quantity, readingOf } from "./by-hand.ts";

const timelineOf = (reading: NoteReading) => buildTimeline(reading, DEFAULT_SETTINGS, lexicon);

const water = (volumeL: number) => ({ solvent: "water", words: "water", volumeL, basis: "volume" as const });
const methanol = (volumeL: number) => ({ solvent: "methanol", words: "methanol", volumeL, basis: "volume" as const });

function amountIn(contents: { solvents: readonly { solvent: string; amount: number }[] }, solvent: string): number {
  return contents.solvents.find((row) => row.solvent === solvent)?.amount ?? 0;
}

describe("a charge in real amounts", () => {
  it("comes from the mass, the volume and density, the molarity, or the equivalents", () => {
    const { charges } = timelineOf(
      readingOf([
        { name: "benzaldehyde", amounts: [quantity("mass", 10.612), quantity("equivalents", 1)] },
        { name: "acetaldehyde", amounts: [quantity("volume", 0.01)] },
        { name: "n-butyllithium", amounts: [quantity("concentration", 2.5), quantity("volume", 0.04)] },
        { name: "benzylamine", amounts: [quantity("equivalents", 1.5)] },
      ]),
    );
    const [first, second, third, fourth] = charges;
    // Molar masses from formulas; acetaldehyde 0.785 g/mL (catalogue).
    expect(first?.total?.value).toBeCloseTo(0.1, 4);
    expect(second?.total?.value).toBeCloseTo((10 * 0.785) / 44.053, 4);
    expect(third?.total?.value).toBeCloseTo(0.1, 9);
    expect(fourth?.total?.value).toBeCloseTo(0.15, 4);
    expect(fourth?.massG).toBeCloseTo(0.15 * 107.15, 1);
  });

  it("takes the assay of the note before that of the form", () => {
    const { charges } = timelineOf(
      readingOf([{ name: "formalin", amounts: [quantity("mass", 10), quantity("assay", 0.3)] }]),
    );
    expect(charges[0]?.total?.value).toBeCloseTo(3 / 30.026, 4);
    const carried = charges[0]?.brings.reduce(
      (sum, row) => sum + row.amount * (row.solvent === "water" ? 18.015 : 32.042),
      0,
    );
    expect(carried).toBeCloseTo(7, 1);
  });

  it("has bounds around it, wider for an approximate figure", () => {
    const of = (approximate: boolean) =>
      timelineOf(readingOf([{ name: "benzaldehyde", amounts: [quantity("mass", 10.6, { approximate })] }])).charges[0]
        ?.total;
    expect(of(true)?.low).toBeLessThan(of(false)?.low ?? 0);
    expect(of(true)?.high).toBeGreaterThan(of(false)?.high ?? 1);
  });

  it("has no total when none follows", () => {
    const of = (name: string, ...amounts: ReturnType<typeof quantity>[]) =>
      timelineOf(readingOf([{ name, amounts }])).charges[0];
    expect(of("4-nitrobenzaldehyde", quantity("volume", 0.01))?.total).toBeUndefined();
    expect(of("benzaldehyde", quantity("mass", -3))?.total).toBeUndefined();
    expect(of("benzaldehyde", quantity("mass", 0))?.total).toBeUndefined();
    expect(of("benzaldehyde", quantity("mass", Number.NaN))?.total).toBeUndefined();
    expect(of("benzaldehyde", quantity("equivalents", 1))?.total).toBeUndefined();
  });

  it("is a part of it where the note charges a part", () => {
    const { charges } = timelineOf(
      readingOf([{ name: "benzaldehyde", amounts: [quantity("mass", 10.612)], share: 0.5 }]),
    );
    expect(charges[0]?.total?.value).toBeCloseTo(0.05, 4);
  });
});

describe("the flask over time", () => {
  it("adds up what comes in, and what a charge brings", () => {
    const { moments } = timelineOf(
      readingOf(
        [{ name: "formalin", amounts: [quantity("mass", 10)] }],
        [medium([water(0.1)]), medium([methanol(0.05)])],
        [
          { kind: "charge", charge: 0 },
          { kind: "medium", medium: 0 },
          { kind: "medium", medium: 1 },
        ],
      ),
    );
    expect(moments).toHaveLength(3);
    // 100 mL of water at 0.997 g/mL is 5.53 mol (CRC Handbook density), and 10 g of formalin bring 0.28 mol.
    expect(amountIn(moments[1]?.contents ?? { solvents: [] }, "water")).toBeCloseTo(5.53 + 0.28, 1);
    expect(amountIn(moments[2]?.contents ?? { solvents: [] }, "methanol")).toBeCloseTo(1.227 + 0.037, 1);
  });

  it("follows temperature, pH, hold, evaporation, transfer and the end of the step", () => {
    const { moments } = timelineOf(
      readingOf(
        [
          { name: "benzaldehyde", amounts: [quantity("mass", 10.6)] },
          { name: "benzylamine", amounts: [quantity("mass", 10.7)] },
        ],
        [medium([water(0.1)])],
        [
          { kind: "charge", charge: 0, vessel: 1 },
          { kind: "medium", medium: 0 },
          { kind: "transfer", from: 1 },
          { kind: "temperature", kelvin: 353.15, reflux: false },
          { kind: "pH", pH: 4 },
          { kind: "hold", seconds: 3600 },
          { kind: "remove", what: "water" },
          { kind: "work-up" },
          { kind: "charge", charge: 1 },
        ],
      ),
    );
    const poured = moments[2];
    expect(poured?.contents.carbonyls.map(({ compound }) => compound.id)).toEqual(["benzaldehyde"]);
    expect(moments[4]).toMatchObject({ contents: { temperatureK: 353.15, pH: 4 }, heldSeconds: 3600, pHStated: true });
    expect(amountIn(moments[5]?.contents ?? { solvents: [] }, "water")).toBe(0);
    expect(moments).toHaveLength(6);
  });

  it("boils water at 373 K when it is refluxed", () => {
    const { moments } = timelineOf(
      readingOf(
        [],
        [medium([water(0.1)])],
        [
          { kind: "medium", medium: 0 },
          { kind: "temperature", kelvin: 298, reflux: true },
        ],
      ),
    );
    expect(moments[1]?.contents.temperatureK).toBeCloseTo(373.1, 0);
  });

  it("reads a ratio by volume or mass, and takes a usual volume where none is written", () => {
    const ratio = (basis: "volume" | "mass") => {
      const parts = [
        { solvent: "water", words: "water", part: 1, basis },
        { solvent: "THF", words: "THF", part: 4, basis },
      ];
      return timelineOf(readingOf([], [medium(parts, { volumeL: 0.1 })], [{ kind: "medium", medium: 0 }])).moments[0];
    };
    expect(amountIn(ratio("volume")?.contents ?? { solvents: [] }, "water")).toBeCloseTo((20 * 0.997) / 18.015, 2);
    expect(amountIn(ratio("mass")?.contents ?? { solvents: [] }, "water")).toBeLessThan((20 * 0.997) / 18.015);
    const unsized = timelineOf(
      readingOf(
        [{ name: "benzaldehyde", amounts: [quantity("mass", 10.612)] }],
        [medium([{ solvent: "water", words: "water", part: 1, basis: "volume" }])],
        [
          { kind: "charge", charge: 0 },
          { kind: "medium", medium: 0 },
        ],
      ),
    ).moments[1];
    expect(unsized?.volumeStated).toBe(false);
    expect(amountIn(unsized?.contents ?? { solvents: [] }, "water")).toBeCloseTo((500 * 0.997) / 18.015, 1);
  });

  it("derives the pH of hydroxide in excess, and of none", () => {
    const of = (grams: number) =>
      timelineOf(
        readingOf(
          [
            { name: "sodium hydroxide", amounts: [quantity("mass", grams)] },
            { name: "acetic acid", amounts: [quantity("mass", 6.005)] },
          ],
          [medium([water(1)])],
          [
            { kind: "charge", charge: 0 },
            { kind: "charge", charge: 1 },
            { kind: "medium", medium: 0 },
          ],
        ),
      ).moments.at(-1)?.contents.pH;
    expect(of(8)).toBeCloseTo(13, 0);
    expect(of(4)).toBeUndefined();
  });

  it("turns a buffer into water with its pH, moved by temperature", () => {
    const buffer = { solvent: "Tris", words: "Tris", volumeL: 0.1, basis: "volume" as const, molarity: 0.05 };
    const { moments } = timelineOf(
      readingOf(
        [],
        [medium([buffer], { pH: 8 })],
        [
          { kind: "medium", medium: 0 },
          { kind: "temperature", kelvin: 278.15, reflux: false },
        ],
      ),
    );
    expect(amountIn(moments[0]?.contents ?? { solvents: [] }, "water")).toBeCloseTo(5.53, 1);
    expect(moments[0]?.contents.buffer).toMatchObject({ buffer: "Tris", molarity: 0.05 });
    // dpKa/dT of Tris −0.028 per K (Goldberg, Kishore and Lennen, J. Phys. Chem. Ref. Data 2002, 31, 231).
    expect(moments[1]?.contents.pH).toBeCloseTo(8 + 0.028 * 20, 1);
  });

  it("never gives a figure that is not finite and positive, whatever is written", () => {
    const figure = fc.oneof(fc.double(), fc.constantFrom(0, -1, 1e-300, 1e300, Number.NaN, Number.POSITIVE_INFINITY));
    const kind = fc.constantFrom("mass", "volume", "amount", "equivalents", "concentration", "assay", "density");
    const charge = fc.record({
      name: fc.constantFrom("formalin", "chloral hydrate", "benzaldehyde", "acetone", "methanol", "sodium hydroxide"),
      amounts: fc.array(
        fc.tuple(kind, figure).map(([of, base]) => quantity(of, base)),
        { maxLength: 5 },
      ),
    });
    const part = fc.record({
      solvent: fc.constantFrom("water", "methanol", "THF", "nonsense", "Tris"),
      words: fc.constant("x"),
      volumeL: figure,
      basis: fc.constantFrom("volume", "mass", "mole"),
    });
    fc.assert(
      fc.property(fc.array(charge, { maxLength: 4 }), fc.array(part, { maxLength: 3 }), (charges, parts) => {
        const events = [
          ...charges.map((_, i) => ({ kind: "charge", charge: i }) as const),
          { kind: "medium", medium: 0 } as const,
        ];
        const timeline = timelineOf(readingOf(charges, [medium(parts)], events));
        const figures = JSON.stringify(timeline, (_, value) => {
          if (typeof value === "number" && !Number.isFinite(value)) throw new Error("a figure that is not finite");
          return value;
        });
        expect(figures).toBeTypeOf("string");
        for (const { total } of timeline.charges) {
          if (!total) continue;
          expect(total.low).toBeLessThanOrEqual(total.value);
          expect(total.high).toBeGreaterThanOrEqual(total.value);
        }
      }),
      { numRuns: 500, seed: 11 },
    );
  });
});

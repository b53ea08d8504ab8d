/** Shares of the forms as a bar of inline SVG: patterns tell the forms apart in print and without colour. */

import { percent } from "../advice/figures.ts";
import type { FormKind, FormShare } from "../model/contract.ts";
import { escapeHtml } from "./escape-html.ts";

const WIDTH = 240;
const HEIGHT = 14;

/** Hatching of a form: the slope of its lines and their distance; free carbonyl stays blank. */
const HATCH: Readonly<Record<FormKind, { readonly angle: number; readonly gap: number } | undefined>> = {
  "free carbonyl": undefined,
  hydrate: { angle: 45, gap: 5 },
  "hydrate anion": { angle: 45, gap: 2.5 },
  hemiacetal: { angle: 135, gap: 5 },
  "cyclic hemiacetal": { angle: 135, gap: 2.5 },
  enol: { angle: 90, gap: 5 },
  oligomer: { angle: 0, gap: 2.5 },
  "iminium or imine": { angle: 90, gap: 2.5 },
  other: { angle: 0, gap: 5 },
};

const idOf = (kind: FormKind): string => `form-${kind.replaceAll(" ", "-")}`;

/** The hatchings, once a page. */
export function hatchings(): string {
  const patterns = Object.entries(HATCH).flatMap(([kind, hatch]) =>
    hatch
      ? [
          `<pattern id="${idOf(kind as FormKind)}" width="${hatch.gap}" height="${hatch.gap}" patternUnits="userSpaceOnUse" patternTransform="rotate(${hatch.angle})"><rect width="${hatch.gap}" height="${hatch.gap}" fill="#fff"/><line y2="${hatch.gap}" stroke="#24464d" stroke-width="1.6"/></pattern>`,
        ]
      : [],
  );
  return `<svg width="0" height="0" aria-hidden="true"><defs>${patterns.join("")}</defs></svg>`;
}

/** A bar of the shares; its label says the same in words. */
export function barOf(forms: readonly FormShare[]): string {
  let x = 0;
  const parts = forms.map((form) => {
    const width = form.fraction.value * WIDTH;
    const fill = HATCH[form.kind] ? `url(#${idOf(form.kind)})` : "#fff";
    const part = `<rect x="${x.toFixed(1)}" width="${width.toFixed(1)}" height="${HEIGHT}" fill="${fill}" stroke="#24464d" stroke-width="0.8"/>`;
    x += width;
    return width < 0.05 ? "" : part;
  });
  const label = forms.map((form) => `${form.label} ${percent(form.fraction.value)}`).join(", ");
  return `<svg role="img" aria-label="${escapeHtml(label)}" width="${WIDTH}" height="${HEIGHT}" viewBox="0 0 ${WIDTH} ${HEIGHT}">${parts.join("")}</svg>`;
}

/** A patch of one form's hatching for its line in the table. */
export function patchOf(kind: FormKind): string {
  const fill = HATCH[kind] ? `url(#${idOf(kind)})` : "#fff";
  return `<svg width="12" height="12" aria-hidden="true"><rect width="12" height="12" fill="${fill}" stroke="#24464d"/></svg>`;
}

/** The plot as an SVG file that stands alone: axes with figures, bounds, lines, the note's point and the names. */

import type { Curve, Curves } from "../../../../server/protocol.ts";
import { DASHES, themeColour } from "./plot.ts";

const SIZE = { width: 720, height: 420, left: 60, right: 20, top: 30, bottom: 50 };

export function svgOf(curves: Curves): string {
  const { width, height, left, right, top, bottom } = SIZE;
  const log = curves.axis === "concentration";
  const scale = (value: number): number => (log ? Math.log10(Math.max(value, 1e-12)) : value);
  const first = scale(curves.x[0] ?? 0);
  const last = scale(curves.x[curves.x.length - 1] ?? 1);
  const x = (value: number): number => left + ((scale(value) - first) / (last - first || 1)) * (width - left - right);
  const y = (share: number): number => top + (1 - share) * (height - top - bottom);
  const points = (values: readonly number[]): string[] =>
    values.map((share, i) => `${round(x(curves.x[i] ?? 0))},${round(y(share))}`);
  const lines = curves.curves.map((curve, index) => lineMarkup(curve, index, points));
  const here = round(x(curves.here));
  const inside = here >= left && here <= width - right;
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" font-family="sans-serif" font-size="12">`,
    `<rect width="100%" height="100%" fill="white"/>`,
    `<text x="${left}" y="18" font-size="14">${escapeXml(curves.title)}: ${escapeXml(curves.conditions)}</text>`,
    ...[0, 0.25, 0.5, 0.75, 1].map(
      (share) =>
        `<line x1="${left}" x2="${width - right}" y1="${y(share)}" y2="${y(share)}" stroke="#ddd"/><text x="${left - 6}" y="${y(share) + 4}" text-anchor="end">${share * 100}</text>`,
    ),
    ...tickValues(curves.x).map(
      (value) =>
        `<text x="${round(x(value))}" y="${height - bottom + 16}" text-anchor="middle">${Number(value.toPrecision(3))}</text>`,
    ),
    `<text x="${(left + width - right) / 2}" y="${height - 10}" text-anchor="middle">${escapeXml(curves.axisLabel)}</text>`,
    `<text transform="translate(16 ${height / 2}) rotate(-90)" text-anchor="middle">Share of the form (%)</text>`,
    ...lines,
    ...(inside
      ? [`<line x1="${here}" x2="${here}" y1="${top}" y2="${height - bottom}" stroke="black" stroke-width="1.5"/>`]
      : []),
    "</svg>",
  ].join("\n");
}

function lineMarkup(curve: Curve, index: number, points: (values: readonly number[]) => string[]): string {
  const colour = themeColour(index);
  const band = [...points(curve.high), ...points(curve.low).reverse()].join(" ");
  const dash = (DASHES[index % DASHES.length] ?? []).join(" ");
  const end = points(curve.value).at(Math.floor(curve.value.length * 0.8)) ?? "0,0";
  const [x, y] = end.split(",");
  return `<polygon points="${band}" fill="${colour}" fill-opacity="0.15"/><polyline points="${points(curve.value).join(" ")}" fill="none" stroke="${colour}" stroke-width="2" stroke-dasharray="${dash}"/><text x="${x}" y="${Number(y) - 6}" fill="${colour}">${escapeXml(curve.label)}</text>`;
}

function tickValues(x: readonly number[]): number[] {
  return [0, 0.25, 0.5, 0.75, 1].map((part) => x[Math.round(part * (x.length - 1))] ?? 0);
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}

function escapeXml(text: string): string {
  return text.replaceAll("&", "&amp;").replaceAll("<", "&lt;").replaceAll(">", "&gt;").replaceAll('"', "&quot;");
}

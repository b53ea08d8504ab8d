/** The plot: lines with their own dashes, shaded bounds, and the note's own point; colours come from the editor's theme. */

import uPlot from "uplot";
import type { Curves } from "../../../../server/protocol.ts";

export interface Plot {
  destroy(): void;
}

/** Dashes tell the lines apart without colour. */
export const DASHES: readonly (readonly number[])[] = [[], [8, 4], [2, 3], [10, 3, 2, 3], [5, 5], [1, 6]];

/** The theme's chart colours, with a fallback that reads on light and dark. */
const COLOURS: readonly (readonly [string, string])[] = [
  ["--vscode-charts-blue", "#2f7ed8"],
  ["--vscode-charts-orange", "#c25e00"],
  ["--vscode-charts-green", "#2e8b57"],
  ["--vscode-charts-purple", "#8a5fbf"],
  ["--vscode-charts-red", "#c03a3a"],
  ["--vscode-charts-yellow", "#9a7a00"],
];

export function themeColour(index: number): string {
  const [name, fallback] = COLOURS[index % COLOURS.length] as readonly [string, string];
  return getComputedStyle(document.body).getPropertyValue(name).trim() || fallback;
}

const HEIGHT = 300;

export function drawPlot(box: HTMLElement, curves: Curves): Plot {
  const text = getComputedStyle(document.body).color;
  const grid = { stroke: withAlpha(text, 0.15), width: 1 };
  const axes = { stroke: text, grid, ticks: grid };
  const percent = (values: readonly number[]): number[] => values.map((value) => value * 100);
  const data: number[][] = [[...curves.x]];
  const series: uPlot.Series[] = [{ label: curves.axisLabel }];
  const bands: uPlot.Band[] = [];
  curves.curves.forEach((curve, index) => {
    const stroke = themeColour(index);
    const edge = { stroke: "transparent", width: 0, points: { show: false }, show: true };
    data.push(percent(curve.value), percent(curve.high), percent(curve.low));
    series.push({
      label: curve.label,
      stroke,
      width: 2,
      dash: [...(DASHES[index % DASHES.length] ?? [])],
      points: { show: false },
    });
    series.push({ ...edge, label: `${curve.label}, upper` }, { ...edge, label: `${curve.label}, lower` });
    bands.push({ series: [index * 3 + 2, index * 3 + 3], fill: withAlpha(stroke, 0.18) });
  });
  const options: uPlot.Options = {
    width: Math.max(280, box.clientWidth),
    height: HEIGHT,
    scales: { x: { time: false, distr: curves.axis === "concentration" ? 3 : 1 }, y: { range: [0, 100] } },
    series,
    bands,
    axes: [
      { ...axes, label: curves.axisLabel },
      { ...axes, label: "Share of the form (%)" },
    ],
    legend: { show: false },
    hooks: { draw: [(plot) => markHere(plot, curves.here, text)] },
  };
  const plot = new uPlot(options, data as uPlot.AlignedData, box);
  const key = keyOf(curves);
  box.append(key);
  return {
    destroy() {
      plot.destroy();
      key.remove();
    },
  };
}

/** An upright line where the note stands. */
function markHere(plot: uPlot, here: number, colour: string): void {
  const x = plot.valToPos(here, "x", true);
  const { left, top, width, height } = plot.bbox;
  if (!(x >= left && x <= left + width)) return;
  plot.ctx.save();
  plot.ctx.strokeStyle = colour;
  plot.ctx.lineWidth = 2;
  plot.ctx.beginPath();
  plot.ctx.moveTo(x, top);
  plot.ctx.lineTo(x, top + height);
  plot.ctx.stroke();
  plot.ctx.restore();
}

/** Names beside a piece of each line, dashes and all. */
function keyOf(curves: Curves): HTMLElement {
  const list = document.createElement("ul");
  list.className = "key";
  curves.curves.forEach((curve, index) => {
    const item = document.createElement("li");
    const svg = document.createElementNS("http://www.w3.org/2000/svg", "svg");
    const line = document.createElementNS("http://www.w3.org/2000/svg", "line");
    const set = (element: Element, values: Record<string, string>): void => {
      for (const [name, value] of Object.entries(values)) element.setAttribute(name, value);
    };
    set(svg, { width: "36", height: "10", "aria-hidden": "true" });
    set(line, {
      x1: "0",
      y1: "5",
      x2: "36",
      y2: "5",
      stroke: themeColour(index),
      "stroke-width": "2",
      "stroke-dasharray": (DASHES[index % DASHES.length] ?? []).join(" "),
    });
    svg.append(line);
    item.append(svg, document.createTextNode(` ${curve.label}`));
    list.append(item);
  });
  return list;
}

/** A colour of the theme with an opacity; canvas reads the result. */
function withAlpha(colour: string, alpha: number): string {
  return `color-mix(in srgb, ${colour} ${Math.round(alpha * 100)}%, transparent)`;
}

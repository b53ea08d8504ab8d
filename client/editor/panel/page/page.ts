/** The panel's own script: shows what the extension sends and says back what the reader moved. Runs in the webview. */

import type { CurveAxis, Curves } from "../../../../server/protocol.ts";
import type { ToPanel } from "../panel-messages.ts";
import { csvOf, fillTable } from "./figures.ts";
import { drawPlot, type Plot } from "./plot.ts";
import { svgOf } from "./svg.ts";

interface Host {
  postMessage(message: unknown): void;
}
declare function acquireVsCodeApi(): Host;

const host = acquireVsCodeApi();
const byId = <T extends HTMLElement>(id: string): T => document.getElementById(id) as T;

let changed: Partial<Record<CurveAxis, number>> = {};
let current: Curves | undefined;
let plot: Plot | undefined;

const axisBox = byId<HTMLSelectElement>("axis");
const ask = (): void => host.postMessage({ kind: "ask", axis: axisBox.value, changed });

axisBox.addEventListener("change", ask);
byId("reset").addEventListener("click", () => {
  changed = {};
  ask();
});
byId("save-csv").addEventListener("click", () => save("forms.csv", current && csvOf(current)));
byId("save-svg").addEventListener("click", () => save("forms.svg", current && svgOf(current)));
byId("save-png").addEventListener("click", () => current && savePng(svgOf(current)));

/** The same picture as the SVG, at twice its size. */
function savePng(svg: string): void {
  const image = new Image();
  image.addEventListener("load", () => {
    const canvas = document.createElement("canvas");
    canvas.width = image.width * 2;
    canvas.height = image.height * 2;
    canvas.getContext("2d")?.drawImage(image, 0, 0, canvas.width, canvas.height);
    canvas.toBlob(async (blob) => {
      if (blob) host.postMessage({ kind: "save", name: "forms.png", data: new Uint8Array(await blob.arrayBuffer()) });
    });
  });
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(svg)}`;
}

function save(name: string, text: string | undefined): void {
  if (text !== undefined) host.postMessage({ kind: "save", name, data: new TextEncoder().encode(text) });
}

window.addEventListener("message", ({ data }: MessageEvent<ToPanel>) => {
  if (data.kind === "nothing") {
    byId("conditions").textContent = "Put the cursor on an aldehyde or ketone of the note.";
    return;
  }
  show(data.curves);
});
window.addEventListener("resize", () => current && redraw(current));
new MutationObserver(() => current && redraw(current)).observe(document.body, { attributeFilter: ["class"] });

function show(curves: Curves): void {
  current = curves;
  byId("title").textContent = curves.title;
  byId("conditions").textContent = `Share of each form at equilibrium, ${curves.conditions}.`;
  byId("caption").textContent =
    "Lines: best value. Shaded: 95 % range. The upright line is where the note stands. Each line has its own dashes and its name in the key.";
  redraw(curves);
  showControls(curves);
  showTimeline(curves);
  fillTable(byId("table"), curves);
}

function redraw(curves: Curves): void {
  plot?.destroy();
  plot = drawPlot(byId("plot"), curves);
}

/** A slider and a number field for each quantity; kept while they are in use, so that focus stays. */
function showControls(curves: Curves): void {
  const box = byId("controls");
  if (box.contains(document.activeElement)) return;
  box.replaceChildren(
    ...curves.controls.map(({ axis, label, value, low, high, step }) => {
      const row = document.createElement("div");
      row.className = "control";
      const name = document.createElement("label");
      name.textContent = label;
      name.htmlFor = `slide-${axis}`;
      const [slider, field] = ["range", "number"].map((type) => {
        const input = document.createElement("input");
        Object.assign(input, {
          type,
          min: String(low),
          max: String(high),
          step: String(step),
          value: String(Number(value.toPrecision(4))),
        });
        input.setAttribute("aria-label", label);
        return input;
      }) as [HTMLInputElement, HTMLInputElement];
      slider.id = `slide-${axis}`;
      for (const input of [slider, field])
        input.addEventListener("input", () => {
          if (!Number.isFinite(input.valueAsNumber)) return;
          (input === slider ? field : slider).value = input.value;
          changed = { ...changed, [axis]: Math.min(high, Math.max(low, input.valueAsNumber)) };
          ask();
        });
      row.append(name, slider, field);
      return row;
    }),
  );
}

function showTimeline(curves: Curves): void {
  byId("timeline").replaceChildren(
    ...curves.timeline.map(({ line, says }) => {
      const item = document.createElement("li");
      const button = document.createElement("button");
      button.type = "button";
      button.className = "link";
      button.textContent = `Line ${line + 1}: ${says}`;
      button.addEventListener("click", () => host.postMessage({ kind: "go", line }));
      item.append(button);
      return item;
    }),
  );
}

host.postMessage({ kind: "ready" });

/** Leave-one-out residuals against the measured constants, as an SVG that follows the colour of the text around it. */

export interface PlotPoint {
  readonly family: string;
  readonly x: number;
  readonly residual: number;
}

const WIDTH = 640;
const HEIGHT = 320;
const LEFT = 48;
const BOTTOM = 40;
const X_RANGE = [-6, 7] as const;
const Y_RANGE = [-1.5, 1.5] as const;

const sx = (x: number): number => LEFT + ((x - X_RANGE[0]) / (X_RANGE[1] - X_RANGE[0])) * (WIDTH - LEFT - 12);
const sy = (y: number): number => 12 + ((Y_RANGE[1] - y) / (Y_RANGE[1] - Y_RANGE[0])) * (HEIGHT - BOTTOM - 12);

/** A mark of its own for each family, so that the plot reads without colour. */
const MARKS: Readonly<Record<string, (x: number, y: number) => string>> = {
  aliphatic: (x, y) => `<circle cx="${x}" cy="${y}" r="3.5" fill="none"/>`,
  "alpha-acyl": (x, y) => `<rect x="${x - 3}" y="${y - 3}" width="6" height="6" fill="none"/>`,
  "aryl aldehyde": (x, y) => `<path d="M${x} ${y - 4}l4 7h-8z" fill="none"/>`,
  other: (x, y) => `<path d="M${x - 3} ${y - 3}l6 6m0-6l-6 6"/>`,
};

function axes(): string {
  const parts: string[] = [];
  for (let x = X_RANGE[0]; x <= X_RANGE[1]; x++)
    parts.push(
      `<text x="${sx(x).toFixed(0)}" y="${HEIGHT - BOTTOM + 16}" text-anchor="middle">${String(x).replace("-", "−")}</text>`,
    );
  for (const y of [-1, -0.5, 0, 0.5, 1])
    parts.push(
      `<path d="M${LEFT} ${sy(y).toFixed(1)}H${WIDTH - 12}" opacity="${y === 0 ? 0.6 : 0.2}"/>`,
      `<text x="${LEFT - 6}" y="${(sy(y) + 4).toFixed(1)}" text-anchor="end">${String(y).replace("-", "−")}</text>`,
    );
  parts.push(`<text x="${(LEFT + WIDTH) / 2}" y="${HEIGHT - 6}" text-anchor="middle">log K measured</text>`);
  parts.push(
    `<text x="14" y="${HEIGHT / 2}" text-anchor="middle" transform="rotate(-90 14 ${HEIGHT / 2})">measured − correlated, leave-one-out</text>`,
  );
  return parts.join("\n");
}

/** The whole plot. */
export function residualPlot(points: readonly PlotPoint[]): string {
  const marks = points.map(
    (point) => MARKS[point.family]?.(Number(sx(point.x).toFixed(1)), Number(sy(point.residual).toFixed(1))) ?? "",
  );
  const legend = Object.entries(MARKS).map(
    ([family, mark], i) => `${mark(LEFT + 20 + i * 120, 22)}<text x="${LEFT + 30 + i * 120}" y="26">${family}</text>`,
  );
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${WIDTH} ${HEIGHT}" role="img" aria-label="Leave-one-out residuals of the hydration correlation">`,
    `<style>text{font:11px sans-serif;fill:currentColor;stroke:none}</style>`,
    `<g stroke="currentColor" stroke-width="1">`,
    axes(),
    ...marks,
    ...legend,
    "</g></svg>",
    "",
  ].join("\n");
}

// Takes a curve in shown units with its marks; draws it as SVG that reads in black and white.
// result.ts and paper.ts come next.

import { draw, make, show } from "./dom";
import type { PlotAnswer } from "./shapes";

const WIDEST = 760;
const HEIGHT = 300;
const LEFT = 84;
const RIGHT = 24;
const TOP = 40;
const BOTTOM = 60;

type Scale = (value: number) => number;

function scale(low: number, high: number, from: number, to: number): Scale {
  const span = high - low || 1;
  return (value) => from + ((value - low) / span) * (to - from);
}

/** Round steps that cut the range into about so many parts. */
function steps(low: number, high: number, parts = 5): number[] {
  const rough = (high - low || 1) / parts;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((each) => each * power >= rough) ?? 10) * power;
  const first = Math.ceil(low / step - 1e-9);
  return Array.from({ length: Math.floor(high / step + 1e-9) - first + 1 }, (_, index) => (first + index) * step);
}

function words(value: number): string {
  return String(Number(value.toPrecision(6))).replace("-", "−");
}

const drawn = new WeakMap<Element, PlotAnswer>();
/** Draws again when the place has got another width, so that the words in the picture keep their size. */
const watcher = new ResizeObserver((entries) => {
  for (const { target } of entries) {
    const plot = drawn.get(target);
    if (plot) target.querySelector("svg")?.replaceWith(drawCurve(plot, target.clientWidth));
  }
});

export function drawPlot(place: Element, plot: PlotAnswer | undefined): void {
  const hasCurve = plot !== undefined && plot.points.length > 1;
  show(place, hasCurve);
  place.replaceChildren(...(hasCurve ? [drawCurve(plot, place.clientWidth), make("figcaption", plot.title)] : []));
  if (!hasCurve) {
    drawn.delete(place);
    return;
  }
  drawn.set(place, plot);
  watcher.observe(place);
}

/** The curve as a picture that many pixels wide. */
export function drawCurve(plot: PlotAnswer, space: number): SVGElement {
  const width = Math.min(WIDEST, space || WIDEST);
  const [low, high] = bounds(plot, 0);
  const [bottom, top] = bounds(plot, 1);
  const across = scale(low, high, LEFT, width - RIGHT);
  const up = scale(Math.min(bottom, 0), top, HEIGHT - BOTTOM, TOP);
  const picture = draw("svg", { viewBox: `0 0 ${width} ${HEIGHT}`, role: "img", "aria-label": plot.title });
  picture.append(
    draw("path", { class: "axis", d: `M${LEFT} ${TOP}V${HEIGHT - BOTTOM}H${width - RIGHT}` }),
    ...steps(low, high, width < 500 ? 3 : 5).map((at) => draw("text", { x: across(at), y: HEIGHT - BOTTOM + 24, "text-anchor": "middle" }, words(at))),
    ...steps(Math.min(bottom, 0), top).map((at) => draw("text", { x: LEFT - 10, y: up(at) + 6, "text-anchor": "end" }, words(at))),
    draw("text", { x: width - RIGHT, y: HEIGHT - 8, "text-anchor": "end" }, `${plot.x.label} in ${plot.x.unit}`),
    draw("text", { x: 4, y: 20 }, `${plot.y.label} in ${plot.y.unit}`),
    draw("path", { class: "curve", d: plot.points.map(([x, y], index) => `${index ? "L" : "M"}${across(x)} ${up(y)}`).join("") }),
    ...(plot.marks ?? []).flatMap((mark) => drawMark(mark, width, across, up)),
  );
  return picture;
}

function bounds(plot: PlotAnswer, index: 0 | 1): [number, number] {
  const marks = (plot.marks ?? []).filter(({ axis }) => (axis === "x" ? 0 : 1) === index).map(({ at }) => at);
  const values = [...plot.points.map((point) => point[index]), ...marks];
  return [Math.min(...values), Math.max(...values)];
}

function drawMark(mark: { axis: "x" | "y"; at: number; label: string }, width: number, across: Scale, up: Scale): SVGElement[] {
  if (mark.axis === "y") {
    const y = up(mark.at);
    return [
      draw("path", { class: "line", d: `M${LEFT} ${y}H${width - RIGHT}` }),
      draw("text", { x: LEFT + 10, y: y - 8 }, mark.label),
    ];
  }
  const x = across(mark.at);
  const isRight = x > (LEFT + width) / 2;
  return [
    draw("path", { class: "line", d: `M${x} ${TOP}V${HEIGHT - BOTTOM}` }),
    draw("text", { x: isRight ? x - 8 : x + 8, y: TOP + 4, "text-anchor": isRight ? "end" : "start" }, mark.label),
  ];
}

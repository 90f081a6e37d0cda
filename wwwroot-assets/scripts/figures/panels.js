// Small multiples: several panels over the same points and axes, each with its own colours, drawn on canvases.

import { bins, drawLayers, drawRing, nearest, prepare, roundTicks, toX, toY } from "./drawing.js";
import { font, onChange, variable } from "./theme.js";

const REACH = 8;

/** Takes charge of the canvases with data-panel inside an element; callbacks go to the .NET object. */
export function create(root, dotnet) {
  return new Panels(root, dotnet);
}

class Panels {
  constructor(root, dotnet) {
    this.root = root;
    this.dotnet = dotnet;
    this.panels = [];
    this.listeners = new AbortController();
    root.addEventListener("click", e => this.onClick(e), { signal: this.listeners.signal });
    this.endTheme = onChange(() => this.redraw());
    this.resize = new ResizeObserver(() => this.redraw());
    this.resize.observe(root);
  }

  draw(spec, bytes) {
    const numbers = new Float32Array(bytes.slice().buffer);
    this.spec = spec;
    this.floor = spec.floor && { ...spec.floor, numbers };
    this.panels = spec.panels.map(panel => ({
      id: panel.id,
      points: {
        id: "samples", kind: "points", n: spec.n, x: spec.x, y: spec.y, size: spec.size, colour: panel.colour, canSelect: true,
        numbers, bins: bins(panel.colour, numbers, spec.n),
      },
    }));
    this.selected = spec.selected;
    this.redraw();
  }

  select(point) {
    this.selected = point;
    this.redraw();
  }

  dispose() {
    this.listeners.abort();
    this.endTheme();
    this.resize.disconnect();
  }

  view(canvas) {
    const { xAxis, yAxis } = this.spec;
    const [x0, x1] = xAxis.reversed ? [xAxis.to, xAxis.from] : [xAxis.from, xAxis.to];
    const [y0, y1] = yAxis.reversed ? [yAxis.to, yAxis.from] : [yAxis.from, yAxis.to];
    return { left: 40, top: 6, width: canvas.clientWidth - 48, height: canvas.clientHeight - 28, x0, x1, y0, y1 };
  }

  redraw() {
    for (const panel of this.panels) {
      const canvas = this.root.querySelector(`canvas[data-panel="${CSS.escape(panel.id)}"]`);
      if (!canvas || canvas.clientWidth < 60) {
        continue;
      }

      const view = this.view(canvas);
      const context = prepare(canvas, canvas.clientWidth, canvas.clientHeight);
      drawLayers(context, view, this.floor ? [this.floor, panel.points] : [panel.points]);
      drawFrame(context, view);
      if (this.selected !== null) {
        const { numbers, x, y } = panel.points;
        drawRing(context, view, numbers[x + this.selected], numbers[y + this.selected], 5, variable("--ink"));
      }
    }
  }

  onClick(event) {
    const canvas = event.target.closest("canvas[data-panel]");
    const panel = canvas && this.panels.find(p => p.id === canvas.dataset.panel);
    if (!panel) {
      return;
    }

    const box = canvas.getBoundingClientRect();
    const found = nearest(this.view(canvas), [panel.points], event.clientX - box.left, event.clientY - box.top, REACH);
    if (found) {
      this.dotnet.invokeMethodAsync("PickPoint", found.point);
    }
  }
}

/** Left and lower axis with few ticks outwards. */
function drawFrame(context, view) {
  const bottom = view.top + view.height;
  context.strokeStyle = context.fillStyle = variable("--faint");
  context.lineWidth = 1;
  context.font = font(11);
  context.beginPath();
  context.moveTo(view.left - 0.5, view.top);
  context.lineTo(view.left - 0.5, bottom + 0.5);
  context.lineTo(view.left + view.width, bottom + 0.5);
  context.textAlign = "center";
  context.textBaseline = "top";
  for (const tick of roundTicks(view.x0, view.x1, 4)) {
    const x = toX(view, tick.at);
    context.moveTo(x, bottom);
    context.lineTo(x, bottom + 4);
    context.fillText(tick.label, x, bottom + 6);
  }

  context.textAlign = "right";
  context.textBaseline = "middle";
  for (const tick of roundTicks(view.y0, view.y1, 4)) {
    const y = toY(view, tick.at);
    context.moveTo(view.left, y);
    context.lineTo(view.left - 4, y);
    context.fillText(tick.label, view.left - 6, y);
  }

  context.stroke();
}

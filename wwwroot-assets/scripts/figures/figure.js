// A figure: plotly.js has the axes and the zoom, a canvas under them has the data. Redrawing 20,000 points on a canvas takes a few
// milliseconds, so that everything follows the pointer.

import { bins, drawLayers, drawRing, drawTopTicks, fromX, fromY, nearest, prepare, toX, toY } from "./drawing.js";
import { onChange, variable } from "./theme.js";

const REACH = 12;
const MOVE_EVERY_MS = 60;
let loading = null;

/** The id under which plotly.js 3.7.0 would write the styles of its street maps into the page; nothing here draws one. */
const STREET_MAP_STYLE = "ce8d464691048653ffe3a57c6c18ab566e8366f186677868cf724621a857b4fe";

/** Loads plotly.js once. Our stylesheet takes the place of the rules that it would write into the page by script. */
function loadPlotly() {
  loading ??= (async () => {
    const none = document.createElement("meta");
    none.id = STREET_MAP_STYLE;
    document.head.append(none);
    const style = document.createElement("link");
    style.id = "plotly.js-style-global";
    style.className = "no-inline-styles";
    style.rel = "stylesheet";
    style.href = new URL("../../plotly/plotly.css", import.meta.url).href;
    const styled = new Promise((done, failed) => {
      style.onload = done;
      style.onerror = () => failed(new Error("The stylesheet of the figures did not load. Reload the page."));
    });
    document.head.append(style);
    await Promise.all([styled, import("../../plotly/plotly-strict.min.js")]);
    return window.Plotly;
  })();
  return loading;
}

/** Makes a figure in an empty element; callbacks go to the .NET object. */
export async function create(host, dotnet) {
  return new Figure(host, dotnet, await loadPlotly());
}

class Figure {
  constructor(host, dotnet, plotly) {
    this.host = host;
    this.dotnet = dotnet;
    this.plotly = plotly;
    this.layers = [];
    this.topTicks = [];
    this.selected = [];
    this.stepped = null;
    this.moving = null;
    this.dragMode = window.matchMedia("(pointer: coarse)").matches ? false : "zoom";
    this.canvas = this.add("canvas", "figure-canvas");
    this.axes = this.add("div", "figure-axes");
    this.marks = this.add("div", "figure-marks");
    this.tip = this.add("div", "figure-tip");
    this.tip.hidden = true;
    this.live = this.add("div", "figure-live");
    this.live.setAttribute("aria-live", "polite");
    this.listeners = new AbortController();
    const signal = this.listeners.signal;
    host.addEventListener("keydown", e => this.onKey(e), { signal });
    host.addEventListener("pointermove", e => this.onHover(e), { signal });
    host.addEventListener("pointerleave", () => { this.tip.hidden = true; }, { signal });
    host.addEventListener("pointerdown", e => { this.down = [e.clientX, e.clientY, e.target]; }, { signal, capture: true });
    window.addEventListener("pointerup", e => this.onUp(e), { signal, capture: true });
    this.endTheme = onChange(() => this.show());
    this.resize = new ResizeObserver(() => this.onResize());
    this.resize.observe(host);
  }

  add(tag, name) {
    const element = document.createElement(tag);
    element.className = name;
    this.host.append(element);
    return element;
  }

  /** Takes a description and its arrays. A layer with "keep" is the one of that id from before. */
  draw(spec, bytes) {
    const numbers = new Float32Array(bytes.slice().buffer);
    this.layers = spec.layers.map(layer => {
      if (layer.keep) {
        return this.layers.find(known => known.id === layer.id);
      }

      return layer.kind === "points" ? { ...layer, numbers, bins: bins(layer.colour, numbers, layer.n) } : { ...layer, numbers };
    });
    const held = this.moving && this.layers.find(l => l.id === this.moving.layer)?.marks?.find(m => m.id === this.moving.mark);
    if (held) {
      Object.assign(held, { x: this.moving.x, y: this.moving.y });
    }

    this.topTicks = spec.topTicks;
    this.selected = spec.selected;
    this.stepped = null;
    const home = { x: ends(spec.x), y: ends(spec.y) };
    const same = this.home && this.x.label === spec.x.label && this.y.label === spec.y.label;
    const atHome = same && equal(this.shown(), this.home);
    this.x = spec.x;
    this.y = spec.y;
    this.home = this.moving && same ? this.home : home;
    this.range = same && (!atHome || this.moving) ? this.shown() : home;
    return this.show();
  }

  /** Highlights points: [{ layer, point }]. */
  select(points) {
    this.selected = points;
    this.redraw();
  }

  /** Zooms about the middle; 2 shows half as much. */
  zoom(factor) {
    const about = ([a, b]) => [(a + b) / 2 - (b - a) / 2 / factor, (a + b) / 2 + (b - a) / 2 / factor];
    const { x, y } = this.shown();
    this.range = { x: about(x), y: about(y) };
    return this.show();
  }

  reset() {
    this.range = this.home;
    return this.show();
  }

  /** Chooses what dragging does: true moves the view, false zooms to a box. */
  moveByDragging(moves) {
    this.dragMode = moves ? "pan" : window.matchMedia("(pointer: coarse)").matches ? false : "zoom";
    return this.show();
  }

  dispose() {
    this.listeners.abort();
    this.endTheme();
    this.resize.disconnect();
    this.plotly.purge(this.axes);
    this.host.replaceChildren();
  }

  shown() {
    const full = this.axes._fullLayout;
    return full?.xaxis ? { x: [...full.xaxis.range], y: [...full.yaxis.range] } : this.range;
  }

  async show() {
    if (!this.range) {
      return;
    }

    const ink = variable("--ink");
    const faint = variable("--faint");
    const family = getComputedStyle(this.host).fontFamily;
    const axis = (spec, range) => ({
      title: { text: spec.label, font: { color: ink, size: 13 }, standoff: 8 },
      range,
      autorange: false,
      ticks: "outside",
      ticklen: 5,
      tickcolor: faint,
      tickfont: { color: faint, size: 13 },
      linecolor: faint,
      linewidth: 1,
      showline: true,
      showgrid: false,
      zeroline: false,
      separatethousands: false,
      exponentformat: "none",
      automargin: true,
    });
    const narrow = this.host.clientWidth < 480;
    const layout = {
      xaxis: { ...axis(this.x, this.range.x), nticks: narrow ? 5 : 8 },
      yaxis: { ...axis(this.y, this.range.y), nticks: 8 },
      margin: { l: narrow ? 48 : 60, r: 16, t: this.topTicks.length > 0 ? 28 : 12, b: 48 },
      paper_bgcolor: "rgba(0,0,0,0)",
      plot_bgcolor: "rgba(0,0,0,0)",
      font: { family, color: ink },
      dragmode: this.dragMode,
      hovermode: false,
      showlegend: false,
    };
    const first = !this.axes._fullLayout;
    await this.plotly.react(this.axes, [{ x: [], y: [], type: "scatter", hoverinfo: "skip" }], layout, {
      displayModeBar: false, responsive: false, doubleClick: false, scrollZoom: false, showTips: false,
    });
    if (first) {
      this.axes.on("plotly_relayouting", () => this.redraw());
      this.axes.on("plotly_relayout", () => { this.range = this.shown(); this.redraw(); });
      this.axes.on("plotly_doubleclick", () => this.reset());
      this.axes.on("plotly_afterplot", () => this.redraw());
    }

    this.redraw();
  }

  onResize() {
    if (this.axes._fullLayout && this.host.clientWidth > 0) {
      this.plotly.Plots.resize(this.axes);
    }
  }

  view() {
    const { xaxis, yaxis } = this.axes._fullLayout;
    return {
      left: xaxis._offset, width: xaxis._length, top: yaxis._offset, height: yaxis._length,
      x0: xaxis.range[0], x1: xaxis.range[1], y0: yaxis.range[0], y1: yaxis.range[1],
    };
  }

  redraw() {
    if (!this.axes._fullLayout?.xaxis) {
      return;
    }

    const view = this.view();
    const context = prepare(this.canvas, this.host.clientWidth, this.host.clientHeight);
    drawLayers(context, view, this.layers);
    drawTopTicks(context, view, this.topTicks);
    for (const { layer, point } of this.selected) {
      this.ring(context, view, layer, point, variable("--ink"));
    }

    if (this.stepped) {
      this.ring(context, view, this.stepped.layer, this.stepped.point, variable("--pencil"));
    }

    this.placeMarks(view);
  }

  ring(context, view, id, point, colour) {
    const layer = this.layers.find(l => l.id === id);
    if (layer) {
      drawRing(context, view, layer.numbers[layer.x + point], layer.numbers[layer.y + point], layer.size / 2 + 4, colour);
    }
  }

  onHover(event) {
    if (event.target.closest(".figure-marks") || event.buttons !== 0 || !this.axes._fullLayout) {
      this.tip.hidden = true;
      return;
    }

    const [px, py] = this.place(event);
    const found = nearest(this.view(), this.layers, px, py, REACH);
    if (!found) {
      this.tip.hidden = true;
      this.hovered = null;
    } else if (this.hovered?.layer !== found.layer || this.hovered.point !== found.point) {
      this.hovered = found;
      this.sayAt(found, px, py);
    }
  }

  async sayAt(found, px, py) {
    const text = await this.dotnet.invokeMethodAsync("Say", found.layer.id, found.point);
    if (this.hovered === found) {
      this.tip.textContent = text;
      this.tip.hidden = false;
      const left = px + 14 + this.tip.offsetWidth > this.host.clientWidth ? px - 14 - this.tip.offsetWidth : px + 14;
      this.tip.style.left = `${Math.max(0, left)}px`;
      this.tip.style.top = `${Math.max(0, py - this.tip.offsetHeight - 8)}px`;
    }
  }

  place(event) {
    const box = this.host.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  }

  onUp(event) {
    const down = this.down;
    this.down = null;
    if (!down || event.button !== 0 || down[2].closest(".figure-marks") || Math.hypot(event.clientX - down[0], event.clientY - down[1]) > 4) {
      return;
    }

    const [px, py] = this.place(event);
    const found = nearest(this.view(), this.layers, px, py, REACH);
    if (found) {
      this.dotnet.invokeMethodAsync("Pick", found.layer.id, found.point);
    }
  }

  async onKey(event) {
    if (event.target !== this.host || event.ctrlKey || event.metaKey || event.altKey) {
      return;
    }

    const direction = { ArrowLeft: 0, ArrowRight: 1, ArrowUp: 2, ArrowDown: 3 }[event.key];
    if (direction !== undefined) {
      event.preventDefault();
      const view = this.view();
      const from = this.stepped ?? this.selected[0] ?? null;
      const step = await this.dotnet.invokeMethodAsync("Step", from?.layer ?? "", from?.point ?? -1, direction, view.x0, view.x1, view.y0, view.y1);
      if (step) {
        this.stepped = { layer: step.layer, point: step.point };
        this.live.textContent = step.text;
        this.redraw();
        this.showStep(step.text);
      }
    } else if (event.key === "Enter" && this.stepped) {
      event.preventDefault();
      this.dotnet.invokeMethodAsync("Pick", this.stepped.layer, this.stepped.point);
    } else if (event.key === "+" || event.key === "=") {
      this.zoom(1.5);
    } else if (event.key === "-") {
      this.zoom(1 / 1.5);
    } else if (event.key === "0") {
      this.reset();
    } else if (event.key === "Escape") {
      this.stepped = null;
      this.tip.hidden = true;
      this.redraw();
    }
  }

  showStep(text) {
    const layer = this.layers.find(l => l.id === this.stepped.layer);
    const view = this.view();
    const px = toX(view, layer.numbers[layer.x + this.stepped.point]);
    const py = toY(view, layer.numbers[layer.y + this.stepped.point]);
    this.tip.textContent = text;
    this.tip.hidden = false;
    const left = px + 14 + this.tip.offsetWidth > this.host.clientWidth ? px - 14 - this.tip.offsetWidth : px + 14;
    this.tip.style.left = `${Math.max(0, left)}px`;
    this.tip.style.top = `${Math.max(0, py - this.tip.offsetHeight - 10)}px`;
  }

  /** Draggable marks are buttons over the plot, so that the keyboard reaches them. */
  placeMarks(view) {
    const wanted = this.layers.filter(l => l.kind === "marks" && l.draggable).flatMap(layer => layer.marks.map(mark => ({ layer, mark })));
    while (this.marks.children.length > wanted.length) {
      this.marks.lastChild.remove();
    }

    wanted.forEach(({ layer, mark }, i) => {
      const button = this.marks.children[i] ?? this.markButton();
      button.target = { layer, mark };
      const px = toX(view, mark.x);
      const py = toY(view, mark.y);
      const inside = px >= view.left - 1 && px <= view.left + view.width + 1 && py >= view.top - 1 && py <= view.top + view.height + 1;
      button.hidden = !inside;
      button.style.left = `${px - 14}px`;
      button.style.top = `${py - 14}px`;
      const said = `${mark.label}: ${this.x.label} ${plain(mark.x)}, ${this.y.label} ${plain(mark.y)}. Arrow keys move it.`;
      if (button.getAttribute("aria-label") !== said) {
        button.setAttribute("aria-label", said);
      }
    });
  }

  markButton() {
    const button = document.createElement("button");
    button.type = "button";
    button.className = "figure-mark";
    this.marks.append(button);
    button.addEventListener("pointerdown", e => {
      e.preventDefault();
      button.focus();
      button.setPointerCapture(e.pointerId);
      const { layer, mark } = button.target;
      this.moving = { layer: layer.id, mark: mark.id, x: mark.x, y: mark.y };
    });
    button.addEventListener("pointermove", e => {
      if (this.moving) {
        const [px, py] = this.place(e);
        const view = this.view();
        this.move(button, within(fromX(view, px), view.x0, view.x1), within(fromY(view, py), view.y0, view.y1), false);
      }
    });
    const release = () => {
      if (this.moving) {
        const { x, y } = this.moving;
        this.moving = null;
        this.move(button, x, y, true);
      }
    };
    button.addEventListener("pointerup", release);
    button.addEventListener("pointercancel", release);
    button.addEventListener("keydown", e => {
      const step = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, 1], ArrowDown: [0, -1] }[e.key];
      if (step) {
        e.preventDefault();
        const view = this.view();
        const size = (e.shiftKey ? 10 : 1) / 200;
        const { mark } = button.target;
        this.move(button, mark.x + step[0] * size * (view.x1 - view.x0), mark.y + step[1] * size * (view.y1 - view.y0), true);
      }
    });
    return button;
  }

  /** Moves a mark here at once, and tells .NET: while the pointer moves only several times a second. */
  move(button, x, y, released) {
    const { layer, mark } = button.target;
    mark.x = x;
    mark.y = y;
    if (this.moving) {
      Object.assign(this.moving, { x, y });
    }

    this.redraw();
    const now = performance.now();
    if (released || now - (this.told ?? 0) > MOVE_EVERY_MS) {
      this.told = now;
      this.dotnet.invokeMethodAsync("Move", layer.id, mark.id, x, y, released);
    }
  }
}

const ends = spec => spec.reversed ? [spec.to, spec.from] : [spec.from, spec.to];
const equal = (a, b) => ["x", "y"].every(k => a[k].every((v, i) => Math.abs(v - b[k][i]) <= 1e-9 * Math.abs(a[k][1] - a[k][0])));
const within = (value, a, b) => Math.min(Math.max(value, Math.min(a, b)), Math.max(a, b));
const plain = value => Number(value.toPrecision(5)).toString().replace("-", "\u2212");

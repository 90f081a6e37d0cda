// Draws layers on a canvas. A view maps values on pixels: { left, top, width, height, x0, x1, y0, y1 }, where x0 stands at the left
// edge and y0 at the bottom edge, whichever is larger.

import { isDark, mix, resolve, variable, font } from "./theme.js";

const STRENGTH_STEPS = 64;
const MISSING = 255;
const OPAQUE = 0xff000000;
let sheet = null;

/** Above so many points, what is shown is how dense they lie and their mean colour. */
export const DENSITY_ABOVE = 200000;

export const toX = (view, x) => view.left + (x - view.x0) / (view.x1 - view.x0) * view.width;
export const toY = (view, y) => view.top + view.height - (y - view.y0) / (view.y1 - view.y0) * view.height;
export const fromX = (view, px) => view.x0 + (px - view.left) / view.width * (view.x1 - view.x0);
export const fromY = (view, py) => view.y0 + (view.top + view.height - py) / view.height * (view.y1 - view.y0);

/** A canvas sized to its host in device pixels; gives a context that draws in CSS pixels. */
export function prepare(canvas, width, height) {
  const ratio = window.devicePixelRatio || 1;
  const w = Math.round(width * ratio);
  const h = Math.round(height * ratio);
  if (canvas.width !== w || canvas.height !== h) {
    canvas.width = w;
    canvas.height = h;
  }

  const context = canvas.getContext("2d", { willReadFrequently: true });
  context.setTransform(ratio, 0, 0, ratio, 0, 0);
  context.clearRect(0, 0, width, height);
  return context;
}

/** Which colour of its table each point takes; 255 where its value is missing. */
export function bins(colour, numbers, n) {
  if (colour.kind === "one") {
    return new Uint8Array(n);
  }

  const table = new Uint8Array(n);
  const steps = colour.kind === "scale" ? colour.light.length : STRENGTH_STEPS;
  for (let i = 0; i < n; i++) {
    const value = numbers[colour.values + i];
    if (Number.isNaN(value)) {
      table[i] = MISSING;
    } else if (colour.kind === "categories") {
      table[i] = value % 255;
    } else {
      const share = (value - colour.from) / (colour.to - colour.from);
      table[i] = Math.round(Math.min(1, Math.max(0, share)) * (steps - 1));
    }
  }

  return table;
}

/** The colour table of a layer in the present theme: one entry per bin. */
export function colourTable(colour) {
  if (colour.kind === "strength") {
    const sheet = variable("--sheet");
    const full = resolve(colour.colour);
    return Array.from({ length: STRENGTH_STEPS }, (_, i) => ({ fill: mix(sheet, full, i / (STRENGTH_STEPS - 1)), shape: colour.shape }));
  }

  if (colour.kind === "scale") {
    return (isDark() ? colour.dark : colour.light).map(fill => ({ fill, shape: colour.shape }));
  }

  return colour.entries.map(entry => ({ fill: resolve(entry.colour), shape: entry.shape }));
}

export function tracePath(context, shape, x, y, r) {
  context.beginPath();
  if (shape === "square") {
    context.rect(x - r * 0.88, y - r * 0.88, r * 1.76, r * 1.76);
  } else if (shape === "diamond") {
    context.moveTo(x, y - r * 1.2);
    context.lineTo(x + r * 1.2, y);
    context.lineTo(x, y + r * 1.2);
    context.lineTo(x - r * 1.2, y);
    context.closePath();
  } else if (shape === "triangle" || shape === "triangle-down") {
    const s = shape === "triangle" ? 1 : -1;
    context.moveTo(x, y - s * r * 1.15);
    context.lineTo(x + r * 1.1, y + s * r * 0.85);
    context.lineTo(x - r * 1.1, y + s * r * 0.85);
    context.closePath();
  } else if (shape === "plus") {
    const t = r * 0.25;
    const e = r * 1.25;
    context.rect(x - t, y - e, 2 * t, 2 * e);
    context.rect(x - e, y - t, 2 * e, 2 * t);
  } else {
    context.arc(x, y, r, 0, 2 * Math.PI);
  }
}

/**
 * One small picture per colour, the missing mark last, as numbers: a point is then a copy of a few dozen pixels. Copying them here is
 * some twenty times as fast as drawing each point by the canvas, where that has no graphics card to help.
 */
function sprites(table, size, outlined, ratio) {
  const cell = Math.ceil(size * 1.3 * ratio) + 3;
  const canvas = document.createElement("canvas");
  canvas.width = cell * (table.length + 1);
  canvas.height = cell;
  const context = canvas.getContext("2d", { willReadFrequently: true });
  const centre = cell / (2 * ratio);
  table.forEach((entry, i) => {
    context.setTransform(ratio, 0, 0, ratio, i * cell, 0);
    tracePath(context, entry.shape, centre, centre, size / 2);
    context.fillStyle = entry.fill;
    context.fill();
    if (outlined) {
      context.strokeStyle = variable("--rule");
      context.lineWidth = 0.75;
      context.stroke();
    }
  });
  context.setTransform(ratio, 0, 0, ratio, table.length * cell, 0);
  context.beginPath();
  context.arc(centre, centre, Math.min(2, size / 4), 0, 2 * Math.PI);
  context.globalAlpha = size < 5 ? 0.3 : 0.7;
  context.strokeStyle = variable("--faint");
  context.lineWidth = 0.9;
  context.stroke();
  const pixels = new Uint32Array(context.getImageData(0, 0, canvas.width, cell).data.buffer);
  return Array.from({ length: table.length + 1 }, (_, i) => {
    const at = k => Math.floor(k / cell) * canvas.width + i * cell + k % cell;
    const used = Array.from({ length: cell * cell }, (_, k) => k).filter(k => pixels[at(k)] >>> 24 > 0);
    return {
      cell,
      columns: Int32Array.from(used, k => k % cell),
      rows: Int32Array.from(used, k => Math.floor(k / cell)),
      colours: Uint32Array.from(used, k => pixels[at(k)]),
    };
  });
}

/** A sheet of pixels over the plot, blank, reused from drawing to drawing. */
function blankSheet(width, height) {
  if (sheet?.canvas.width !== width || sheet.canvas.height !== height) {
    const canvas = document.createElement("canvas");
    canvas.width = width;
    canvas.height = height;
    const context = canvas.getContext("2d", { willReadFrequently: true });
    const image = context.createImageData(width, height);
    sheet = { canvas, context, image, pixels: new Uint32Array(image.data.buffer) };
  } else {
    sheet.pixels.fill(0);
  }

  return sheet;
}

/** Draws the points of a layer: { n, x, y, size, colour, numbers, bins }. */
export function drawPoints(context, view, layer) {
  const ratio = window.devicePixelRatio || 1;
  const look = `${isDark()} ${ratio}`;
  if (layer.look !== look) {
    layer.look = look;
    layer.pictures = sprites(colourTable(layer.colour), layer.size, layer.colour.kind === "strength" || layer.colour.kind === "scale", ratio);
  }

  const pictures = layer.pictures;
  const target = blankSheet(Math.max(1, Math.round(view.width * ratio)), Math.max(1, Math.round(view.height * ratio)));
  const place = {
    ax: target.canvas.width / (view.x1 - view.x0), x0: view.x0,
    ay: -target.canvas.height / (view.y1 - view.y0), y0: view.y0, height: target.canvas.height,
  };
  if (layer.n > DENSITY_ABOVE) {
    stampDensity(target, place, layer, pictures);
  } else {
    stampPoints(target, place, layer, pictures, true);
    stampPoints(target, place, layer, pictures, false);
  }

  target.context.putImageData(target.image, 0, 0);
  context.drawImage(target.canvas, view.left, view.top, view.width, view.height);
}

function stampPoints(target, place, layer, pictures, missing) {
  const { pixels } = target;
  const { width, height } = target.canvas;
  const { numbers } = layer;
  const half = pictures[0].cell / 2;
  for (let i = 0; i < layer.n; i++) {
    const bin = layer.bins[i];
    if ((bin === MISSING) !== missing) {
      continue;
    }

    const left = Math.round((numbers[layer.x + i] - place.x0) * place.ax - half);
    const top = Math.round(place.height + (numbers[layer.y + i] - place.y0) * place.ay - half);
    if (!(left > -2 * half && left < width && top > -2 * half && top < height)) {
      continue;
    }

    const { columns, rows, colours } = pictures[missing ? pictures.length - 1 : bin];
    for (let k = 0; k < colours.length; k++) {
      const x = left + columns[k];
      const y = top + rows[k];
      if (x >= 0 && x < width && y >= 0 && y < height) {
        const at = y * width + x;
        const above = colours[k];
        const below = pixels[at];
        pixels[at] = above >= OPAQUE || below === 0 ? above : over(above, below);
      }
    }
  }
}

/** A colour over another, each with its alpha in the highest byte. Two parts at a time, which leaves their products room. */
function over(above, below) {
  const a = above >>> 24;
  const rest = ((below >>> 24) * (255 - a) + 127) / 255 | 0;
  const alpha = a + rest;
  const share = (a << 8) / alpha | 0;
  const odd = ((above & 0xff00ff) * share + (below & 0xff00ff) * (256 - share)) / 256 & 0xff00ff;
  const even = ((above >>> 8 & 0xff) * share + (below >>> 8 & 0xff) * (256 - share)) & 0xff00;
  return (alpha << 24 | odd | even) >>> 0;
}

/** Squares of two pixels: their colour is the mean of their points' colours, their strength grows with the logarithm of the number. */
function stampDensity(target, place, layer, pictures) {
  const { width, height } = target.canvas;
  const side = 2;
  const columns = Math.ceil(width / side);
  const rows = Math.ceil(height / side);
  const counts = new Uint32Array(columns * rows);
  const sums = new Float64Array(columns * rows);
  let most = 1;
  for (let i = 0; i < layer.n; i++) {
    const column = Math.floor((layer.numbers[layer.x + i] - place.x0) * place.ax / side);
    const row = Math.floor((place.height + (layer.numbers[layer.y + i] - place.y0) * place.ay) / side);
    if (column >= 0 && column < columns && row >= 0 && row < rows && layer.bins[i] !== MISSING) {
      const at = row * columns + column;
      sums[at] += layer.bins[i];
      most = Math.max(most, ++counts[at]);
    }
  }

  // The middle pixel of a picture has its full colour.
  const full = pictures.map(p => p.colours[p.colours.length >> 1] & 0xffffff);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const at = Math.floor(y / side) * columns + Math.floor(x / side);
      if (counts[at] > 0) {
        const alpha = 255 * (0.25 + 0.75 * Math.log1p(counts[at]) / Math.log1p(most));
        target.pixels[y * width + x] = (alpha << 24 | full[Math.round(sums[at] / counts[at])]) >>> 0;
      }
    }
  }
}

function tracePoints(context, view, layer) {
  context.beginPath();
  let pen = false;
  for (let i = 0; i < layer.n; i++) {
    const x = layer.numbers[layer.x + i];
    const y = layer.numbers[layer.y + i];
    if (Number.isNaN(x) || Number.isNaN(y)) {
      pen = false;
    } else if (pen) {
      context.lineTo(toX(view, x), toY(view, y));
    } else {
      context.moveTo(toX(view, x), toY(view, y));
      pen = true;
    }
  }
}

function drawLine(context, view, layer) {
  tracePoints(context, view, layer);
  context.strokeStyle = resolve(layer.colour);
  context.lineWidth = layer.width;
  context.setLineDash(layer.dashed ? [6, 4] : []);
  context.stroke();
  context.setLineDash([]);
}

function drawPolygon(context, view, layer) {
  tracePoints(context, view, layer);
  context.closePath();
  context.globalAlpha = layer.opacity;
  context.fillStyle = resolve(layer.colour);
  context.fill();
  context.globalAlpha = 1;
  context.strokeStyle = resolve(layer.colour);
  context.lineWidth = 1.25;
  context.setLineDash(layer.dashed ? [6, 4] : []);
  context.stroke();
  context.setLineDash([]);
}

function drawArrows(context, view, layer) {
  context.font = font(13);
  for (const arrow of layer.arrows) {
    const [x0, y0, x1, y1] = [toX(view, arrow.x0), toY(view, arrow.y0), toX(view, arrow.x1), toY(view, arrow.y1)];
    const angle = Math.atan2(y1 - y0, x1 - x0);
    context.strokeStyle = context.fillStyle = resolve(arrow.colour);
    context.lineWidth = 1.5;
    context.beginPath();
    context.moveTo(x0, y0);
    context.lineTo(x1, y1);
    context.stroke();
    context.beginPath();
    context.moveTo(x1, y1);
    context.lineTo(x1 - 9 * Math.cos(angle - 0.4), y1 - 9 * Math.sin(angle - 0.4));
    context.lineTo(x1 - 9 * Math.cos(angle + 0.4), y1 - 9 * Math.sin(angle + 0.4));
    context.closePath();
    context.fill();
    label(context, arrow.label, x1 + 8 * Math.cos(angle), y1 + 8 * Math.sin(angle), Math.cos(angle) < -0.2 ? "right" : "left", view);
  }
}

function drawMarks(context, view, layer) {
  context.font = `600 ${font(13)}`;
  for (const mark of layer.marks) {
    const x = toX(view, mark.x);
    const y = toY(view, mark.y);
    context.fillStyle = context.strokeStyle = resolve(mark.colour);
    if (mark.spread) {
      context.lineWidth = 1.25;
      context.beginPath();
      context.moveTo(toX(view, mark.x - mark.spread[0]), y);
      context.lineTo(toX(view, mark.x + mark.spread[0]), y);
      context.moveTo(x, toY(view, mark.y - mark.spread[1]));
      context.lineTo(x, toY(view, mark.y + mark.spread[1]));
      context.stroke();
    }

    tracePath(context, mark.shape, x, y, 7);
    context.lineWidth = 3;
    context.strokeStyle = variable("--sheet");
    context.stroke();
    context.fill();
    context.lineWidth = 1;
    context.strokeStyle = variable("--ink");
    context.stroke();
    label(context, mark.label, x + 11, y, "left", view);
  }
}

/** Text with a halo in the sheet's colour, turned inwards where it would run over the right edge. */
function label(context, text, x, y, align, view) {
  const width = context.measureText(text).width;
  const right = align === "left" && x + width > view.left + view.width;
  context.textAlign = right ? "right" : align;
  context.textBaseline = "middle";
  context.lineWidth = 4;
  context.lineJoin = "round";
  context.strokeStyle = variable("--sheet");
  const at = right ? x - 22 : x;
  context.strokeText(text, at, y);
  context.fillStyle = variable("--ink");
  context.fillText(text, at, y);
}

const drawers = { points: drawPoints, line: drawLine, polygon: drawPolygon, arrows: drawArrows, marks: drawMarks };

/** Draws every layer inside the plot's edges. */
export function drawLayers(context, view, layers) {
  context.save();
  context.beginPath();
  context.rect(view.left, view.top, view.width, view.height);
  context.clip();
  for (const layer of layers) {
    drawers[layer.kind](context, view, layer);
  }

  context.restore();
}

/** A ring around a chosen or stepped-to point. */
export function drawRing(context, view, x, y, radius, colour) {
  const px = toX(view, x);
  const py = toY(view, y);
  if (px < view.left - 2 || px > view.left + view.width + 2 || py < view.top - 2 || py > view.top + view.height + 2) {
    return;
  }

  for (const [stroke, width] of [[variable("--sheet"), 5], [colour, 2]]) {
    context.beginPath();
    context.arc(px, py, radius, 0, 2 * Math.PI);
    context.strokeStyle = stroke;
    context.lineWidth = width;
    context.stroke();
  }
}

/** Ticks on the upper edge; a label that would touch the one before it is left out. */
export function drawTopTicks(context, view, ticks) {
  context.strokeStyle = variable("--faint");
  context.fillStyle = variable("--faint");
  context.lineWidth = 1;
  context.font = font(11);
  context.textAlign = "center";
  context.textBaseline = "bottom";
  let free = -Infinity;
  const placed = ticks.map(tick => ({ at: toX(view, tick.at), label: tick.label })).sort((a, b) => a.at - b.at);
  for (const { at, label: text } of placed) {
    if (at < view.left - 0.5 || at > view.left + view.width + 0.5) {
      continue;
    }

    context.beginPath();
    context.moveTo(at, view.top);
    context.lineTo(at, view.top - 5);
    context.stroke();
    const half = context.measureText(text).width / 2;
    if (at - half > free) {
      context.fillText(text, at, view.top - 6);
      free = at + half + 6;
    }
  }
}

/** The point nearest to a place on the screen within some pixels, or null: { layer, point }. */
export function nearest(view, layers, px, py, within) {
  let best = null;
  let least = within * within;
  for (const layer of layers) {
    if (layer.kind !== "points" || !layer.canSelect) {
      continue;
    }

    for (let i = 0; i < layer.n; i++) {
      const dx = toX(view, layer.numbers[layer.x + i]) - px;
      const dy = toY(view, layer.numbers[layer.y + i]) - py;
      const distance = dx * dx + dy * dy;
      if (distance < least) {
        least = distance;
        best = { layer, point: i };
      }
    }
  }

  return best;
}

/** Round values between two ends, about so many. */
export function roundTicks(from, to, about) {
  const low = Math.min(from, to);
  const high = Math.max(from, to);
  const raw = (high - low) / about;
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = power * [1, 2, 5, 10].find(m => m * power >= raw * 0.999);
  const ticks = [];
  for (let k = Math.ceil(low / step); k * step <= high; k++) {
    const text = (k * step).toFixed(Math.max(0, -Math.floor(Math.log10(step) + 1e-9)));
    ticks.push({ at: k * step, label: text.replace("-", "\u2212") });
  }

  return ticks;
}

// The page's colours as they stand now, and word when they change.

export function isDark() {
  return document.documentElement.dataset.theme === "dark";
}

/** The colour of a theme variable such as "--ink". */
export function variable(name) {
  return getComputedStyle(document.documentElement).getPropertyValue(name).trim() || "#888888";
}

/** A colour as it is now: one of a [light, dark] pair; var(--name) is looked up. */
export function resolve(pair) {
  const colour = pair[isDark() ? 1 : 0];
  const name = /^var\((--[a-z-]+)\)$/.exec(colour);
  return name ? variable(name[1]) : colour;
}

/** A mixture of two #rrggbb colours. */
export function mix(a, b, share) {
  const part = (hex, at) => parseInt(hex.slice(at, at + 2), 16);
  const mixed = at => Math.round(part(a, at) + share * (part(b, at) - part(a, at)));
  return `rgb(${mixed(1)}, ${mixed(3)}, ${mixed(5)})`;
}

export function font(size) {
  return `${size}px ${getComputedStyle(document.body).fontFamily}`;
}

/** Calls back after the theme changed; gives a function that ends it. */
export function onChange(callback) {
  const observer = new MutationObserver(callback);
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ["data-theme"] });
  return () => observer.disconnect();
}

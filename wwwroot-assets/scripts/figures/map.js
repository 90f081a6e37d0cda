// Keys and dragging of the station map; .NET draws it.

/** Takes charge of a map's element; callbacks go to the .NET object. */
export function create(host, dotnet) {
  const listeners = new AbortController();
  const options = { signal: listeners.signal };
  let start = null;
  let dragged = false;

  host.addEventListener("keydown", e => {
    if (e.ctrlKey || e.metaKey || e.altKey) {
      return;
    }

    const direction = { ArrowLeft: 0, ArrowRight: 1, ArrowUp: 2, ArrowDown: 3 }[e.key];
    const call = direction !== undefined ? ["Step", direction]
      : e.key === "Enter" ? ["Choose"]
        : e.key === "+" || e.key === "=" ? ["Zoom", 1.5]
          : e.key === "-" ? ["Zoom", 1 / 1.5]
            : e.key === "0" ? ["ShowAll"] : null;
    if (call) {
      e.preventDefault();
      dotnet.invokeMethodAsync(...call);
    }
  }, options);

  host.addEventListener("pointerdown", e => {
    if (e.pointerType === "mouse" && e.button === 0) {
      start = [e.clientX, e.clientY];
      dragged = false;
    }
  }, options);

  window.addEventListener("pointermove", e => {
    if (start) {
      const [dx, dy] = [e.clientX - start[0], e.clientY - start[1]];
      dragged ||= Math.hypot(dx, dy) > 4;
      host.firstElementChild.style.transform = dragged ? `translate(${dx}px, ${dy}px)` : "";
    }
  }, options);

  window.addEventListener("pointerup", async e => {
    if (!start) {
      return;
    }

    const [dx, dy] = [e.clientX - start[0], e.clientY - start[1]];
    start = null;
    if (dragged) {
      await dotnet.invokeMethodAsync("Pan", -dx / host.clientWidth, dy / host.clientHeight);
      host.firstElementChild.style.transform = "";
    }
  }, options);

  // A drag that ends over a station does not choose it.
  host.addEventListener("click", e => {
    if (dragged) {
      e.stopPropagation();
      dragged = false;
    }
  }, { ...options, capture: true });

  return { dispose: () => listeners.abort() };
}

// Sends files to the server one after another and tells the component how far each is.
// The component calls "attach" once; the person's files never pass through the page's connection.

/**
 * @param {HTMLElement} area the element files are dropped on; it holds the file input
 * @param {object} component told of FilesChosen, Progress, Received, Refused, Cancelled
 * @param {string} token header name of the antiforgery token
 */
export function attach(area, component) {
    const input = area.querySelector("input[type=file]");
    const waiting = [];
    let sending = null;
    let nextId = 0;

    function isFileDrag(event) {
        return event.dataTransfer?.types.includes("Files");
    }

    async function add(files) {
        const added = [...files].map(file => ({ id: nextId++, file }));
        if (added.length === 0) {
            return;
        }

        waiting.push(...added);
        await component.invokeMethodAsync("FilesChosen", added.map(a => ({ id: a.id, name: a.file.name, bytes: a.file.size })));
        await next();
    }

    async function next() {
        if (sending || waiting.length === 0) {
            return;
        }

        const entry = waiting.shift();
        sending = { id: entry.id, request: null };
        try {
            await send(entry, sending);
        } finally {
            sending = null;
        }

        await next();
    }

    async function send(entry, mine) {
        let token;
        try {
            token = await (await fetch("uploads/token", { cache: "no-store" })).json();
        } catch {
            await component.invokeMethodAsync("Refused", entry.id, "The server could not be reached. Check that WaterMix is running, then add the file again.");
            return;
        }

        const address = await component.invokeMethodAsync("AddressOf", entry.id);
        if (!address) {
            return; // Cancelled meanwhile.
        }

        await new Promise(done => {
            const request = new XMLHttpRequest();
            mine.request = request;
            let told = 0;
            request.upload.addEventListener("progress", event => {
                if (event.lengthComputable && performance.now() - told > 100) {
                    told = performance.now();
                    component.invokeMethodAsync("Progress", entry.id, event.loaded / event.total);
                }
            });
            request.addEventListener("load", async () => {
                if (request.status >= 200 && request.status < 300) {
                    await component.invokeMethodAsync("Received", entry.id);
                } else {
                    await component.invokeMethodAsync("Refused", entry.id, reasonOf(request));
                }

                done();
            });
            request.addEventListener("error", async () => {
                await component.invokeMethodAsync("Refused", entry.id, "The connection broke off. Check that WaterMix is running and that the file has not been moved, then add it again.");
                done();
            });
            request.addEventListener("abort", done);
            request.open("POST", address);
            request.setRequestHeader(token.header, token.value);
            const form = new FormData();
            form.append("file", entry.file, entry.file.name);
            request.send(form);
        });
    }

    function reasonOf(request) {
        try {
            return JSON.parse(request.responseText).detail ?? `The server answered ${request.status}.`;
        } catch {
            return `The server answered ${request.status}. Add the file again.`;
        }
    }

    const stop = event => {
        if (isFileDrag(event)) {
            event.preventDefault();
        }
    };
    let depth = 0;
    const listeners = {
        dragenter: event => {
            if (isFileDrag(event)) {
                event.preventDefault();
                depth++;
                area.classList.add("is-over");
            }
        },
        dragleave: event => {
            if (isFileDrag(event) && --depth === 0) {
                area.classList.remove("is-over");
            }
        },
        dragover: stop,
        drop: event => {
            if (isFileDrag(event)) {
                event.preventDefault();
                depth = 0;
                area.classList.remove("is-over");
                add(event.dataTransfer.files);
            }
        },
        change: event => {
            if (event.target === input) {
                const files = [...input.files];
                input.value = ""; // So that the same file can be chosen again after it was mended.
                add(files);
            }
        },
    };
    for (const [name, listener] of Object.entries(listeners)) {
        area.addEventListener(name, listener);
    }

    // A file that misses the area must not replace the page.
    addEventListener("dragover", stop);
    addEventListener("drop", stop);

    return {
        choose: () => input.click(),
        cancel(id) {
            const index = waiting.findIndex(entry => entry.id === id);
            if (index >= 0) {
                waiting.splice(index, 1);
            } else if (sending?.id === id) {
                sending.request?.abort();
            }
        },
        detach() {
            waiting.length = 0;
            sending?.request?.abort();
            removeEventListener("dragover", stop);
            removeEventListener("drop", stop);
            for (const [name, listener] of Object.entries(listeners)) {
                area.removeEventListener(name, listener);
            }
        },
    };
}

// Ctrl+Z and Ctrl+Y for the page. A field in which something is typed that is not stored yet keeps the browser's own undo.

export function listen(page) {
    let typedInto = null;

    function input(event) {
        typedInto = event.target;
    }

    function change() {
        typedInto = null;
    }

    function keydown(event) {
        if (!(event.ctrlKey || event.metaKey) || event.altKey || (typedInto !== null && event.target === typedInto)) {
            return;
        }

        const key = event.key.toLowerCase();
        const redo = key === "y" || (key === "z" && event.shiftKey);
        if (redo || key === "z") {
            event.preventDefault();
            page.invokeMethodAsync(redo ? "Redo" : "Undo");
        }
    }

    document.addEventListener("input", input);
    document.addEventListener("change", change);
    document.addEventListener("keydown", keydown);
    return {
        stop() {
            document.removeEventListener("input", input);
            document.removeEventListener("change", change);
            document.removeEventListener("keydown", keydown);
        },
    };
}

// Light, dark, or as the system has it. Loaded in the head and without "defer", so that the colours stand before the first paint.
(() => {
    const key = "watermix-theme";
    const choices = ["system", "light", "dark"];
    const systemIsDark = matchMedia("(prefers-color-scheme: dark)");

    function chosen() {
        try {
            const stored = localStorage.getItem(key);
            return choices.includes(stored) ? stored : "system";
        } catch {
            return "system"; // Storage is switched off in this browser: the choice then lasts until the page is left.
        }
    }

    function apply(choice) {
        const dark = choice === "dark" || (choice === "system" && systemIsDark.matches);
        document.documentElement.dataset.theme = dark ? "dark" : "light";
        document.dispatchEvent(new CustomEvent("watermix-theme", { detail: { dark } }));
    }

    function choose(choice) {
        try {
            localStorage.setItem(key, choice);
        } catch {
            // As above.
        }

        apply(choice);
    }

    apply(chosen());
    systemIsDark.addEventListener("change", () => apply(chosen()));
    addEventListener("storage", event => event.key === key && apply(chosen()));

    // The switch is an element of its own, so that it works before the page is connected and after it was redrawn.
    customElements.define("theme-switch", class extends HTMLElement {
        connectedCallback() {
            const select = document.createElement("select");
            select.setAttribute("aria-label", "Theme");
            for (const choice of choices) {
                const option = new Option(`${choice[0].toUpperCase()}${choice.slice(1)} theme`, choice);
                select.add(option);
            }

            select.value = chosen();
            select.addEventListener("change", () => choose(select.value));
            this.replaceChildren(select);
        }
    });
})();

// Says when the page has lost its server, keeps trying, and finds the way back: to the same page as it was, or, where the server was
// started anew, to the same address loaded afresh.
(() => {
    const notice = document.getElementById("components-reconnect-modal");
    const sentence = notice.querySelector("p");
    const pause = 2000;
    let searching = false;

    function show(text) {
        sentence.textContent = text;
        notice.hidden = false;
        // What is typed now would be lost: the page rests until the server is back.
        document.querySelector(".page")?.setAttribute("inert", "");
    }

    function hide() {
        notice.hidden = true;
        document.querySelector(".page")?.removeAttribute("inert");
    }

    async function search() {
        if (searching) {
            return;
        }

        searching = true;
        show("WaterMix does not answer. Is it still running? This page tries again every two seconds and goes on where you left it.");
        while (searching) {
            await new Promise(wake => setTimeout(wake, pause));
            try {
                const answer = await fetch("health", { cache: "no-store" });
                if (!answer.ok) {
                    continue;
                }

                if (await Blazor.reconnect()) {
                    searching = false;
                    hide();
                } else {
                    location.reload();
                    return;
                }
            } catch {
                // Not there yet.
            }
        }
    }

    notice.addEventListener("components-reconnect-state-changed", event => {
        switch (event.detail.state) {
            case "show":
                show("The connection to WaterMix is lost. Trying again; nothing you saved is lost.");
                break;
            case "hide":
                searching = false;
                hide();
                break;
            case "failed":
                search();
                break;
            case "rejected":
                // The server was started anew, or has let the page go: load the same address again.
                location.reload();
                break;
        }
    });
})();

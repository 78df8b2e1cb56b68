// The answer follows the typing. Without this script every button still works.
(() => {
  "use strict";
  const form = document.getElementById("typing");
  if (!form) {
    return;
  }
  const heard = document.getElementById("heard");
  let timer = 0;
  let running = null;
  let last = "";
  let changed = false;

  const spoken = (answer) => {
    const verdict = answer.querySelector(".verdict");
    const text = verdict ? verdict.textContent.trim().replace(/\s+/g, " ") : "";
    if (text !== last) {
      last = text;
      heard.textContent = text;
    }
  };

  const open = () => Array.from(document.querySelectorAll("#answer details")).map((each) => each.open);

  const follow = async () => {
    if (running) {
      running.abort();
    }
    running = new AbortController();
    try {
      const response = await fetch(form.dataset.preview, {
        method: "POST",
        body: new URLSearchParams(new FormData(form)),
        signal: running.signal,
      });
      if (!response.ok) {
        return;
      }
      const page = new DOMParser().parseFromString(await response.text(), "text/html");
      const answer = page.getElementById("answer");
      const now = document.getElementById("answer");
      if (answer && now) {
        const states = open();
        now.replaceWith(answer);
        answer.querySelectorAll("details").forEach((each, i) => {
          if (i < states.length) {
            each.open = states[i];
          }
        });
        spoken(answer);
        if (response.headers.has("Refresh")) {
          window.clearTimeout(timer);
          timer = window.setTimeout(follow, 1000);
        }
      }
    } catch (error) {
      if (error.name !== "AbortError") {
        heard.textContent = "The answer could not be fetched; what you typed is still here.";
      }
    }
  };

  form.addEventListener("input", () => {
    changed = true;
    window.clearTimeout(timer);
    timer = window.setTimeout(follow, 350);
  });
  form.addEventListener("submit", () => {
    changed = false;
  });
  window.addEventListener("beforeunload", (event) => {
    if (changed) {
      event.preventDefault();
    }
  });
  const summary = document.getElementById("summary");
  if (summary) {
    summary.focus();
  }
})();

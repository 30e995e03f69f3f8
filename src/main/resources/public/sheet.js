// Makes the pages quicker. Everything works without it.
"use strict";

(function () {
  const form = document.querySelector("form[data-sheet]");
  if (form) {
    let timer = 0;
    let latest = 0;

    const show = function (answer) {
      const section = document.querySelector(".drawing");
      const sketch = section.querySelector("[data-sketch]");
      let image = sketch.querySelector("[data-drawing]");
      if (answer.source !== "") {
        if (!image) {
          image = document.createElement("img");
          image.setAttribute("data-drawing", "");
          sketch.replaceChildren(image);
        }
        if (image.getAttribute("src") !== answer.source) {
          image.src = answer.source;
        }
        image.alt = answer.words;
      }
      const status = section.querySelector("[data-status]");
      if (status.textContent !== answer.status) {
        status.textContent = answer.status;
      }
      for (const [path, text] of Object.entries(answer.readings)) {
        const line = document.getElementById(path + "-reading");
        if (line && line.textContent !== text) {
          line.textContent = text;
        }
      }
    };

    const draw = function () {
      const mine = ++latest;
      fetch("/drawing", { method: "POST", body: new URLSearchParams(new FormData(form)) })
        .then(function (response) { return response.ok ? response.json() : null; })
        .then(function (answer) { if (answer && mine === latest) { show(answer); } })
        .catch(function () { });
    };

    form.addEventListener("input", function () {
      window.clearTimeout(timer);
      timer = window.setTimeout(draw, 600);
    });
  }

  // An answer that has sizes of its own opens their fold; the others shut it.
  document.addEventListener("change", function (event) {
    const unfolds = event.target.getAttribute("data-unfolds");
    const fold = unfolds ? document.getElementById(unfolds.replace(/^-/, "")) : null;
    if (fold) {
      fold.open = !unfolds.startsWith("-");
    }
  });

  // A link to a question inside a fold opens the fold.
  const unfold = function () {
    let target = window.location.hash.length > 1 ? document.getElementById(decodeURIComponent(window.location.hash.slice(1))) : null;
    const found = target;
    while (target) {
      if (target.tagName === "DETAILS") {
        target.open = true;
      }
      target = target.parentElement;
    }
    if (found) {
      found.scrollIntoView();
      const box = found.matches("input, select") ? found : found.querySelector("input:not([type=hidden]), select");
      if (box) {
        box.focus({ preventScroll: true });
      }
    }
  };
  window.addEventListener("hashchange", unfold);
  unfold();

  const problems = document.querySelector(".problems");
  if (problems && window.location.hash.length < 2) {
    problems.focus();
  }

  const drop = document.querySelector("form[data-drop]");
  if (drop) {
    const over = function (on) { return function (event) { event.preventDefault(); drop.classList.toggle("over", on); }; };
    drop.addEventListener("dragover", over(true));
    drop.addEventListener("dragleave", over(false));
    drop.addEventListener("drop", function (event) {
      over(false)(event);
      if (event.dataTransfer.files.length > 0) {
        drop.querySelector("input[type=file]").files = event.dataTransfer.files;
        drop.submit();
      }
    });
  }
})();

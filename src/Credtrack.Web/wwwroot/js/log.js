// The form works without this file. With it, choosing an application shows its views and questions at once, and chosen files are named.
const form = document.getElementById("log");
document.documentElement.classList.add("has-script");

const all = form.querySelector(".all-apps");
const summary = all.querySelector("summary");
const unchosen = summary.textContent;

function showChosen() {
  const chosen = form.querySelector("input[name='Form.Application']:checked")?.value;
  for (const block of form.querySelectorAll("[data-application]")) {
    const off = block.dataset.application !== chosen;
    block.hidden = off;
    block.disabled = off;
  }
  const hidden = all.querySelector("label:has(:checked)");
  summary.textContent = hidden ? `${hidden.textContent.trim()} chosen; all applications` : unchosen;
}

form.addEventListener("change", (event) => {
  if (event.target.name === "Form.Application") showChosen();
  if (event.target.type === "file") {
    const words = event.target.parentElement.querySelector("span");
    const many = event.target.files.length;
    words.textContent = many === 0 ? "Attach images" : many === 1 ? "1 picture chosen" : `${many} pictures chosen`;
  }
});

// A pointer has chosen, so the list folds up; with arrow keys one is still on the way through it (their clicks have detail 0).
all.addEventListener("click", (event) => {
  if (event.detail === 0 || event.target.name !== "Form.Application") return;
  all.open = false;
  summary.focus();
});

// One press is one scan: the button rests while the form is on its way.
form.addEventListener("submit", () => {
  for (const button of document.querySelectorAll("button[form='log']")) button.setAttribute("aria-disabled", "true");
});

showChosen();

// The form works without this file. With it, choosing an application shows its views and questions at once, and chosen files are named.
const form = document.getElementById("log");
document.documentElement.classList.add("has-script");

function showChosen() {
  const chosen = form.querySelector("input[name='Form.Application']:checked")?.value;
  for (const block of form.querySelectorAll("[data-application]")) {
    const off = block.dataset.application !== chosen;
    block.hidden = off;
    block.disabled = off;
  }
}

form.addEventListener("change", (event) => {
  if (event.target.name === "Form.Application") {
    showChosen();
    event.target.closest("details")?.removeAttribute("open");
    const all = form.querySelector(".all-apps > summary");
    const label = event.target.closest("label");
    if (all && label.closest(".all-apps")) all.textContent = `${label.textContent.trim()} chosen; all applications`;
  }
  if (event.target.type === "file") {
    const words = event.target.parentElement.querySelector("span");
    const many = event.target.files.length;
    words.textContent = many === 0 ? "Attach images" : many === 1 ? "1 picture chosen" : `${many} pictures chosen`;
  }
});

// One press is one scan: the button rests while the form is on its way.
form.addEventListener("submit", () => {
  for (const button of document.querySelectorAll("button[form='log']")) button.setAttribute("aria-disabled", "true");
});

showChosen();

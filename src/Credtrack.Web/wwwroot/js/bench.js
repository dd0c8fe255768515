// Keys for those who read twenty scans in a row. Everything they do can be done with pointer, touch or Tab as well.
document.documentElement.classList.add("has-script");
const form = document.getElementById("reading");
const on = document.getElementById("keys-on");
on.checked = localStorage.getItem("bench-keys") !== "off";
on.addEventListener("change", () => localStorage.setItem("bench-keys", on.checked ? "on" : "off"));

const isText = (element) => element.matches("textarea, select, input:not([type=radio], [type=checkbox])");

const keys = {
  v() {
    const views = [...form.querySelectorAll("input[name='Form.Views']")];
    const all = views.every((view) => view.checked);
    for (const view of views) view.checked = !all;
    views[0]?.focus();
  },
  q() {
    const open = [...form.querySelectorAll("[role=radiogroup]")].find((group) => !group.querySelector(":checked"));
    open?.querySelector("input").focus();
  },
  t() { form.querySelector("textarea").focus(); },
  l() { document.getElementById("later")?.click(); },
  "?"() {
    const help = document.getElementById("keys");
    help.open = true;
    help.querySelector("summary").focus();
  },
};

document.addEventListener("keydown", (event) => {
  if (event.key === "Enter" && (event.ctrlKey || event.metaKey)) {
    event.preventDefault();
    form.requestSubmit();
    return;
  }
  if (!on.checked || event.ctrlKey || event.metaKey || event.altKey || isText(event.target)) return;
  const quality = form.querySelector(`input[name='Form.Quality'][value='${CSS.escape(event.key)}']`);
  const act = quality ? () => { quality.checked = true; quality.focus(); } : keys[event.key.toLowerCase()];
  if (!act) return;
  event.preventDefault();
  act();
});

"use strict";
// Sorts, filters, copies and points. Everything it needs stands in the page; without it the page
// can still be read from top to bottom.
(() => {
  const all = (selector, within = document) => [...within.querySelectorAll(selector)];
  const fleet = document.querySelector("table.fleet");

  // What a cell is sorted by: its own key, else its text; numbers may carry < or > of a laboratory.
  const key = (row, column, numeric) => {
    const cell = row.cells[column];
    const text = cell.dataset.v ?? cell.textContent.trim();
    if (!numeric) return text === "" ? null : text;
    const number = parseFloat(text.replace(/^[<>]/, ""));
    return Number.isNaN(number) ? null : number;
  };

  const compare = (a, b) =>
    typeof a === "number" ? a - b : a.localeCompare(b, "en", { numeric: true });

  const sortable = (table) => {
    const body = table.tBodies[0];
    const original = [...body.rows];
    all("th[data-sort]", table).forEach((head) => {
      const button = document.createElement("button");
      button.type = "button";
      button.append(...head.childNodes);
      head.append(button);
      button.addEventListener("click", () => {
        const next = { none: "ascending", ascending: "descending", descending: "none" };
        const order = next[head.getAttribute("aria-sort") ?? "none"];
        all("th[aria-sort]", table).forEach((other) => other.removeAttribute("aria-sort"));
        if (order !== "none") head.setAttribute("aria-sort", order);
        const sign = order === "descending" ? -1 : 1;
        const column = head.cellIndex;
        const keys = new Map(
          original.map((row) => [row, key(row, column, head.dataset.sort === "number")]));
        const rows = order === "none" ? original : [...original].sort((a, b) => {
          const [x, y] = [keys.get(a), keys.get(b)];
          if (x === null || y === null) return (x === null) - (y === null);
          return sign * compare(x, y);
        });
        body.append(...rows);
      });
    });
  };

  const filterable = (table, controls) => {
    const rows = [...table.tBodies[0].rows];
    const find = controls.querySelector("#find");
    const shown = controls.querySelector("#shown");
    const choices = all("select[data-filter]", controls);
    const apply = () => {
      const words = find.value.toLowerCase().split(/\s+/).filter((word) => word);
      let count = 0;
      rows.forEach((row) => {
        const text = row.dataset.find.toLowerCase();
        const keep =
          words.every((word) => text.includes(word)) &&
          choices.every((choice) =>
            choice.value === "" || row.dataset[choice.dataset.filter] === choice.value);
        row.hidden = !keep;
        count += keep;
      });
      shown.textContent = `${count} of ${rows.length} assets`;
    };
    find.addEventListener("input", apply);
    choices.forEach((choice) => choice.addEventListener("change", apply));
    controls.hidden = false;
    apply();
  };

  // A cell of a CSV file: numbers plain, text that looks like a formula made inert.
  const csvCell = (cell) => {
    let text = cell.textContent.replace(/\s+/g, " ").trim();
    if (cell.classList.contains("n")) {
      text = text.replace(/(\d)[\u202f ](?=\d{3}\b)/g, "$1").replace(/^\u2212/, "-");
    }
    if (/^[=+\-@]/.test(text) && !/^[+-]?\d+(\.\d+)?$/.test(text)) text = "'" + text;
    return /[",]/.test(text) ? '"' + text.replace(/"/g, '""') + '"' : text;
  };

  const csv = (table) =>
    [...table.rows]
      .filter((row) => !row.hidden)
      .map((row) => [...row.cells].map(csvCell).join(","))
      .join("\r\n") + "\r\n";

  const toClipboard = async (text) => {
    try {
      await navigator.clipboard.writeText(text);
    } catch {
      const area = document.createElement("textarea");
      area.value = text;
      document.body.append(area);
      area.select();
      document.execCommand("copy");
      area.remove();
    }
  };

  const copyable = (table) => {
    const button = document.createElement("button");
    button.type = "button";
    button.className = "copy";
    button.textContent = "copy as CSV";
    button.setAttribute("aria-label", `copy table ${table.dataset.name} as CSV`);
    button.addEventListener("click", async () => {
      await toClipboard(csv(table));
      button.textContent = "copied";
      setTimeout(() => (button.textContent = "copy as CSV"), 2000);
    });
    table.parentElement.before(button);
  };

  // A table that is wider than its place can be reached by keyboard and says that there is more.
  const watchWidth = new ResizeObserver((entries) =>
    entries.forEach(({ target }) => {
      const wider = target.scrollWidth > target.clientWidth + 1;
      target.classList.toggle("wider", wider);
      if (wider) {
        target.tabIndex = 0;
        target.setAttribute("role", "region");
        target.setAttribute("aria-label", `table ${target.firstElementChild.dataset.name ?? ""}`);
      } else {
        ["tabindex", "role", "aria-label"].forEach((name) => target.removeAttribute(name));
      }
    }));

  const tip = document.createElement("div");
  tip.id = "tip";
  tip.hidden = true;
  tip.setAttribute("aria-hidden", "true"); // the place itself carries the same words
  document.body.append(tip);

  const showTip = (spot) => {
    const [first, ...rest] = spot.getAttribute("aria-label").split("\n");
    const head = document.createElement("b");
    head.textContent = first;
    tip.replaceChildren(head, ...rest.map((line) => {
      const part = document.createElement("div");
      part.textContent = line;
      return part;
    }));
    tip.hidden = false;
    const place = spot.getBoundingClientRect();
    const tall = place.height > tip.offsetHeight;
    const right = place.right + 10;
    const fits = right + tip.offsetWidth < innerWidth;
    const left = tall ? (fits ? right : place.left - tip.offsetWidth - 10) : place.left + 40;
    const top = tall ? Math.max(place.top + 30, 8) : place.bottom + 6;
    tip.style.left = `${Math.max(8, Math.min(left, innerWidth - tip.offsetWidth - 8))}px`;
    tip.style.top = `${Math.max(8, Math.min(top, innerHeight - tip.offsetHeight - 8))}px`;
  };

  // A place that has the focus keeps its words.
  const hideTip = () => {
    const focused = document.activeElement;
    const spot = focused?.matches(".spots a") ? focused.firstElementChild : focused;
    if (spot?.matches(".spot")) showTip(spot);
    else tip.hidden = true;
  };

  const choose = (spot) => {
    all(".spot[tabindex='0']", spot.parentElement).forEach((old) => {
      old.tabIndex = -1;
      old.setAttribute("aria-selected", "false");
    });
    spot.tabIndex = 0;
    spot.setAttribute("aria-selected", "true");
    spot.focus();
  };

  const spotOf = (event) => {
    const target = event.target;
    if (!(target instanceof Element)) return null;
    return target.closest(".spot") ?? target.closest(".spots a")?.firstElementChild ?? null;
  };

  document.addEventListener("pointerover", (event) => {
    const spot = spotOf(event);
    if (spot) showTip(spot);
  });
  document.addEventListener("pointerout", (event) => {
    if (spotOf(event)) hideTip();
  });
  document.addEventListener("focusin", (event) => {
    const spot = spotOf(event);
    if (spot) showTip(spot);
  });
  document.addEventListener("focusout", (event) => {
    if (spotOf(event)) tip.hidden = true;
  });
  document.addEventListener("click", (event) => {
    const spot = spotOf(event);
    if (spot?.matches("[role=option]")) choose(spot);
  });
  document.addEventListener("scroll", () => tip.hidden || hideTip(), { passive: true });
  document.addEventListener("keydown", (event) => {
    if (event.key === "Escape") tip.hidden = true;
    const spot = event.target instanceof Element && event.target.closest("[role=option]");
    if (!spot) return;
    const spots = all("[role=option]", spot.parentElement);
    const at = spots.indexOf(spot);
    const to = { ArrowLeft: at - 1, ArrowRight: at + 1, Home: 0, End: spots.length - 1 }[event.key];
    if (to === undefined) return;
    event.preventDefault();
    choose(spots[Math.max(0, Math.min(spots.length - 1, to))]);
  });

  all("table[data-name]").forEach(copyable);
  all(".scroll").forEach((place) => watchWidth.observe(place));
  if (fleet) {
    sortable(fleet);
    filterable(fleet, document.querySelector(".controls"));
  }
})();

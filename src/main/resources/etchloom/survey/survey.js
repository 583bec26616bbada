"use strict";
// Rows come as [variant, passed, reason, values of the varied keys, figures, has a spec], the figures
// in the order of data.columns. Everything is put in as text, never as markup.
const data = JSON.parse(document.getElementById("data").textContent);
const byId = (id) => document.getElementById(id);
const SVG = "http://www.w3.org/2000/svg";
const LEFT = 76, RIGHT = 16, TOP = 16, BOTTOM = 52;
const MOST = 1000; // table rows shown at once

const columns = data.columns.map((path, i) => ({ path, of: (row) => row[4][i] }));
const axes = data.keys.map((path, i) => ({ path, i, of: (row) => leading(row[3][i]) }))
  .filter((c) => sameUnit(c.i) && data.rows.some((r) => typeof c.of(r) === "number"));
const choices = axes.concat(columns.filter((c) => data.rows.some((r) => typeof c.of(r) === "number")))
  .concat([{ path: "variant", of: (row) => row[0] }]);
let sorted = { of: null, down: false };
let chosen = null;
let reached = null; // the point that the tab key comes to
let now = null; // the figures chosen, and what no other beats in both
const points = new Map();

function leading(text) {
  const n = parseFloat(text);
  return Number.isFinite(n) ? n : null;
}

/** A length in mm and one in mil cannot stand on one axis by their numbers. */
function sameUnit(i) {
  const units = data.rows.map((r) => String(r[3][i])).filter((v) => leading(v) !== null)
    .map((v) => v.replace(/^[-+.0-9eE]*\s*/, ""));
  return new Set(units).size <= 1;
}

function make(tag, attributes, text) {
  const e = document.createElementNS(SVG, tag);
  for (const key of Object.keys(attributes)) e.setAttribute(key, attributes[key]);
  if (text !== undefined) e.textContent = text;
  return e;
}

function show(v) {
  if (v === null || v === undefined) return "";
  if (typeof v !== "number") return String(v);
  if (v === 0 || Number.isInteger(v)) return String(v);
  const size = Math.abs(v);
  const short = +v.toPrecision(5);
  return size < 1e-3 || size >= 1e6 ? short.toExponential() : String(short);
}

function axis(name) {
  return choices.find((c) => c.path === byId(name).value) || choices[0];
}

function sign(name) {
  return byId(name + "way").value === "low" ? -1 : 1;
}

/** Rows that keep the rules and that no other such row beats in one figure without losing in the other. */
function front(x, y) {
  const sx = sign("x"), sy = sign("y");
  const some = data.rows
    .filter((r) => r[1] && typeof x.of(r) === "number" && typeof y.of(r) === "number")
    .map((r) => ({ row: r, x: sx * x.of(r), y: sy * y.of(r) }))
    .sort((a, b) => b.x - a.x || b.y - a.y);
  const out = new Set();
  let most = -Infinity, lastX = null;
  for (const p of some) {
    if (p.y > most || (p.y === most && p.x === lastX)) {
      out.add(p.row);
      most = p.y;
      lastX = p.x;
    }
  }
  return out;
}

function scale(values, from, to, about) {
  let low = Math.min(...values), high = Math.max(...values);
  if (!(high > low)) {
    const pad = Math.abs(low) * 0.05 || 1;
    low -= pad;
    high += pad;
  }
  const step = nice((high - low) / about);
  const ticks = [];
  for (let k = Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * step; k++) ticks.push(k * step);
  const at = (v) => from + (to - from) * (0.04 + 0.92 * (v - low) / (high - low));
  return { at, ticks };
}

function nice(rough) {
  const ten = Math.pow(10, Math.floor(Math.log10(rough)));
  return ten * (rough / ten <= 1 ? 1 : rough / ten <= 2 ? 2 : rough / ten <= 5 ? 5 : 10);
}

/** Points in the order of one figure; what is the same in it, in the order of their numbers. */
function ordered(c) {
  return [...points.keys()].sort((a, b) => c.of(a) - c.of(b) || a[0] - b[0]);
}

function draw() {
  const x = axis("x"), y = axis("y");
  const plot = byId("plot");
  const held = plot.contains(document.activeElement);
  const wide = Math.max(280, plot.clientWidth), high = wide < 600 ? 320 : 460;
  plot.setAttribute("viewBox", "0 0 " + wide + " " + high);
  plot.replaceChildren();
  points.clear();
  const rows = data.rows.filter((r) => typeof x.of(r) === "number" && typeof y.of(r) === "number");
  const best = front(x, y);
  now = { x, y, best };
  if (rows.length) {
    const h = scale(rows.map(x.of), LEFT, wide - RIGHT, wide < 600 ? 4 : 6);
    const v = scale(rows.map(y.of), high - BOTTOM, TOP, wide < 600 ? 4 : 6);
    for (const t of h.ticks) {
      plot.append(make("line", { class: "grid", x1: h.at(t), x2: h.at(t), y1: TOP, y2: high - BOTTOM }));
      plot.append(make("text", { x: h.at(t), y: high - BOTTOM + 18, "text-anchor": "middle" }, show(t)));
    }
    for (const t of v.ticks) {
      plot.append(make("line", { class: "grid", x1: LEFT, x2: wide - RIGHT, y1: v.at(t), y2: v.at(t) }));
      plot.append(make("text", { x: LEFT - 8, y: v.at(t) + 4, "text-anchor": "end" }, show(t)));
    }
    const line = [...best].sort((a, b) => x.of(a) - x.of(b))
      .map((r) => h.at(x.of(r)) + "," + v.at(y.of(r))).join(" ");
    plot.append(make("polyline", { class: "front", points: line }));
    for (const r of rows.slice().sort((a, b) => best.has(a) - best.has(b))) {
      const c = make("circle", { cx: h.at(x.of(r)), cy: v.at(y.of(r)), r: best.has(r) ? 6 : 4.5 });
      c.setAttribute("class", (r[1] ? "" : "broken ") + (best.has(r) ? "best" : ""));
      c.setAttribute("role", "button");
      c.setAttribute("tabindex", "-1");
      c.setAttribute("aria-label", "variant " + r[0] + ": " + show(x.of(r)) + ", " + show(y.of(r))
        + (best.has(r) ? ", not beaten" : "") + (r[1] ? "" : ", breaks rules"));
      c.append(make("title", {}, c.getAttribute("aria-label")));
      c.addEventListener("click", () => choose(r, true));
      c.addEventListener("keydown", (e) => pressed(e, r));
      c.addEventListener("focus", () => reach(r));
      points.set(r, c);
      plot.append(c);
    }
  }
  plot.append(make("text", { x: (LEFT + wide - RIGHT) / 2, y: high - 8, "text-anchor": "middle" }, x.path));
  plot.append(make("text", { x: 14, y: high / 2, "text-anchor": "middle",
    transform: "rotate(-90 14 " + high / 2 + ")" }, y.path));
  byId("count").textContent = rows.length + " of " + data.rows.length + " variants have both figures; "
    + best.size + " of those that keep the rules are beaten by none in both at once.";
  table();
  reach(points.has(reached) ? reached : points.has(chosen) ? chosen : ordered(x)[0]);
  if (held && points.has(reached)) points.get(reached).focus();
}

/** Points are one stop of the tab key; inside, the arrows go along either axis. */
function reach(row) {
  if (points.has(reached)) points.get(reached).setAttribute("tabindex", "-1");
  reached = row;
  if (points.has(row)) points.get(row).setAttribute("tabindex", "0");
}

function pressed(e, row) {
  const step = { ArrowRight: ["x", 1], ArrowLeft: ["x", -1], ArrowUp: ["y", 1], ArrowDown: ["y", -1] }[e.key];
  if (e.key === "Enter" || e.key === " ") {
    choose(row, true);
  } else if (step) {
    const line = ordered(now[step[0]]);
    const next = line[line.indexOf(row) + step[1]];
    if (next) points.get(next).focus();
  } else {
    return;
  }
  e.preventDefault();
}

function heads() {
  const list = [
    { name: "variant", of: (r) => r[0], button: true },
    { name: "not beaten", of: (r) => (now.best.has(r) ? "yes" : "") },
    { name: "keeps rules", of: (r) => (r[1] ? "yes" : "no") },
    { name: "spec", of: (r) => (r[5] ? r[0] : ""), link: true },
  ];
  data.keys.forEach((k, i) => {
    const by = sameUnit(i) ? (r) => leading(r[3][i]) ?? r[3][i] : (r) => r[3][i];
    list.push({ name: k, of: (r) => r[3][i], by });
  });
  const figures = [now.x, now.y].filter((c) => columns.includes(c));
  for (const path of data.shown) {
    const c = columns.find((k) => k.path === path);
    if (c) figures.push(c);
  }
  [...new Set(figures)].forEach((c) => list.push({ name: c.path, of: c.of, number: true }));
  list.push({ name: "reason", of: (r) => r[2], reason: true });
  return list;
}

/** Numbers before words, what is missing at the end either way. */
function compare(p, q) {
  const none = (v) => v === null || v === undefined || v === "";
  if (none(p) || none(q)) return { last: none(p) - none(q), order: 0 };
  if (typeof p !== typeof q) return { last: 0, order: typeof p === "number" ? -1 : 1 };
  return { last: 0, order: p < q ? -1 : p > q ? 1 : 0 };
}

function table() {
  const list = heads();
  const key = list.find((c) => c.name === sorted.of);
  const rows = data.rows.slice();
  if (key) {
    const by = key.by || key.of;
    rows.sort((a, b) => {
      const c = compare(by(a), by(b));
      return c.last || (sorted.down ? -c.order : c.order) || a[0] - b[0];
    });
  } else if (data.order.length) {
    const place = new Map(data.order.map((v, i) => [v, i]));
    rows.sort((a, b) => place.get(a[0]) - place.get(b[0]));
  }
  const at = chosen ? rows.indexOf(chosen) : -1;
  if (at >= MOST) rows.splice(MOST - 1, 0, rows.splice(at, 1)[0]);
  const head = document.createElement("tr");
  for (const c of list) head.append(headCell(c));
  byId("head").replaceChildren(head);
  byId("body").replaceChildren(...rows.slice(0, MOST).map((r) => line(r, list)));
  byId("more").textContent = rows.length > MOST ? "The table shows " + MOST + " of " + rows.length
    + " rows; sort to see others." : "";
  mark();
}

function headCell(c) {
  const th = document.createElement("th");
  const b = document.createElement("button");
  b.textContent = c.name;
  th.scope = "col";
  th.append(b);
  if (c.number) th.className = "n";
  if (c.name === sorted.of) th.setAttribute("aria-sort", sorted.down ? "descending" : "ascending");
  b.addEventListener("click", () => {
    sorted = { of: c.name, down: sorted.of === c.name && !sorted.down };
    table();
    const again = [...byId("head").querySelectorAll("button")].find((e) => e.textContent === c.name);
    if (again) again.focus();
  });
  return th;
}

function line(r, list) {
  const tr = document.createElement("tr");
  tr.id = "v" + r[0];
  if (now.best.has(r)) tr.className = "best";
  for (const c of list) {
    const cell = document.createElement(c.button ? "th" : "td");
    if (c.number) cell.className = "n";
    if (c.reason) cell.className = "reason";
    if (c.button) {
      const b = document.createElement("button");
      b.textContent = r[0];
      cell.scope = "row";
      cell.append(b);
    } else if (c.link && r[5]) {
      cell.append(spec(r));
    } else {
      cell.textContent = show(c.of(r));
    }
    tr.append(cell);
  }
  // a press of the row's button comes here too
  tr.addEventListener("click", (e) => { if (!e.target.closest("a")) choose(r, false); });
  return tr;
}

function spec(r) {
  const a = document.createElement("a");
  a.href = "variants/" + r[0] + ".yaml";
  a.textContent = r[0] + ".yaml";
  return a;
}

/** The one chosen, in the plot, in the table and in words. */
function mark() {
  for (const [r, c] of points) {
    c.classList.toggle("on", r === chosen);
    c.setAttribute("aria-pressed", String(r === chosen));
  }
  for (const tr of byId("body").rows) {
    const on = chosen !== null && tr.id === "v" + chosen[0];
    tr.classList.toggle("on", on);
    tr.cells[0].firstChild.setAttribute("aria-pressed", String(on));
  }
  const said = byId("said");
  if (!chosen) {
    said.textContent = "None chosen yet.";
    return;
  }
  const words = ["Variant " + chosen[0]].concat(data.keys.map((k, i) => k + " " + chosen[3][i]));
  for (const c of [now.x, now.y]) {
    const v = c.of(chosen);
    if (columns.includes(c)) words.push(c.path + " " + (typeof v === "number" ? show(v) : "not known"));
  }
  said.textContent = words.join("; ") + "; " + (chosen[1] ? "keeps every rule" : chosen[2]) + ". ";
  if (chosen[5]) said.append("Ready for draw: ", spec(chosen));
}

function choose(row, fromPlot) {
  chosen = row;
  if (!byId("v" + row[0])) table();
  else mark();
  if (fromPlot) {
    // only the table moves, not the page under the reader's eyes
    const box = byId("table"), tr = byId("v" + row[0]);
    box.scrollTop += tr.getBoundingClientRect().top - box.getBoundingClientRect().top - box.clientHeight / 2;
  } else if (points.has(row)) {
    reach(row);
    const c = points.get(row);
    c.parentNode.append(c); // over the others
  }
}

for (const name of ["x", "y"]) {
  const select = byId(name);
  for (const c of choices) {
    const o = document.createElement("option");
    o.value = o.textContent = c.path;
    select.append(o);
  }
  if (choices.some((c) => c.path === data[name])) select.value = data[name];
  else if (name === "y" && choices.length > 1) select.value = choices[1].path;
  const way = () => { byId(name + "way").value = data.low.includes(select.value) ? "low" : "high"; };
  way();
  select.addEventListener("change", () => { way(); draw(); });
  byId(name + "way").addEventListener("change", draw);
}
draw();
let width = byId("plot").clientWidth;
addEventListener("resize", () => {
  if (byId("plot").clientWidth !== width) {
    width = byId("plot").clientWidth;
    draw();
  }
});

"use strict";
// Rows come as [variant, passed, reason, values of the varied keys, figures], the figures in the
// order of data.columns. Everything is put in as text, never as markup.
const data = JSON.parse(document.getElementById("data").textContent);
const byId = (id) => document.getElementById(id);
const SVG = "http://www.w3.org/2000/svg";
const WIDE = 900, HIGH = 460, LEFT = 84, RIGHT = 20, TOP = 16, BOTTOM = 52;
const MOST = 1000; // table rows shown at once

const columns = data.columns.map((path, i) => ({ path, of: (row) => row[4][i] }));
const axes = data.keys.map((path, i) => ({ path, of: (row) => leading(row[3][i]) }))
  .filter((c) => data.rows.some((r) => typeof c.of(r) === "number"));
const choices = axes.concat(columns.filter((c) => data.rows.some((r) => typeof c.of(r) === "number")))
  .concat([{ path: "variant", of: (row) => row[0] }]);
let sorted = { of: null, down: false };
let chosen = null;
const points = new Map();

function leading(text) {
  const n = parseFloat(text);
  return Number.isFinite(n) ? n : null;
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
  return size < 1e-3 || size >= 1e6 ? v.toExponential(3) : String(+v.toPrecision(5));
}

function axis(name) {
  return choices.find((c) => c.path === byId(name).value) || choices[0];
}

function better(name) {
  return byId(name + "way").value === "low" ? -1 : 1;
}

/** Rows that keep the rules and that no other such row beats in one figure without losing in the other. */
function front(x, y) {
  const sx = better("x"), sy = better("y");
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

function scale(values, from, to) {
  let low = Math.min(...values), high = Math.max(...values);
  if (!(high > low)) {
    const pad = Math.abs(low) * 0.05 || 1;
    low -= pad;
    high += pad;
  }
  const step = nice((high - low) / 6);
  const ticks = [];
  for (let k = Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * step; k++) ticks.push(k * step);
  const at = (v) => from + (to - from) * (0.04 + 0.92 * (v - low) / (high - low));
  return { at, ticks };
}

function nice(rough) {
  const ten = Math.pow(10, Math.floor(Math.log10(rough)));
  return ten * (rough / ten <= 1 ? 1 : rough / ten <= 2 ? 2 : rough / ten <= 5 ? 5 : 10);
}

function draw() {
  const x = axis("x"), y = axis("y");
  const plot = byId("plot");
  plot.replaceChildren();
  points.clear();
  const rows = data.rows.filter((r) => typeof x.of(r) === "number" && typeof y.of(r) === "number");
  const best = front(x, y);
  if (rows.length) {
    const h = scale(rows.map(x.of), LEFT, WIDE - RIGHT);
    const v = scale(rows.map(y.of), HIGH - BOTTOM, TOP);
    for (const t of h.ticks) {
      plot.append(make("line", { class: "grid", x1: h.at(t), x2: h.at(t), y1: TOP, y2: HIGH - BOTTOM }));
      plot.append(make("text", { x: h.at(t), y: HIGH - BOTTOM + 18, "text-anchor": "middle" }, show(t)));
    }
    for (const t of v.ticks) {
      plot.append(make("line", { class: "grid", x1: LEFT, x2: WIDE - RIGHT, y1: v.at(t), y2: v.at(t) }));
      plot.append(make("text", { x: LEFT - 8, y: v.at(t) + 4, "text-anchor": "end" }, show(t)));
    }
    const line = [...best].sort((a, b) => x.of(a) - x.of(b))
      .map((r) => h.at(x.of(r)) + "," + v.at(y.of(r))).join(" ");
    plot.append(make("polyline", { class: "front", points: line }));
    for (const r of rows.slice().sort((a, b) => best.has(a) - best.has(b))) {
      const c = make("circle", { cx: h.at(x.of(r)), cy: v.at(y.of(r)), r: best.has(r) ? 6 : 4.5 });
      c.setAttribute("class", (r[1] ? "" : "broken ") + (best.has(r) ? "best" : ""));
      c.append(make("title", {}, "variant " + r[0] + ": " + show(x.of(r)) + ", " + show(y.of(r))
        + (r[1] ? "" : "; breaks rules")));
      c.addEventListener("click", () => choose(r, true));
      points.set(r, c);
      plot.append(c);
    }
  }
  plot.append(make("text", { x: (LEFT + WIDE) / 2, y: HIGH - 8, "text-anchor": "middle" }, x.path));
  plot.append(make("text", { x: 14, y: HIGH / 2, "text-anchor": "middle",
    transform: "rotate(-90 14 " + HIGH / 2 + ")" }, y.path));
  byId("count").textContent = rows.length + " of " + data.rows.length + " variants have both figures; "
    + best.size + " of those that keep the rules are beaten by none in both at once.";
  table(x, y, best);
}

function heads(x, y, best) {
  const list = [
    { name: "variant", of: (r) => r[0] },
    { name: "not beaten", of: (r) => (best.has(r) ? "yes" : "") },
    { name: "keeps rules", of: (r) => (r[1] ? "yes" : "no") },
  ];
  data.keys.forEach((k, i) => list.push({ name: k, of: (r) => r[3][i], by: (r) => leading(r[3][i]) ?? r[3][i] }));
  const figures = [x, y].filter((c) => columns.includes(c));
  for (const path of data.shown) {
    const c = columns.find((k) => k.path === path);
    if (c) figures.push(c);
  }
  [...new Set(figures)].forEach((c) => list.push({ name: c.path, of: c.of, number: true }));
  list.push({ name: "reason", of: (r) => r[2], reason: true });
  return list;
}

function table(x, y, best) {
  const list = heads(x, y, best);
  const key = list.find((c) => c.name === sorted.of);
  const rows = data.rows.slice();
  if (key) {
    const by = key.by || key.of;
    rows.sort((a, b) => {
      const p = by(a), q = by(b);
      const none = (p === null || p === "") - (q === null || q === "");
      const order = p < q ? -1 : p > q ? 1 : 0;
      return none || (sorted.down ? -order : order) || a[0] - b[0];
    });
  } else if (data.order.length) {
    const place = new Map(data.order.map((v, i) => [v, i]));
    rows.sort((a, b) => place.get(a[0]) - place.get(b[0]));
  }
  if (chosen && rows.indexOf(chosen) >= MOST) rows.splice(MOST - 1, 0, rows.splice(rows.indexOf(chosen), 1)[0]);
  const head = document.createElement("tr");
  for (const c of list) {
    const th = document.createElement("th");
    const b = document.createElement("button");
    b.textContent = c.name;
    th.scope = "col";
    if (c.name === sorted.of) th.setAttribute("aria-sort", sorted.down ? "descending" : "ascending");
    b.addEventListener("click", () => {
      sorted = { of: c.name, down: sorted.of === c.name && !sorted.down };
      draw();
    });
    th.append(b);
    head.append(th);
  }
  const body = [];
  for (const r of rows.slice(0, MOST)) {
    const tr = document.createElement("tr");
    tr.id = "v" + r[0];
    tr.className = (best.has(r) ? "best " : "") + (r === chosen ? "on" : "");
    for (const c of list) {
      const td = document.createElement("td");
      if (c.number) td.className = "n";
      if (c.reason) td.className = "reason";
      if (c.name === "variant" && r[5]) {
        const a = document.createElement("a");
        a.href = "variants/" + r[0] + ".yaml";
        a.textContent = r[0];
        td.append(a);
      } else {
        td.textContent = show(c.of(r));
      }
      tr.append(td);
    }
    tr.addEventListener("click", () => choose(r, false));
    body.push(tr);
  }
  byId("head").replaceChildren(head);
  byId("body").replaceChildren(...body);
  byId("more").textContent = rows.length > MOST ? "The table shows the first " + MOST + " rows; sort to see others." : "";
  mark();
}

function mark() {
  for (const [r, c] of points) c.classList.toggle("on", r === chosen);
}

function choose(row, scroll) {
  const old = chosen && byId("v" + chosen[0]);
  if (old) old.classList.remove("on");
  chosen = row;
  if (!byId("v" + row[0])) draw();
  const now = byId("v" + row[0]);
  now.classList.add("on");
  if (scroll) now.scrollIntoView({ block: "nearest" });
  mark();
  const c = points.get(row);
  if (c) c.parentNode.append(c);
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

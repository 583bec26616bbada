"use strict";
// The board's picture: layers by the cross-section's bars, zoom and move, coils, findings.
(function () {
  const board = document.getElementById("board");
  if (!board) return;
  const view = board.querySelector(".view");
  const svg = view.querySelector("svg");
  const profile = svg.querySelector("#profile");
  const said = board.querySelector(".said");
  const MOST = 60, STEP = 1.4;
  const NEXT = { shown: "faded", faded: "hidden", hidden: "shown" };
  const PRESSED = { shown: "true", faded: "mixed", hidden: "false" };
  const whole = svg.viewBox.baseVal;
  const home = around(profile);
  const at = { x: home.x, y: home.y, w: home.w };

  /** The board and a margin, square; the picture's own notes lie below it. */
  function around(shape) {
    const v = { x: whole.x, y: whole.y, w: whole.width, h: whole.height };
    if (!shape) return { x: v.x, y: v.y, w: Math.max(v.w, v.h) };
    const box = shape.getBBox();
    const side = 1.14 * Math.max(box.width, box.height);
    // The picture is drawn y up inside one flipped group.
    return { x: box.x + box.width / 2 - side / 2, y: -(box.y + box.height / 2) - side / 2, w: side };
  }

  const zoom = () => home.w / at.w;

  function show() {
    at.w = Math.min(home.w, Math.max(home.w / MOST, at.w));
    at.x = Math.min(home.x + home.w - at.w, Math.max(home.x, at.x));
    at.y = Math.min(home.y + home.w - at.w, Math.max(home.y, at.y));
    svg.setAttribute("viewBox", at.x + " " + at.y + " " + at.w + " " + at.w);
    view.classList.toggle("zoomed", zoom() > 1.001);
    svg.querySelectorAll("#marks .mark").forEach((m) => {
      m.setAttribute("transform", "translate(" + m.dataset.x + " " + m.dataset.y + ") scale(" + at.w / (svg.clientWidth || 600) + ")");
    });
    scaleBar();
  }

  function scaleBar() {
    const perPixel = at.w / svg.clientWidth;
    if (!(perPixel > 0)) return;
    let mm = Math.pow(10, Math.floor(Math.log10(120 * perPixel)));
    for (const k of [5, 2]) {
      if (k * mm <= 120 * perPixel) { mm *= k; break; }
    }
    const bar = view.querySelector(".scalebar");
    bar.querySelector("i").style.width = mm / perPixel + "px";
    bar.querySelector("span").textContent = mm >= 0.1 ? Number(mm.toPrecision(3)) + " mm" : Number((1000 * mm).toPrecision(3)) + " \u00b5m";
  }

  /** Zooms so that the point under (px, py) of the view stays there. */
  function zoomAt(factor, px, py) {
    const box = svg.getBoundingClientRect();
    const fx = box.width ? (px - box.left) / box.width : 0.5;
    const fy = box.height ? (py - box.top) / box.height : 0.5;
    const w = Math.min(home.w, Math.max(home.w / MOST, at.w / factor));
    at.x += fx * (at.w - w);
    at.y += fy * (at.w - w);
    at.w = w;
    show();
  }

  function zoomMiddle(factor) {
    const box = svg.getBoundingClientRect();
    zoomAt(factor, box.left + box.width / 2, box.top + box.height / 2);
  }

  function move(right, down) {
    at.x += right * at.w;
    at.y += down * at.w;
    show();
  }

  const ACTS = {
    in: () => zoomMiddle(STEP),
    out: () => zoomMiddle(1 / STEP),
    all: () => { at.x = home.x; at.y = home.y; at.w = home.w; show(); },
    left: () => move(-0.15, 0),
    right: () => move(0.15, 0),
    up: () => move(0, -0.15),
    down: () => move(0, 0.15),
  };
  const KEYS = {
    "+": "in", "=": "in", "-": "out", "_": "out", "0": "all",
    ArrowLeft: "left", ArrowRight: "right", ArrowUp: "up", ArrowDown: "down",
  };
  board.querySelectorAll("[data-do]").forEach((b) => b.addEventListener("click", ACTS[b.dataset.do]));
  view.addEventListener("keydown", (e) => {
    const act = KEYS[e.key];
    if (act && !e.ctrlKey && !e.metaKey && !e.altKey) {
      e.preventDefault();
      ACTS[act]();
    }
  });

  // Wheel: a scroll of the page that comes by is left alone, and so is one that could not zoom.
  let passing = -Infinity;
  addEventListener("wheel", (e) => { if (!view.contains(e.target)) passing = e.timeStamp; }, { passive: true });
  view.addEventListener("wheel", (e) => {
    if (!e.ctrlKey && e.timeStamp - passing < 300) {
      passing = e.timeStamp;
      return;
    }
    const factor = Math.exp(-e.deltaY * (e.deltaMode === 1 ? 0.05 : 0.0016));
    if ((factor < 1 && at.w >= home.w) || (factor > 1 && at.w <= home.w / MOST)) {
      if (!e.ctrlKey) return;
    }
    e.preventDefault();
    zoomAt(factor, e.clientX, e.clientY);
  }, { passive: false });

  // Drag with one pointer, pinch with two.
  const down = new Map();
  let moved = false;
  view.addEventListener("pointerdown", (e) => {
    if (e.pointerType === "mouse" && e.button !== 0) return;
    if (down.size === 0) moved = false;
    down.set(e.pointerId, { x: e.clientX, y: e.clientY });
  });
  view.addEventListener("pointermove", (e) => {
    const last = down.get(e.pointerId);
    if (!last) return;
    const now = { x: e.clientX, y: e.clientY };
    const other = Array.from(down.entries()).find(([id]) => id !== e.pointerId);
    if (!moved && !other && Math.hypot(now.x - last.x, now.y - last.y) < 4) return;
    if (!moved) {
      moved = true;
      view.setPointerCapture(e.pointerId);
    }
    down.set(e.pointerId, now);
    if (other) {
      const o = other[1];
      const before = Math.hypot(last.x - o.x, last.y - o.y), after = Math.hypot(now.x - o.x, now.y - o.y);
      if (before > 0) zoomAt(after / before, (now.x + o.x) / 2, (now.y + o.y) / 2);
    }
    const perPixel = at.w / svg.clientWidth / (other ? 2 : 1);
    at.x -= (now.x - last.x) * perPixel;
    at.y -= (now.y - last.y) * perPixel;
    show();
  });
  for (const end of ["pointerup", "pointercancel"]) {
    view.addEventListener(end, (e) => down.delete(e.pointerId));
  }
  view.addEventListener("pointerleave", (e) => { if (!view.hasPointerCapture(e.pointerId)) down.delete(e.pointerId); });
  view.addEventListener("click", (e) => {
    if (moved) { e.preventDefault(); e.stopPropagation(); moved = false; }
  }, true);
  svg.addEventListener("dragstart", (e) => e.preventDefault());

  // Layers.
  board.querySelectorAll(".bar").forEach((bar) => {
    const layer = svg.querySelector("#copper-L" + bar.dataset.layer);
    if (!layer) return;
    const state = bar.querySelector(".state");
    bar.disabled = false;
    bar.addEventListener("click", () => {
      const next = NEXT[state.textContent];
      state.textContent = next;
      bar.setAttribute("aria-pressed", PRESSED[next]);
      layer.setAttribute("data-view", next);
    });
  });

  // Findings.
  const findings = board.querySelector(".findings");
  const marks = svg.querySelector("#marks");
  findings.hidden = !marks || !marks.childElementCount;
  findings.addEventListener("click", () => {
    const hide = findings.getAttribute("aria-pressed") === "true";
    findings.setAttribute("aria-pressed", String(!hide));
    findings.textContent = hide ? "Findings: hidden" : "Findings: shown";
    marks.setAttribute("data-view", hide ? "hidden" : "shown");
  });
  document.querySelectorAll("a[href^='#mark-']").forEach((a) => a.addEventListener("click", (e) => {
    const mark = document.getElementById(a.getAttribute("href").slice(1));
    e.preventDefault();
    if (findings.getAttribute("aria-pressed") === "false") findings.click();
    at.w = home.w / 6;
    at.x = Number(mark.dataset.x) - at.w / 2;
    at.y = Number(mark.dataset.y) - at.w / 2;
    show();
    view.scrollIntoView({ block: "center" });
    mark.focus({ preventScroll: true });
  }));

  // Coils: what the table says of each, under the pointer or the keyboard's focus.
  const table = document.getElementById("coils-table");
  const head = Array.from(table.tHead.rows[0].cells, (c) => c.textContent.toLowerCase());
  const words = Array.from(table.tBodies[0].rows, (r) => {
    const t = Array.from(r.cells, (c) => c.textContent);
    return t[0] + ", phase " + t[5] + ": " + [2, 3, 4].map((k) => head[k] + " " + t[k]).join(", ");
  });
  const coils = Array.from(svg.querySelectorAll("#coils path"));
  const tell = said.textContent;
  let pinned = null;
  function say(coil) {
    coils.forEach((c) => c.classList.toggle("told", c === coil));
    said.textContent = coil ? words[coils.indexOf(coil)] + "." : tell;
  }
  coils.forEach((coil, i) => {
    coil.setAttribute("role", "button");
    coil.setAttribute("aria-label", words[i]);
    coil.setAttribute("aria-pressed", "false");
    coil.setAttribute("tabindex", i === 0 ? "0" : "-1");
    coil.addEventListener("pointerenter", () => say(coil));
    coil.addEventListener("pointerleave", () => say(pinned));
    coil.addEventListener("focus", () => say(coil));
    coil.addEventListener("blur", () => say(pinned));
    coil.addEventListener("click", () => pin(coil));
    coil.addEventListener("keydown", (e) => {
      const step = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 }[e.key];
      if (e.key === "Enter" || e.key === " ") {
        e.preventDefault();
        pin(coil);
      } else if (step) {
        e.preventDefault();
        e.stopPropagation();
        const next = coils[(i + step + coils.length) % coils.length];
        coil.setAttribute("tabindex", "-1");
        next.setAttribute("tabindex", "0");
        next.focus();
      }
    });
  });
  function pin(coil) {
    pinned = pinned === coil ? null : coil;
    coils.forEach((c) => c.setAttribute("aria-pressed", String(c === pinned)));
    say(pinned);
  }

  view.tabIndex = 0;
  board.querySelectorAll(".tools button").forEach((b) => { b.disabled = false; });
  new ResizeObserver(show).observe(view);
  addEventListener("beforeprint", () => svg.setAttribute("viewBox", whole0));
  addEventListener("afterprint", show);
  const whole0 = svg.getAttribute("viewBox");
  board.classList.add("live");
  show();
})();

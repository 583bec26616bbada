"use strict";
// Draws every .plot from the table that stands after it. The table holds the exact numbers
// (data-v); what is drawn is read from there and from nowhere else.
(function () {
  const DASHES = [[], [9, 4], [2, 4], [12, 4, 2, 4], [16, 5], [12, 4, 2, 4, 2, 4]];
  const FACE = '"Avenir Next", "Segoe UI", "Source Sans 3", "Noto Sans", Arial, sans-serif';
  const PRINT_WIDTH = 640, HEIGHT = 300;
  const drawn = [];

  const css = (name) => getComputedStyle(document.documentElement).getPropertyValue(name).trim();
  const exact = (cell) => (cell.dataset.v === undefined ? null : Number(cell.dataset.v));
  const short = (v) => (v === null || v === undefined ? "\u2013" : String(Number(v.toPrecision(4))));

  /** Columns of the table, the first one as x: {x, lines: [{name, y}]}. */
  function read(place) {
    const table = document.getElementById(place.dataset.table);
    const head = Array.from(table.tHead.rows[0].cells, (c) => c.textContent);
    const rows = Array.from(table.tBodies[0].rows);
    const scale = Number(place.dataset.scale);
    const column = (k) => rows.map((r) => exact(r.cells[k])).map((v) => (v === null ? null : v * scale));
    const x = rows.map((r) => exact(r.cells[0]));
    switch (place.dataset.kind) {
      case "bars":
        return { x: x, lines: [{ name: head[1], y: column(1) }] };
      case "bins":
        return {
          x: x.map((from, i) => (from + exact(rows[i].cells[1])) / 2),
          lines: [{ name: head[2], y: column(2) }],
        };
      case "pieces":
        return { x: x, lines: pieces(rows, column(1), head[2].toLowerCase()) };
      case "turn": {
        const lines = head.slice(1).map((name, k) => ({ name: name, y: column(k + 1) }));
        lines.forEach((l) => l.y.push(l.y[0]));
        return { x: x.concat([360]), lines: lines };
      }
      default:
        return { x: x, lines: head.slice(1).map((name, k) => ({ name: name, y: column(k + 1) })) };
    }
  }

  /** One line for each word of the table's third column; neighbours share a point. */
  function pieces(rows, values, what) {
    const words = rows.map((r) => r.cells[2].textContent);
    return Array.from(new Set(words), (word) => ({
      name: what + " " + word,
      y: values.map((v, i) => (words[i] === word || words[i - 1] === word ? v : null)),
    }));
  }

  /** Lines across the plot, each with its name. */
  function marks(place, k) {
    const list = JSON.parse(place.dataset.marks);
    const scale = Number(place.dataset.scale);
    return (u) => {
      const c = u.ctx, px = uPlot.pxRatio * k, box = u.bbox;
      c.save();
      c.strokeStyle = css("--ink");
      c.fillStyle = css("--ink");
      c.lineWidth = px;
      c.textAlign = "left";
      c.textBaseline = "alphabetic";
      c.font = 12 * px + "px " + FACE;
      let down = 0;
      for (const [axis, value, name] of list) {
        const at = u.valToPos(axis === "y" ? value * scale : value, axis, true);
        const upright = axis === "x";
        if (upright ? at < box.left || at > box.left + box.width : at < box.top || at > box.top + box.height) continue;
        c.setLineDash([5 * px, 4 * px]);
        c.beginPath();
        c.moveTo(upright ? at : box.left, upright ? box.top : at);
        c.lineTo(upright ? at : box.left + box.width, upright ? box.top + box.height : at);
        c.stroke();
        const wide = c.measureText(name).width;
        const left = upright ? (at + 4 * px + wide > box.left + box.width ? at - 4 * px - wide : at + 4 * px) : box.left + 6 * px;
        const above = at - 4 * px < box.top + 12 * px ? at + 14 * px : at - 4 * px;
        const top = upright ? box.top + (14 + 15 * down++) * px : above;
        c.setLineDash([]);
        c.strokeStyle = css("--paper");
        c.lineWidth = 4 * px;
        c.strokeText(name, left, top);
        c.strokeStyle = css("--ink");
        c.lineWidth = px;
        c.fillText(name, left, top);
      }
      c.restore();
    };
  }

  function range(place, data) {
    const scale = Number(place.dataset.scale);
    const across = JSON.parse(place.dataset.marks).filter((m) => m[0] === "y").map((m) => m[1] * scale);
    const most = place.dataset.most === undefined ? Infinity : Number(place.dataset.most);
    const all = data.lines.flatMap((l) => l.y).concat(across).filter((v) => v !== null && v <= most);
    const low = Math.min(0, ...all), high = Math.max(...all);
    return low === high ? [low, low + 1] : uPlot.rangeNum(low, high, { min: { pad: 0.05, soft: 0, mode: 1 }, max: { pad: 0.08, soft: 0, mode: 1 } });
  }

  function options(place, data, width, k) {
    const bars = place.dataset.kind === "bars" || place.dataset.kind === "bins";
    const step = data.x.length > 1 ? data.x[1] - data.x[0] : 1;
    const least = data.x[0] - (bars ? step / 2 : 0);
    const marked = JSON.parse(place.dataset.marks).filter((m) => m[0] === "x").map((m) => m[1]);
    const last = data.x[data.x.length - 1] + (bars ? step / 2 : 0);
    const all = place.dataset.kind === "bins" ? marked.concat([least, last]) : [least, last];
    const pad = place.dataset.kind === "bins" ? 0.03 * (Math.max(...all) - Math.min(...all)) : 0;
    const font = 12 * k + "px " + FACE;
    const axis = (name, more) =>
      Object.assign({
        label: name, stroke: () => css("--ink"), font: font, labelFont: font, labelSize: 22 * k, labelGap: 2 * k,
        gap: 4 * k, size: 30 * k, space: (u, i, lo, hi, dim) => (i === 0 ? 60 : 34) * k,
        grid: { stroke: () => css("--line"), width: 0.6 * k },
        ticks: { stroke: () => css("--line"), width: 0.6 * k, size: 5 * k },
        values: (u, splits) => splits.map((v) => (v === null ? "" : String(Number(v.toPrecision(6))))),
      }, more);
    const turn = place.dataset.kind === "turn";
    return {
      width: width, height: HEIGHT * k,
      padding: [10 * k, 14 * k, 0, 0],
      cursor: { drag: { x: false, y: false }, points: { size: 8 * k } },
      scales: {
        x: { time: false, range: [Math.min(...all) - pad, Math.max(...all) + pad] },
        y: { range: range(place, data) },
      },
      axes: [
        axis(place.dataset.x, turn ? { splits: [0, 60, 120, 180, 240, 300, 360] } : place.dataset.kind === "bars" ? { splits: data.x } : {}),
        axis(place.dataset.y, { size: 52 * k }),
      ],
      series: [{ label: place.dataset.x, value: (u, v) => short(v) }].concat(
        data.lines.map((l, i) => ({
          label: l.name,
          stroke: () => css("--p" + ((i % 6) + 1)),
          fill: bars ? () => css("--p1") + "55" : undefined,
          dash: bars ? [] : DASHES[i % DASHES.length].map((d) => d * k),
          width: (bars ? 1 : 2) * k,
          paths: bars ? uPlot.paths.bars({ size: [place.dataset.kind === "bins" ? 1 : 0.5, Infinity], align: 0 }) : undefined,
          pxAlign: 0,
          points: { show: false },
          value: (u, v) => short(v),
        }))),
      hooks: { draw: [marks(place, k)] },
    };
  }

  function draw(entry, printing) {
    if (entry.plot) entry.plot.destroy();
    const k = printing ? 2 : 1;
    const width = printing ? PRINT_WIDTH * k : Math.max(240, entry.place.clientWidth);
    entry.width = entry.place.clientWidth;
    entry.plot = new uPlot(
      options(entry.place, entry.data, width, k),
      [entry.data.x].concat(entry.data.lines.map((l) => l.y)), entry.place);
    // The keys of the lines: the same patterns as the lines have, not colour alone.
    entry.place.querySelectorAll(".u-series").forEach((row, i) => {
      const marker = row.querySelector(".u-marker");
      if (i > 0 && marker) marker.replaceWith(sample(i - 1, entry.place.dataset.kind, k));
    });
  }

  function sample(i, kind, k) {
    const c = document.createElement("canvas");
    const px = uPlot.pxRatio * 2;
    c.width = 34 * px; c.height = 12 * px;
    c.className = "sample";
    const g = c.getContext("2d");
    g.strokeStyle = css("--p" + ((i % 6) + 1));
    g.lineWidth = (kind === "bars" || kind === "bins" ? 8 : 2) * px;
    g.setLineDash(kind === "bars" || kind === "bins" ? [] : DASHES[i % DASHES.length].map((d) => d * px));
    g.beginPath(); g.moveTo(0, 6 * px); g.lineTo(34 * px, 6 * px); g.stroke();
    return c;
  }

  const all = (printing) => drawn.forEach((e) => draw(e, printing));
  document.querySelectorAll(".plot").forEach((place) => {
    const entry = { place: place, data: read(place), plot: null, width: 0 };
    drawn.push(entry);
    draw(entry, false);
  });
  const resized = new ResizeObserver(() => {
    if (!document.documentElement.classList.contains("printing")) {
      drawn.filter((e) => e.place.clientWidth !== e.width).forEach((e) => draw(e, false));
    }
  });
  drawn.forEach((e) => resized.observe(e.place));
  matchMedia("(prefers-color-scheme: dark)").addEventListener("change", () => all(false));
  addEventListener("beforeprint", () => {
    document.documentElement.classList.add("printing");
    all(true);
  });
  addEventListener("afterprint", () => {
    document.documentElement.classList.remove("printing");
    all(false);
  });
})();

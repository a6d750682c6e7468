(function () {
  "use strict";

  const results = JSON.parse(document.getElementById("results").textContent);
  const LIGHT = {
    ink: "#1c2530", soft: "#586472", line: "#d9d6cd", grid: "#ebe8e0", sheet: "#ffffff", good: "#1f6b3f",
    schemes: ["#1d5b70", "#b4491d", "#54398f", "#3d7a2a", "#a8246b", "#7a6200", "#2b62c4", "#80462b"]
  };
  const DARK = {
    ink: "#e4e7ea", soft: "#9aa6b2", line: "#36404b", grid: "#283039", sheet: "#1a2027", good: "#7fcf9c",
    schemes: ["#7cc0d6", "#f0a070", "#b9a2f0", "#9bd486", "#f08fc0", "#dcc255", "#92b6fb", "#d3a68d"]
  };

  // Markers in a box of -1..1; what tells families apart when colours do not.
  const MARKERS = [
    "M1,0A1,1,0,1,1,-1,0A1,1,0,1,1,1,0Z",
    "M-0.88,-0.88H0.88V0.88H-0.88Z",
    "M0,-1.1L1.1,0.9H-1.1Z",
    "M0,-1.2L1.2,0L0,1.2L-1.2,0Z",
    "M-0.4,-1.1H0.4V-0.4H1.1V0.4H0.4V1.1H-0.4V0.4H-1.1V-0.4H-0.4Z",
    "M0,-1.2L0.35,-0.4L1.2,-0.4L0.55,0.2L0.8,1.1L0,0.6L-0.8,1.1L-0.55,0.2L-1.2,-0.4L-0.35,-0.4Z",
    "M-0.6,-1.05H0.6L1.2,0L0.6,1.05H-0.6L-1.2,0Z",
    "M-1.2,-0.6H1.2V0.6H-1.2Z",
    "M-0.6,-1.2H0.6V1.2H-0.6Z",
    "M-1.1,-1.1L0,-0.5L1.1,-1.1L0.5,0L1.1,1.1L0,0.5L-1.1,1.1L-0.5,0Z",
    "M-1.1,-1L1.1,-1L-1.1,1L1.1,1Z",
    "M-1.1,-1.1V1.1L1.2,0Z"
  ];

  // Names of the limits that schemes carry, in the words of the page; the others are drawn under their field's name.
  const LIMIT_NAMES = {
    shannonDb: "Shannon", modulationDb: "modulation", hardDecisionDb: "hard decision",
    normalApproximationDb: "finite length (est.)", finiteLengthDb: "finite length", converseDb: "finite length"
  };

  const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

  function power(exponent) {
    const digits = String(Math.abs(exponent)).replace(/\d/g, function (d) { return SUPERSCRIPTS[d]; });
    return "10" + (exponent < 0 ? "⁻" : "") + digits;
  }

  function rateText(rate) {
    if (!(rate > 0)) { return "0"; }
    if (rate >= 0.01) { return String(Number(rate.toPrecision(2))); }
    const parts = rate.toExponential(1).split("e");
    const mantissa = Number(parts[0]);
    return (mantissa === 1 ? "" : mantissa + "×") + power(Number(parts[1]));
  }

  function dbText(db) { return db.toFixed(2).replace("-", "−"); }

  function isNumber(value) { return typeof value === "number" && isFinite(value); }

  function escapeHtml(text) {
    return String(text).replace(/[&<>"']/g, function (c) {
      return { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" }[c];
    });
  }

  function familyOf(scheme) {
    return scheme.family || String(scheme.code || "").split(/[:+]/)[0] || "other";
  }

  /* Tables: sort by the button in a heading. */

  function sortTable(table, heading) {
    const descending = heading.getAttribute("aria-sort") === "ascending";
    const column = columnOf(heading);
    const body = table.tBodies[0];
    const rows = Array.from(body.rows);
    const values = new Map(rows.map(function (row) { return [row, row.cells[column].dataset.value || ""]; }));
    const numeric = rows.every(function (row) { return values.get(row) === "" || !isNaN(Number(values.get(row))); });
    rows.sort(function (a, b) {
      const left = values.get(a);
      const right = values.get(b);
      if (left === "" || right === "") { return (left === "") - (right === ""); }
      const order = numeric ? Number(left) - Number(right) : left.localeCompare(right);
      return descending ? -order : order;
    });
    rows.forEach(function (row) { body.appendChild(row); });
    table.querySelectorAll("th[aria-sort]").forEach(function (other) { other.setAttribute("aria-sort", "none"); });
    heading.setAttribute("aria-sort", descending ? "descending" : "ascending");
  }

  // A heading's column, with two rows of headings of which the upper one spans: by the order of the sortable ones.
  function columnOf(heading) {
    const upper = Array.from(heading.closest("thead").rows[0].cells);
    const lower = Array.from(heading.closest("thead").rows[1].cells);
    const columns = [];
    upper.forEach(function (cell) {
      if (cell.hasAttribute("aria-sort")) { columns.push(cell); }
      else { columns.push.apply(columns, lower.splice(0, cell.colSpan)); }
    });
    return columns.indexOf(heading);
  }

  document.querySelectorAll("table.sortable").forEach(function (table) {
    table.querySelectorAll("th[aria-sort] button").forEach(function (button) {
      button.addEventListener("click", function () { sortTable(table, button.closest("th")); });
    });
  });

  /* Charts. */

  function Charts(container) {
    this.point = results.operatingPoints[Number(container.dataset.operatingPoint)];
    this.schemes = this.point.schemes;
    this.container = container;
    this.boxes = Array.from(container.querySelectorAll(".scheme-list input"));
    this.keys = [];
    this.order = [];
    this.boxes.forEach(function (box, position) {
      this.keys[Number(box.value)] = box.dataset.key;
      this.order[Number(box.value)] = position;
    }, this);
    this.families = Array.from(new Set(this.boxes.map(function (box) {
      return familyOf(this.schemes[Number(box.value)]);
    }, this)));
    this.errorRates = this.open(".error-rates");
    this.efficiency = this.open(".efficiency");
    this.listen();
  }

  Charts.prototype.open = function (selector) {
    return echarts.init(this.container.querySelector(selector), null, { renderer: "svg" });
  };

  Charts.prototype.listen = function () {
    const charts = this;
    const redraw = function () { charts.drawErrorRates(); };
    this.container.querySelector("form").addEventListener("change", redraw);
    this.container.querySelector("form").addEventListener("submit", function (event) { event.preventDefault(); });
    this.container.querySelectorAll("[data-pick]").forEach(function (button) {
      button.addEventListener("click", function () {
        charts.boxes.forEach(function (box) {
          box.checked = !box.disabled
            && (button.dataset.pick === "all" || (button.dataset.pick === "first" && box.hasAttribute("data-first")));
        });
        redraw();
      });
    });
  };

  Charts.prototype.colour = function (index) {
    return this.palette.schemes[this.order[index] % this.palette.schemes.length];
  };

  Charts.prototype.marker = function (index) {
    return MARKERS[this.families.indexOf(familyOf(this.schemes[index])) % MARKERS.length];
  };

  Charts.prototype.label = function (index) {
    const scheme = this.schemes[index];
    return "<b>" + escapeHtml(this.keys[index] + " " + scheme.code) + "</b><br>" + escapeHtml(scheme.decoder || "")
      + "<br>" + escapeHtml(scheme.modulation || "");
  };

  Charts.prototype.draw = function (palette) {
    this.palette = palette;
    this.drawSwatches();
    this.drawErrorRates();
    this.drawEfficiency();
  };

  Charts.prototype.resize = function () {
    this.errorRates.resize();
    this.efficiency.resize();
    this.drawErrorRates();
    this.drawEfficiency();
  };

  function swatch(path, colour, filled, withLine) {
    return '<svg width="34" height="14" viewBox="-17 -7 34 14">'
      + (withLine ? '<path d="M-17,0H17" stroke="' + colour + '" stroke-width="2"/>' : "")
      + '<path d="' + path + '" transform="scale(5)" fill="' + (filled ? colour : "none") + '" stroke="' + colour
      + '" stroke-width="0.35"/></svg>';
  }

  Charts.prototype.drawSwatches = function () {
    this.boxes.forEach(function (box) {
      const index = Number(box.value);
      box.parentNode.querySelector(".swatch").innerHTML = swatch(this.marker(index), this.colour(index), true, true);
    }, this);
    const list = this.container.querySelector(".families");
    list.textContent = "";
    this.families.forEach(function (family, i) {
      const item = document.createElement("li");
      item.innerHTML = swatch(MARKERS[i % MARKERS.length], this.palette.soft, true, false);
      item.appendChild(document.createTextNode(family));
      list.appendChild(item);
    }, this);
  };

  Charts.prototype.axes = function (xName, yName, yAxis) {
    const p = this.palette;
    const common = {
      nameLocation: "middle",
      nameTextStyle: { color: p.ink, fontSize: 13 },
      axisLine: { show: true, lineStyle: { color: p.soft } },
      axisTick: { show: true, lineStyle: { color: p.soft } },
      axisLabel: { color: p.ink, fontSize: 12 },
      splitLine: { show: true, lineStyle: { color: p.grid } }
    };
    return {
      x: Object.assign({}, common, {
        type: "value", name: xName, nameGap: 30,
        axisLabel: { color: p.ink, fontSize: 12, formatter: function (v) { return String(v).replace("-", "−"); } }
      }),
      y: Object.assign({}, common, { name: yName, nameGap: 44 }, yAxis)
    };
  };

  Charts.prototype.base = function (axes, rules) {
    const p = this.palette;
    return {
      animation: false,
      backgroundColor: "transparent",
      textStyle: { fontFamily: "system-ui, sans-serif" },
      // Each rule's name has a line of its own above the plot.
      grid: { left: 68, right: 22, top: 18 + 15 * rules.length, bottom: 52 },
      tooltip: {
        trigger: "item", confine: true, backgroundColor: p.sheet, borderColor: p.line,
        textStyle: { color: p.ink, fontSize: 12 }
      },
      xAxis: axes.x,
      yAxis: axes.y
    };
  };

  /* Vertical rules, such as limits, with their names staggered: the leftmost is the tallest, so that no name lies
     over a rule further right. */
  Charts.prototype.ruleSeries = function (rules, top) {
    const p = this.palette;
    const sorted = rules.slice().sort(function (a, b) { return a.x - b.x; });
    return {
      type: "custom", silent: true, z: 4, clip: false, data: sorted.map(function (rule) { return [rule.x, 0]; }),
      encode: { x: 0, y: -1 },
      renderItem: function (params, api) {
        const rule = sorted[params.dataIndex];
        const area = params.coordSys;
        const x = area.x + (rule.x - rule.min) / (rule.max - rule.min) * area.width;
        const y = 12 + 15 * params.dataIndex;
        const toTheLeft = x > area.x + area.width - rule.name.length * 6.6 - 8;
        return {
          type: "group",
          children: [
            {
              type: "line", shape: { x1: x, y1: y - 6, x2: x, y2: area.y + area.height },
              style: { stroke: rule.strong ? p.ink : p.soft, lineWidth: rule.strong ? 1.6 : 1.1, lineDash: rule.dash }
            },
            {
              type: "text", style: {
                x: x + (toTheLeft ? -4 : 4), y: y, text: rule.name, fill: p.ink, font: "12px system-ui, sans-serif",
                textAlign: toTheLeft ? "right" : "left", textVerticalAlign: "middle", stroke: p.sheet, lineWidth: 3
              }
            }
          ]
        };
      }
    };
  };

  Charts.prototype.limitRules = function (index) {
    const scheme = this.schemes[index];
    const limits = scheme.limits || {};
    const rules = [];
    Object.keys(limits).forEach(function (field) {
      if (!isNumber(limits[field])) { return; }
      // A hard-decision limit is said of schemes that decide hard; of others it is no limit.
      if (field === "hardDecisionDb" && !isNumber(scheme.gapToHardDecisionLimitDb)) { return; }
      const name = LIMIT_NAMES[field] || field.replace(/Db$/, "");
      rules.push({ x: limits[field], name: name + " " + dbText(limits[field]), dash: [2, 3] });
    });
    return rules;
  };

  Charts.prototype.availableRule = function () {
    const available = this.point.availableEbn0Db;
    return isNumber(available)
      ? [{ x: available, name: "available " + dbText(available), dash: [8, 4], strong: true }] : [];
  };

  Charts.prototype.shown = function () {
    return this.boxes.filter(function (box) { return box.checked; }).map(function (box) { return Number(box.value); });
  };

  Charts.prototype.drawErrorRates = function () {
    const form = this.container.querySelector("form");
    const choice = form.querySelector(".switch input:checked").value;
    const rates = choice === "both" ? ["fer", "ber"] : [choice];
    const focus = Number(form.elements.focus.value);
    const shown = this.shown();
    const rules = this.limitRules(focus).concat(this.availableRule());
    const targets = this.targets(focus, rates);
    const range = this.errorRateRange(shown, rates, rules, targets);
    rules.forEach(function (rule) { rule.min = range.xMin; rule.max = range.xMax; });
    const axes = this.axes("Eb/N0 [dB]", rates.map(function (r) { return r.toUpperCase(); }).join(", "), {
      type: "log", min: range.yMin, max: 1,
      axisLabel: { color: this.palette.ink, fontSize: 12,
        formatter: function (v) { return power(Math.round(Math.log10(v))); } }
    });
    axes.x.min = range.xMin;
    axes.x.max = range.xMax;
    const option = this.base(axes, rules);
    option.series = [];
    shown.forEach(function (index) {
      rates.forEach(function (rate) {
        this.addCurve(option.series, index, rate, range, choice === "both");
      }, this);
    }, this);
    this.addUncoded(option.series, range);
    option.series.push(this.targetSeries(targets));
    option.series.push(this.ruleSeries(rules));
    this.errorRates.setOption(option, true);
  };

  Charts.prototype.targets = function (focus, rates) {
    const requirement = results.requirement || {};
    const fer = this.schemes[focus].codewordFerTarget || requirement.payloadFer;
    const targets = [];
    if (rates.indexOf("fer") >= 0 && isNumber(fer)) { targets.push({ y: fer, name: "target FER " + rateText(fer) }); }
    if (rates.indexOf("ber") >= 0 && isNumber(requirement.ber)) {
      targets.push({ y: requirement.ber, name: "target BER " + rateText(requirement.ber) });
    }
    return targets;
  };

  Charts.prototype.measured = function (index, rate) {
    return (this.schemes[index].points || []).filter(function (m) { return isNumber(m.ebn0Db) && isNumber(m[rate]); })
      .sort(function (a, b) { return a.ebn0Db - b.ebn0Db; });
  };

  Charts.prototype.exact = function (index, rate) {
    return (this.schemes[index].exactCurve || [])
      .filter(function (e) { return isNumber(e.ebn0Db) && e[rate] > 0; })
      .map(function (e) { return [e.ebn0Db, e[rate]]; })
      .sort(function (a, b) { return a[0] - b[0]; });
  };

  /* The part of the plane worth showing: a decade below the target or the lowest simulated rate, and no further right
     than the schemes' curves, the rules and half a decibel. */
  Charts.prototype.errorRateRange = function (shown, rates, rules, targets) {
    let lowest = Math.min.apply(null, targets.map(function (t) { return t.y / 10; }).concat([1e-3]));
    let xs = rules.map(function (rule) { return rule.x; });
    shown.forEach(function (index) {
      rates.forEach(function (rate) {
        this.measured(index, rate).forEach(function (m) {
          xs.push(m.ebn0Db);
          const bottom = m[rate] > 0 ? m[rate] : m[rate + "High"];
          if (bottom > 0) { lowest = Math.min(lowest, bottom / 2); }
        });
      }, this);
    }, this);
    const yMin = Math.pow(10, Math.max(-12, Math.floor(Math.log10(lowest))));
    shown.forEach(function (index) {
      rates.forEach(function (rate) {
        this.exact(index, rate).forEach(function (e) { if (e[1] >= yMin && e[1] < 0.5) { xs.push(e[0]); } });
      }, this);
    }, this);
    if (xs.length === 0) { xs = [0, 10]; }
    return {
      xMin: Math.floor(Math.min.apply(null, xs) - 0.2), xMax: Math.ceil(Math.max.apply(null, xs) + 0.5), yMin: yMin
    };
  };

  Charts.prototype.addCurve = function (series, index, rate, range, both) {
    const colour = this.colour(index);
    const marker = "path://" + this.marker(index);
    const key = this.keys[index];
    const hollow = both && rate === "ber";
    const label = this.label(index);
    const palette = this.palette;
    const end = { show: true, position: "right", distance: 7, color: colour, fontWeight: "bold", fontSize: 12,
      formatter: both ? key + " " + rate.toUpperCase() : key };
    const exact = this.exact(index, rate).filter(function (e) { return e[1] >= range.yMin; });
    if (exact.length > 0) {
      series.push({
        type: "line", symbol: "none", z: 2, lineStyle: { color: colour, width: hollow ? 1.2 : 2 }, data: exact,
        tooltip: { formatter: label + "<br>exact " + rate.toUpperCase() }
      });
      series.push(this.endLabel(exact[exact.length - 1], end, colour));
    }
    const measured = this.measured(index, rate);
    if (measured.length === 0) { return; }
    const seen = measured.filter(function (m) { return m[rate] > 0; });
    series.push({
      type: "line", z: 3, symbol: marker, symbolSize: 10, symbolKeepAspect: true, showAllSymbol: true,
      lineStyle: { color: colour, width: hollow ? 1.2 : 2 },
      itemStyle: { color: hollow ? palette.sheet : colour, borderColor: colour, borderWidth: 1.5 },
      data: seen.map(function (m) { return { value: [m.ebn0Db, m[rate]], point: m }; }),
      tooltip: {
        formatter: function (params) {
          const m = params.data.point;
          return label + "<br>" + dbText(m.ebn0Db) + " dB: " + rate.toUpperCase() + " " + rateText(m[rate])
            + "<br>95 % interval " + rateText(m[rate + "Low"]) + " to " + rateText(m[rate + "High"])
            + "<br>" + escapeHtml(m.frames) + " frames, " + escapeHtml(m.frameErrors) + " with errors";
        }
      }
    });
    if (seen.length > 0 && exact.length === 0) {
      const last = seen[seen.length - 1];
      series.push(this.endLabel([last.ebn0Db, last[rate]], end, colour));
    }
    series.push(this.errorBars(measured, rate, colour, range));
    const none = measured.filter(function (m) { return m[rate] === 0 && m[rate + "High"] > 0; });
    series.push({
      type: "scatter", z: 3, symbol: "triangle", symbolRotate: 180, symbolSize: 10,
      itemStyle: { color: palette.sheet, borderColor: colour, borderWidth: 1.5 },
      data: none.map(function (m) { return [m.ebn0Db, m[rate + "High"]]; }),
      tooltip: { formatter: label + "<br>no error seen; " + rate.toUpperCase() + " at most at the marker (95 %)" }
    });
  };

  // The scheme's key at the end of its curve, moved aside where another stands.
  Charts.prototype.endLabel = function (place, label) {
    return {
      type: "scatter", silent: true, symbolSize: 1, itemStyle: { color: "transparent" }, data: [place], z: 5,
      label: Object.assign({ textBorderColor: this.palette.sheet, textBorderWidth: 3 }, label),
      labelLayout: { moveOverlap: "shiftY" }
    };
  };

  Charts.prototype.errorBars = function (measured, rate, colour, range) {
    const bars = measured.filter(function (m) { return m[rate + "High"] > 0; }).map(function (m) {
      return [m.ebn0Db, Math.max(m[rate + "Low"] || 0, range.yMin), m[rate + "High"], m[rate + "Low"] > 0 ? 1 : 0];
    }).filter(function (bar) { return bar[2] > bar[1]; });
    return {
      type: "custom", silent: true, z: 2, clip: true, data: bars, encode: { x: 0, y: [1, 2] },
      renderItem: function (params, api) {
        const low = api.coord([api.value(0), api.value(1)]);
        const high = api.coord([api.value(0), api.value(2)]);
        const line = function (x1, y1, x2, y2) {
          return { type: "line", shape: { x1: x1, y1: y1, x2: x2, y2: y2 }, style: { stroke: colour, lineWidth: 1.3 } };
        };
        const caps = [line(high[0], low[1], high[0], high[1]), line(high[0] - 4, high[1], high[0] + 4, high[1])];
        if (api.value(3)) { caps.push(line(low[0] - 4, low[1], low[0] + 4, low[1])); }
        return { type: "group", children: caps };
      }
    };
  };

  Charts.prototype.addUncoded = function (series, range) {
    const uncoded = ((this.point.curves || {}).uncodedBer || []).filter(function (u) { return u[1] >= range.yMin / 10; });
    if (uncoded.length === 0) { return; }
    const p = this.palette;
    series.push({
      type: "line", symbol: "none", z: 1, data: uncoded, lineStyle: { color: p.soft, width: 1.5, type: [6, 3, 1, 3] },
      tooltip: { formatter: "uncoded transmission, BER" }
    });
    const inside = uncoded.filter(function (u) { return u[0] >= range.xMin && u[0] <= range.xMax && u[1] >= range.yMin; });
    if (inside.length === 0) { return; }
    const last = inside[inside.length - 1];
    series.push(this.endLabel(last, {
      show: true, position: last[0] > range.xMax - 1.5 ? "top" : "right", align: last[0] > range.xMax - 1.5 ? "right" : "left",
      formatter: "uncoded BER", color: p.soft, fontSize: 12
    }));
  };

  Charts.prototype.targetSeries = function (targets) {
    const p = this.palette;
    return {
      type: "custom", silent: true, z: 4, data: targets.map(function (t) { return [0, t.y]; }), encode: { x: -1, y: 1 },
      renderItem: function (params, api) {
        const area = params.coordSys;
        const y = api.coord([0, api.value(1)])[1];
        return {
          type: "group",
          children: [
            { type: "line", shape: { x1: area.x, y1: y, x2: area.x + area.width, y2: y },
              style: { stroke: p.good, lineWidth: 1.4, lineDash: [4, 3] } },
            { type: "text", style: { x: area.x + area.width - 6, y: y + 9, text: targets[params.dataIndex].name,
              fill: p.good, font: "12px system-ui, sans-serif", textAlign: "right", textVerticalAlign: "middle",
              stroke: p.sheet, lineWidth: 3 } }
          ]
        };
      }
    };
  };

  Charts.prototype.drawEfficiency = function () {
    const p = this.palette;
    const placed = this.schemes.map(function (scheme, index) { return { scheme: scheme, index: index }; })
      .filter(function (s) {
        return isNumber(s.scheme.neededEbn0Db) && isNumber(s.scheme.efficiencyBitsPerRealDimension);
      });
    const curves = this.point.curves || {};
    const rules = this.availableRule();
    const xs = placed.map(function (s) { return s.scheme.neededEbn0Db; })
      .concat(rules.map(function (r) { return r.x; })).concat([-1, 4]);
    const xMin = Math.floor(Math.min.apply(null, xs) - 1);
    const xMax = Math.ceil(Math.max.apply(null, xs) + 0.8);
    const highest = Math.max.apply(null, placed.map(function (s) { return s.scheme.efficiencyBitsPerRealDimension; })
      .concat([0.9]));
    rules.forEach(function (rule) { rule.min = xMin; rule.max = xMax; });
    const axes = this.axes("Eb/N0 [dB]", "information bits per real dimension",
      { type: "value", min: 0, max: Math.ceil(highest * 5 + 0.5) / 5 });
    axes.x.min = xMin;
    axes.x.max = xMax;
    const option = this.base(axes, rules);
    option.series = [];
    [["shannonEfficiency", "Shannon, any input", "solid", p.ink],
      ["binaryInputEfficiency", "binary input, soft decisions", [7, 3], p.ink],
      ["hardDecisionEfficiency", "binary input, hard decisions", [2, 3], p.ink]].forEach(function (curve) {
      this.addCapacity(option.series, curves[curve[0]], curve[1], curve[2], curve[3], axes);
    }, this);
    placed.forEach(function (s) { this.addPlace(option.series, s.scheme, s.index); }, this);
    option.series.push(this.ruleSeries(rules));
    this.efficiency.setOption(option, true);
  };

  Charts.prototype.addCapacity = function (series, data, name, dash, colour, axes) {
    if (!data || data.length === 0) { return; }
    const p = this.palette;
    series.push({
      type: "line", symbol: "none", silent: true, z: 1, data: data, lineStyle: { color: colour, width: 1.5, type: dash }
    });
    // The name stands along the curve, where the curve leaves the middle of the plot.
    const inside = data.filter(function (d) { return d[0] <= axes.x.max && d[1] <= axes.y.max; });
    const last = inside[inside.length - 1];
    if (!last) { return; }
    series.push(this.endLabel(last, {
      show: true, formatter: name, color: p.ink, fontSize: 12, distance: 5,
      position: last[0] > axes.x.max - 3 ? "left" : "right"
    }));
  };

  Charts.prototype.addPlace = function (series, scheme, index) {
    const colour = this.colour(index);
    const place = [scheme.neededEbn0Db, scheme.efficiencyBitsPerRealDimension];
    const p = this.palette;
    const spread = isNumber(scheme.neededEbn0DbLow) && isNumber(scheme.neededEbn0DbHigh)
      ? [scheme.neededEbn0DbLow, scheme.neededEbn0DbHigh] : null;
    if (spread && spread[1] > spread[0]) {
      series.push({
        type: "line", symbol: "none", silent: true, z: 2, lineStyle: { color: colour, width: 1.5, type: "solid" },
        data: [[spread[0], place[1]], [spread[1], place[1]]]
      });
    }
    series.push({
      type: "scatter", z: 3, symbol: "path://" + this.marker(index), symbolSize: 13, symbolKeepAspect: true,
      itemStyle: { color: scheme.meets ? colour : p.sheet, borderColor: colour, borderWidth: 1.8 },
      data: [place],
      label: {
        show: true, formatter: this.keys[index], position: "right", distance: 4, color: colour, fontSize: 12,
        fontWeight: "bold", textBorderColor: p.sheet, textBorderWidth: 3
      },
      labelLayout: { hideOverlap: true },
      tooltip: {
        formatter: this.label(index) + "<br>needs " + dbText(scheme.neededEbn0Db) + " dB, "
          + (scheme.meets ? "meets every demand" : "fails")
      }
    });
  };

  /* Start, follow the colour scheme, and print in light colours. */

  const dark = window.matchMedia("(prefers-color-scheme: dark)");
  const all = Array.from(document.querySelectorAll(".charts")).map(function (c) { return new Charts(c); });

  function drawAll(palette) { all.forEach(function (charts) { charts.draw(palette); }); }

  function follow() { drawAll(dark.matches ? DARK : LIGHT); }

  follow();
  dark.addEventListener("change", follow);
  let pending = 0;
  window.addEventListener("resize", function () {
    window.clearTimeout(pending);
    pending = window.setTimeout(function () { all.forEach(function (charts) { charts.resize(); }); }, 100);
  });
  window.addEventListener("beforeprint", function () {
    drawAll(LIGHT);
    all.forEach(function (charts) { charts.resize(); });
  });
  window.addEventListener("afterprint", function () {
    follow();
    all.forEach(function (charts) { charts.resize(); });
  });
  document.body.setAttribute("data-operating-points-drawn", String(all.length));
}());

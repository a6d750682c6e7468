// Frame and bit error rates against Eb/N0, with intervals, limits and targets.
(function () {
  "use strict";

  // Names of the limits that schemes carry, in the words of the page; the others are drawn under their field's name.
  const LIMIT_NAMES = {
    shannonDb: "Shannon", modulationDb: "modulation", hardDecisionDb: "hard decision",
    normalApproximationDb: "finite length (est.)", finiteLengthDb: "finite length", converseDb: "finite length"
  };

  const text = nearlimit.text;
  const frame = nearlimit.frame;

  /** @param view the operating point's schemes and how they look */
  function ErrorRateChart(view) {
    this.view = view;
    this.chart = echarts.init(view.container.querySelector(".error-rates"), null, { renderer: "svg" });
  }

  ErrorRateChart.prototype.resize = function () {
    this.chart.resize();
    this.draw();
  };

  ErrorRateChart.prototype.limitRules = function (index) {
    const scheme = this.view.schemes[index];
    const limits = scheme.limits || {};
    const rules = [];
    Object.keys(limits).forEach(function (field) {
      if (!text.isNumber(limits[field])) { return; }
      // A hard-decision limit is said of schemes that decide hard; of others it is no limit.
      if (field === "hardDecisionDb" && !text.isNumber(scheme.gapToHardDecisionLimitDb)) { return; }
      const name = LIMIT_NAMES[field] || field.replace(/Db$/, "");
      rules.push({ x: limits[field], name: name + " " + text.db(limits[field]), dash: [2, 3] });
    });
    return rules;
  };

  ErrorRateChart.prototype.draw = function () {
    const form = this.view.form;
    const choice = form.querySelector(".switch input:checked").value;
    const rates = choice === "both" ? ["fer", "ber"] : [choice];
    const focus = Number(form.elements.focus.value);
    const shown = this.view.shown();
    const rules = this.limitRules(focus).concat(this.view.availableRule());
    const targets = this.targets(focus, rates);
    const range = this.errorRateRange(shown, rates, rules, targets);
    rules.forEach(function (rule) { rule.min = range.x.min; rule.max = range.x.max; });
    const rateNames = rates.map(function (rate) { return rate.toUpperCase(); }).join(", ");
    const axes = frame.axes(this.view.palette, "Eb/N0 [dB]", rateNames, {
      type: "log", min: range.yMin, max: 1,
      axisLabel: { color: this.view.palette.ink, fontSize: 12,
        formatter: function (v) { return text.power(Math.round(Math.log10(v))); } }
    });
    Object.assign(axes.x, range.x);
    const option = frame.base(this.view.palette, axes, rules);
    option.series = [];
    const ends = [];
    shown.forEach(function (index) {
      rates.forEach(function (rate) {
        this.addCurve(option.series, ends, index, rate, range, choice === "both");
      }, this);
    }, this);
    this.addEndLabels(option.series, ends, range);
    this.addUncoded(option.series, range);
    option.series.push(this.targetSeries(targets));
    option.series.push(frame.ruleSeries(this.view.palette, rules));
    this.chart.setOption(option, true);
  };

  ErrorRateChart.prototype.targets = function (focus, rates) {
    const requirement = this.view.requirement;
    const fer = this.view.schemes[focus].codewordFerTarget || requirement.payloadFer;
    const targets = [];
    if (rates.indexOf("fer") >= 0 && text.isNumber(fer)) {
      targets.push({ y: fer, name: "target FER " + text.rate(fer) });
    }
    if (rates.indexOf("ber") >= 0 && text.isNumber(requirement.ber)) {
      targets.push({ y: requirement.ber, name: "target BER " + text.rate(requirement.ber) });
    }
    return targets;
  };

  ErrorRateChart.prototype.measured = function (index, rate) {
    return (this.view.schemes[index].points || [])
      .filter(function (m) { return text.isNumber(m.ebn0Db) && text.isNumber(m[rate]); })
      .sort(function (a, b) { return a.ebn0Db - b.ebn0Db; });
  };

  ErrorRateChart.prototype.exact = function (index, rate) {
    return (this.view.schemes[index].exactCurve || [])
      .filter(function (e) { return text.isNumber(e.ebn0Db) && e[rate] > 0; })
      .map(function (e) { return [e.ebn0Db, e[rate]]; })
      .sort(function (a, b) { return a[0] - b[0]; });
  };

  /* The part of the plane worth showing: a decade below the target or the lowest simulated rate, and no further right
     than the schemes' curves, the rules and half a decibel. */
  ErrorRateChart.prototype.errorRateRange = function (shown, rates, rules, targets) {
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
    return { x: frame.wholeDb(Math.min.apply(null, xs) - 0.2, Math.max.apply(null, xs) + 0.5), yMin: yMin };
  };

  ErrorRateChart.prototype.addCurve = function (series, ends, index, rate, range, both) {
    const colour = this.view.colour(index);
    const marker = "path://" + this.view.marker(index);
    const key = this.view.keys[index];
    const hollow = both && rate === "ber";
    const label = this.view.label(index);
    const palette = this.view.palette;
    const end = { show: true, position: "right", distance: 7, color: colour, fontWeight: "bold", fontSize: 12,
      formatter: both ? key + " " + rate.toUpperCase() : key };
    const exact = this.exact(index, rate).filter(function (e) { return e[1] >= range.yMin; });
    if (exact.length > 0) {
      series.push({
        type: "line", symbol: "none", z: 2, lineStyle: { color: colour, width: hollow ? 1.2 : 2 }, data: exact,
        tooltip: { formatter: label + "<br>exact " + rate.toUpperCase() }
      });
      ends.push({ place: exact[exact.length - 1], label: end });
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
          return label + "<br>" + text.db(m.ebn0Db) + " dB: " + rate.toUpperCase() + " " + text.rate(m[rate])
            + (text.isNumber(m[rate + "Low"]) && text.isNumber(m[rate + "High"])
              ? "<br>95 % interval " + text.rate(m[rate + "Low"]) + " to " + text.rate(m[rate + "High"]) : "")
            + "<br>" + text.escape(m.frames) + " frames, " + text.escape(m.frameErrors) + " with errors"
            + (m.complete === false ? ", incomplete" : "");
        }
      }
    });
    if (seen.length > 0 && exact.length === 0) {
      const last = seen[seen.length - 1];
      ends.push({ place: [last.ebn0Db, last[rate]], label: end });
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

  // A curve's key stands at its right end, or at its left where another curve ends close by on the right.
  ErrorRateChart.prototype.addEndLabels = function (series, ends, range) {
    const nearby = function (from, to) {
      const distance = to.place[0] - from.place[0];
      return distance >= 0 && distance < 0.05 * (range.x.max - range.x.min)
        && Math.abs(Math.log10(to.place[1] / from.place[1])) < 0.5;
    };
    ends.forEach(function (end) {
      const others = ends.filter(function (other) { return other !== end; });
      const right = others.some(function (other) { return nearby(end, other); });
      const left = others.some(function (other) { return nearby(other, end); });
      const label = Object.assign({}, end.label, { position: right && !left ? "left" : "right" });
      series.push(frame.endLabel(this.view.palette, end.place, label));
    }, this);
  };

  ErrorRateChart.prototype.errorBars = function (measured, rate, colour, range) {
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

  ErrorRateChart.prototype.addUncoded = function (series, range) {
    const uncoded = ((this.view.point.curves || {}).uncodedBer || [])
      .filter(function (u) { return u[1] >= range.yMin / 10; });
    if (uncoded.length === 0) { return; }
    const p = this.view.palette;
    series.push({
      type: "line", symbol: "none", z: 1, data: uncoded, lineStyle: { color: p.soft, width: 1.5, type: [6, 3, 1, 3] },
      tooltip: { formatter: "uncoded transmission, BER" }
    });
    const inside = uncoded.filter(function (u) {
      return u[0] >= range.x.min && u[0] <= range.x.max && u[1] >= range.yMin;
    });
    if (inside.length === 0) { return; }
    const last = inside[inside.length - 1];
    const atEdge = last[0] > range.x.max - 0.2 * (range.x.max - range.x.min);
    series.push(frame.endLabel(this.view.palette, last, {
      show: true, position: atEdge ? [0, -16] : "right", align: atEdge ? "right" : "left", formatter: "uncoded BER",
      color: p.soft, fontSize: 12
    }));
  };

  ErrorRateChart.prototype.targetSeries = function (targets) {
    const p = this.view.palette;
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
            { type: "text", style: { x: area.x + 6, y: y + 9, text: targets[params.dataIndex].name,
              fill: p.good, font: "12px system-ui, sans-serif", textAlign: "left", textVerticalAlign: "middle",
              stroke: p.sheet, lineWidth: 3 } }
          ]
        };
      }
    };
  };

  nearlimit.ErrorRateChart = ErrorRateChart;
}());

// Spectral efficiency against Eb/N0: what channels allow, and each scheme's place.
(function () {
  "use strict";

  const text = nearlimit.text;
  const frame = nearlimit.frame;

  /** @param view the operating point's schemes and how they look */
  function EfficiencyChart(view) {
    this.view = view;
    this.chart = echarts.init(view.container.querySelector(".efficiency"), null, { renderer: "svg" });
  }

  EfficiencyChart.prototype.resize = function () {
    this.chart.resize();
    this.draw();
  };

  EfficiencyChart.prototype.draw = function () {
    const p = this.view.palette;
    const placed = this.view.schemes.map(function (scheme, index) { return { scheme: scheme, index: index }; })
      .filter(function (s) {
        return text.isNumber(s.scheme.neededEbn0Db) && text.isNumber(s.scheme.efficiencyBitsPerRealDimension);
      });
    const curves = this.view.point.curves || {};
    const rules = this.view.availableRule();
    const xs = placed.map(function (s) { return s.scheme.neededEbn0Db; })
      .concat(rules.map(function (r) { return r.x; })).concat([-1, 4]);
    const range = frame.wholeDb(Math.min.apply(null, xs) - 1, Math.max.apply(null, xs) + 0.8);
    const highest = Math.max.apply(null, placed.map(function (s) { return s.scheme.efficiencyBitsPerRealDimension; })
      .concat([0.9]));
    rules.forEach(function (rule) { rule.min = range.min; rule.max = range.max; });
    const axes = frame.axes(this.view.palette, "Eb/N0 [dB]", "information bits per real dimension",
      { type: "value", min: 0, max: Math.ceil(highest * 5 + 0.5) / 5 });
    Object.assign(axes.x, range);
    const option = frame.base(this.view.palette, axes, rules);
    option.series = [];
    nearlimit.appearance.capacities.forEach(function (capacity) {
      this.addCapacity(option.series, curves[capacity.field], capacity.dash);
    }, this);
    placed.forEach(function (s) { this.addPlace(option.series, s.scheme, s.index); }, this);
    option.series.push(frame.ruleSeries(this.view.palette, rules));
    this.chart.setOption(option, true);
  };

  EfficiencyChart.prototype.addCapacity = function (series, data, dash) {
    if (!data || data.length === 0) { return; }
    series.push({
      type: "line", symbol: "none", silent: true, z: 1, data: data,
      lineStyle: { color: this.view.palette.ink, width: 1.5, type: dash.length > 0 ? dash : "solid" }
    });
  };

  EfficiencyChart.prototype.addPlace = function (series, scheme, index) {
    const colour = this.view.colour(index);
    const place = [scheme.neededEbn0Db, scheme.efficiencyBitsPerRealDimension];
    const p = this.view.palette;
    const spread = text.isNumber(scheme.neededEbn0DbLow) && text.isNumber(scheme.neededEbn0DbHigh)
      ? [scheme.neededEbn0DbLow, scheme.neededEbn0DbHigh] : null;
    if (spread && spread[1] > spread[0]) {
      series.push({
        type: "line", symbol: "none", silent: true, z: 2, lineStyle: { color: colour, width: 1.5, type: "solid" },
        data: [[spread[0], place[1]], [spread[1], place[1]]]
      });
    }
    series.push({
      // The best scheme lies on top where several share a place.
      type: "scatter", z: 4 - this.view.order[index] / this.view.boxes.length, symbol: "path://" + this.view.marker(index), symbolSize: 13, symbolKeepAspect: true,
      itemStyle: { color: scheme.meets ? colour : p.sheet, borderColor: colour, borderWidth: 1.8, opacity: 1 },
      data: [place],
      label: {
        show: true, formatter: this.view.keys[index], position: "right", distance: 4, color: colour, fontSize: 12,
        fontWeight: "bold", textBorderColor: p.sheet, textBorderWidth: 3
      },
      labelLayout: { hideOverlap: true },
      tooltip: {
        formatter: this.view.label(index) + "<br>needs " + text.db(scheme.neededEbn0Db) + " dB, "
          + (scheme.meets ? "meets every demand" : "fails")
      }
    });
  };

  nearlimit.EfficiencyChart = EfficiencyChart;
}());

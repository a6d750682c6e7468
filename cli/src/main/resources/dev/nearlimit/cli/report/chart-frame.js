// What both charts are made of: axes, rules with names, labels at the ends of curves.
(function () {
  "use strict";

  function axes(p, xName, yName, yAxis) {
    const common = {
      nameLocation: "middle",
      nameTextStyle: { color: p.ink, fontSize: 13 },
      axisLine: { show: true, onZero: false, lineStyle: { color: p.soft } },
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
  }

  /* The range of an axis in dB that holds both ends and starts, ends and ticks at multiples of a whole number. */
  function wholeDb(low, high) {
    const span = high - low;
    const step = span <= 8 ? 1 : span <= 18 ? 2 : 5;
    return { min: Math.floor(low / step) * step, max: Math.ceil(high / step) * step, interval: step };
  }

  function base(p, axes, rules) {
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
  }

  /* Vertical rules, such as limits, with their names staggered: the leftmost is the tallest, so that no name lies
     over a rule further right. */
  function ruleSeries(p, rules) {
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
  }

  function endLabel(p, place, label) {
    return {
      type: "scatter", silent: true, z: 5, symbolSize: 1, itemStyle: { color: "transparent", opacity: 1 }, data: [place],
      label: Object.assign({ textBorderColor: p.sheet, textBorderWidth: 3 }, label),
      labelLayout: { moveOverlap: "shiftY" }
    };
  }

  nearlimit.frame = {
    axes: axes, wholeDb: wholeDb, base: base, ruleSeries: ruleSeries, endLabel: endLabel
  };
}());

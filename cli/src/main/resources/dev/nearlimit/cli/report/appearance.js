// Colours, markers and line styles, and their pictures for legends.
(function () {
  "use strict";

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

  const CAPACITIES = [
    { field: "shannonEfficiency", name: "Shannon, any input", dash: [] },
    { field: "binaryInputEfficiency", name: "binary input, soft decisions", dash: [7, 3] },
    { field: "hardDecisionEfficiency", name: "binary input, hard decisions", dash: [2, 3] }
  ];

  function swatch(path, colour, filled, withLine) {
    return '<svg width="34" height="14" viewBox="-17 -7 34 14">'
      + (withLine ? '<path d="M-17,0H17" stroke="' + colour + '" stroke-width="2"/>' : "")
      + '<path d="' + path + '" transform="scale(5)" fill="' + (filled ? colour : "none") + '" stroke="' + colour
      + '" stroke-width="0.35"/></svg>';
  }

  function lineSwatch(dash, colour) {
    return '<svg width="34" height="14" viewBox="-17 -7 34 14"><path d="M-17,0H17" stroke="' + colour
      + '" stroke-width="1.5" stroke-dasharray="' + dash.join(" ") + '"/></svg>';
  }

  nearlimit.appearance = {
    light: LIGHT, dark: DARK, markers: MARKERS, capacities: CAPACITIES, swatch: swatch, lineSwatch: lineSwatch
  };
}());

// Starts the charts of each operating point, follows the colour scheme and the width, and prints in light colours.
(function () {
  "use strict";

  const appearance = nearlimit.appearance;
  const text = nearlimit.text;
  const results = JSON.parse(document.getElementById("results").textContent);

  function familyOf(scheme) {
    return scheme.family || String(scheme.code || "").split(/[:+]/)[0] || "other";
  }

  /** One operating point: its schemes in the order of the legend, their keys, colours and markers. */
  function View(container) {
    this.requirement = results.requirement || {};
    this.point = results.operatingPoints[Number(container.dataset.operatingPoint)];
    this.schemes = this.point.schemes;
    this.container = container;
    this.form = container.querySelector("form");
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
    this.palette = appearance.light;
    this.errorRates = new nearlimit.ErrorRateChart(this);
    this.efficiency = new nearlimit.EfficiencyChart(this);
    this.listen();
  }

  View.prototype.listen = function () {
    const view = this;
    this.form.addEventListener("change", function () { view.errorRates.draw(); });
    this.form.addEventListener("submit", function (event) { event.preventDefault(); });
    this.form.querySelectorAll("[data-pick]").forEach(function (button) {
      button.addEventListener("click", function () { view.pick(button.dataset.pick); });
    });
  };

  View.prototype.pick = function (which) {
    this.boxes.forEach(function (box) {
      box.checked = !box.disabled && (which === "all" || (which === "first" && box.hasAttribute("data-first")));
    });
    this.errorRates.draw();
  };

  View.prototype.colour = function (index) {
    return this.palette.schemes[this.order[index] % this.palette.schemes.length];
  };

  View.prototype.marker = function (index) {
    return appearance.markers[this.families.indexOf(familyOf(this.schemes[index])) % appearance.markers.length];
  };

  View.prototype.label = function (index) {
    const scheme = this.schemes[index];
    return "<b>" + text.escape(this.keys[index] + " " + scheme.code) + "</b><br>" + text.escape(scheme.decoder || "")
      + "<br>" + text.escape(scheme.modulation || "");
  };

  View.prototype.shown = function () {
    return this.boxes.filter(function (box) { return box.checked; }).map(function (box) { return Number(box.value); });
  };

  View.prototype.availableRule = function () {
    const available = this.point.availableEbn0Db;
    return text.isNumber(available)
      ? [{ x: available, name: "available " + text.db(available), dash: [8, 4], strong: true }] : [];
  };

  View.prototype.draw = function (palette) {
    this.palette = palette;
    this.drawLegends();
    this.errorRates.draw();
    this.efficiency.draw();
  };

  View.prototype.resize = function () {
    this.errorRates.resize();
    this.efficiency.resize();
  };

  View.prototype.drawLegends = function () {
    this.boxes.forEach(function (box) {
      const index = Number(box.value);
      box.parentNode.querySelector(".swatch").innerHTML =
        appearance.swatch(this.marker(index), this.colour(index), true, true);
    }, this);
    const list = this.container.querySelector(".key");
    const add = function (picture, name) {
      const item = document.createElement("li");
      item.innerHTML = picture;
      item.appendChild(document.createTextNode(name));
      list.appendChild(item);
    };
    list.textContent = "";
    appearance.capacities.forEach(function (capacity) {
      if (((this.point.curves || {})[capacity.field] || []).length > 0) {
        add(appearance.lineSwatch(capacity.dash, this.palette.ink), capacity.name);
      }
    }, this);
    this.families.forEach(function (family, i) {
      add(appearance.swatch(appearance.markers[i % appearance.markers.length], this.palette.soft, true, false), family);
    }, this);
  };

  const dark = window.matchMedia("(prefers-color-scheme: dark)");
  const views = Array.from(document.querySelectorAll(".charts")).map(function (c) { return new View(c); });

  function drawAll(palette) { views.forEach(function (view) { view.draw(palette); }); }

  function follow() { drawAll(dark.matches ? appearance.dark : appearance.light); }

  function resizeAll() { views.forEach(function (view) { view.resize(); }); }

  follow();
  dark.addEventListener("change", follow);
  const widths = new ResizeObserver(function (entries) {
    entries.forEach(function (entry) {
      views.filter(function (view) { return view.container === entry.target; })
        .forEach(function (view) { view.resize(); });
    });
  });
  views.forEach(function (view) { widths.observe(view.container); });
  // Paper cannot be unfolded: what stands folded in tables is printed open.
  let unfolded = [];
  window.addEventListener("beforeprint", function () {
    unfolded = Array.from(document.querySelectorAll("td details:not([open]), th details:not([open])"));
    unfolded.forEach(function (details) { details.open = true; });
    drawAll(appearance.light);
    resizeAll();
  });
  window.addEventListener("afterprint", function () {
    unfolded.forEach(function (details) { details.open = false; });
    follow();
    resizeAll();
  });
  document.body.setAttribute("data-operating-points-drawn", String(views.length));
}());

// Numbers as the page writes them: the same digits as in its tables.
const nearlimit = {};

(function () {
  "use strict";

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

  nearlimit.text = { power: power, rate: rateText, db: dbText, isNumber: isNumber, escape: escapeHtml };
}());

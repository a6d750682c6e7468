// Tables: sort by the button in a heading, and fold long ones after a dozen rows.
(function () {
  "use strict";

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

  const UNFOLDED_ROWS = 12;

  document.querySelectorAll("table.foldable").forEach(function (table) {
    const rows = table.tBodies[0].rows.length;
    if (rows <= UNFOLDED_ROWS) { return; }
    const button = document.createElement("button");
    button.type = "button";
    button.className = "unfold";
    const fold = function (folded) {
      table.classList.toggle("folded", folded);
      button.textContent = folded ? "show all " + rows : "show the first " + UNFOLDED_ROWS;
      button.setAttribute("aria-expanded", String(!folded));
    };
    button.addEventListener("click", function () { fold(!table.classList.contains("folded")); });
    fold(true);
    table.parentNode.insertAdjacentElement("afterend", button);
  });
}());

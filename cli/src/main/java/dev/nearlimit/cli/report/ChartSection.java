package dev.nearlimit.cli.report;

import java.util.List;
import java.util.Set;

/**
 * The places of the two charts of an operating point with the controls beside them; the page's script draws the curves
 * from the embedded results. The scheme list is the charts' legend: each entry carries the scheme's key, which also
 * stands at its curve and its marker.
 */
final class ChartSection {
    private ChartSection() {}

    static void write(OperatingPoint point, Markup html) {
        if (point.schemes().isEmpty()) {
            return;
        }
        html.open("div", "class", "charts", "data-operating-point", String.valueOf(point.index()));
        html.element("h3", "Error rates");
        html.open("div", "class", "chart-and-controls");
        writeChart(
                html,
                "error-rates",
                "Error rate against Eb/N0 on a logarithmic axis, with 95 % intervals as error bars. Figures at the curves"
                        + " are the schemes' marks in the table. Rates are per codeword. A triangle that points down is an"
                        + " upper bound: no error was seen there.");
        writeControls(point, html);
        html.closeLine();
        html.element("h3", "Spectral efficiency");
        writeChart(
                html,
                "efficiency",
                "What each scheme carries per real dimension against the Eb/N0 that it needs, with what the channel"
                        + " allows. A filled marker meets every demand, a hollow one fails; the shape tells the family."
                        + " Schemes without a needed Eb/N0 have no marker.");
        html.open("ul", "class", "key", "aria-label", "Lines and marker shapes");
        html.close();
        html.closeLine();
    }

    private static void writeChart(Markup html, String name, String caption) {
        html.open("figure");
        html.open("div", "class", "chart " + name, "role", "img", "aria-label", caption)
                .close();
        html.element("figcaption", caption).closeLine();
    }

    private static void writeControls(OperatingPoint point, Markup html) {
        html.open("form", "class", "controls");
        html.open("fieldset", "class", "switch").element("legend", "Show");
        String group = "rate-" + point.index();
        writeRadio(html, group, "fer", "FER", true);
        writeRadio(html, group, "ber", "BER", false);
        writeRadio(html, group, "both", "both", false);
        html.closeLine();
        html.open("label", "class", "focus").text("Limits and target of ");
        html.open("select", "name", "focus");
        for (SchemeEntry scheme : point.schemes()) {
            html.element("option", scheme.key() + "  " + scheme.code(), "value", String.valueOf(scheme.index()));
        }
        html.close().closeLine();
        html.open("fieldset", "class", "legend").element("legend", "Schemes");
        html.open("p", "class", "pick");
        html.element("button", "best of each code", "type", "button", "data-pick", "first");
        html.element("button", "all", "type", "button", "data-pick", "all");
        html.element("button", "none", "type", "button", "data-pick", "none");
        html.close();
        html.open("div", "class", "scheme-list", "tabindex", "0");
        Set<Integer> shown = point.shownAtFirst();
        List<SchemeEntry> schemes = point.schemes();
        for (SchemeEntry scheme : schemes) {
            writeLegendEntry(scheme, shown.contains(scheme.index()), html);
        }
        html.close().close().closeLine();
    }

    private static void writeRadio(Markup html, String group, String value, String label, boolean checked) {
        html.open("label");
        html.empty("input", "type", "radio", "name", group, "value", value, "checked", checked ? "" : null);
        html.text(" " + label).close();
    }

    private static void writeLegendEntry(SchemeEntry scheme, boolean shown, Markup html) {
        html.open("label", "class", scheme.hasCurve() ? "entry" : "entry no-curve");
        html.empty(
                "input",
                "type",
                "checkbox",
                "value",
                String.valueOf(scheme.index()),
                "data-key",
                scheme.key(),
                "checked",
                shown ? "" : null,
                "data-first",
                shown ? "" : null,
                "disabled",
                scheme.hasCurve() ? null : "");
        html.open("span", "class", "swatch", "aria-hidden", "true").close();
        html.open("span", "class", "name").element("b", scheme.key()).text(" ");
        html.designator(scheme.code()).text(" ");
        html.element(
                "span",
                scheme.decoderName() + ", " + scheme.modulation() + (scheme.hasCurve() ? "" : ", no curve"),
                "class",
                "detail");
        html.close().closeLine();
    }
}

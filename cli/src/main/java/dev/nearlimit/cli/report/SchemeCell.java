package dev.nearlimit.cli.report;

/**
 * What stands in the cell that names a scheme: its code, under it decoder and modulation by name, and all settings,
 * unfolded on demand. They stand open where names alone do not tell the scheme from another.
 */
final class SchemeCell {
    private SchemeCell() {}

    static void write(SchemeEntry scheme, OperatingPoint point, Markup html) {
        html.open("span", "class", "code").designator(scheme.code()).close();
        String names = scheme.decoderName() + " \u00b7 " + scheme.modulation()
                + (scheme.quantised() ? " \u00b7 quantised" : "");
        String rest = scheme.channelAndQuantiser();
        if (scheme.decoder().equals(scheme.decoderName()) && rest.isEmpty()) {
            html.element("span", names, "class", "detail");
        } else {
            boolean ambiguous = point.schemes().stream()
                    .anyMatch(other -> other.index() != scheme.index()
                            && other.code().equals(scheme.code())
                            && other.decoderName().equals(scheme.decoderName())
                            && other.modulation().equals(scheme.modulation())
                            && other.quantised() == scheme.quantised());
            html.open("details", "open", ambiguous ? "" : null).element("summary", names);
            html.open("span", "class", "detail").designator(scheme.decoder());
            if (!rest.isEmpty()) {
                html.text(" \u00b7 ").designator(rest);
            }
            html.close().close();
        }
    }
}

package dev.nearlimit.cli.report;

import java.util.ArrayDeque;
import java.util.Deque;

/**
 * Writes HTML elements and does all the escaping: text and attribute values may hold anything, since names come from
 * users' files. Elements are closed in the order in which they were opened.
 */
final class Markup {
    private final StringBuilder out = new StringBuilder();
    private final Deque<String> open = new ArrayDeque<>();

    /**
     * Opens an element.
     *
     * @param tag its name
     * @param attributes names and values in turn; an attribute whose value is null is left out, one whose value is
     *     empty is written bare
     */
    Markup open(String tag, String... attributes) {
        startTag(tag, attributes);
        open.push(tag);
        return this;
    }

    /** Closes the element opened last. */
    Markup close() {
        out.append("</").append(open.pop()).append('>');
        return this;
    }

    /** Closes the element opened last and starts a new line, so that the page's source stays readable. */
    Markup closeLine() {
        close();
        out.append('\n');
        return this;
    }

    /** Writes an element that has no content and no end tag, such as input. */
    Markup empty(String tag, String... attributes) {
        startTag(tag, attributes);
        return this;
    }

    /** Writes text. */
    Markup text(String text) {
        escape(text);
        return this;
    }

    /** Writes a whole element that holds only text. */
    Markup element(String tag, String text, String... attributes) {
        return open(tag, attributes).text(text).close();
    }

    /** Writes a designator as a code element that may break after its punctuation, since some are long. */
    Markup designator(String designator) {
        open("code");
        for (int i = 0; i < designator.length(); i++) {
            char c = designator.charAt(i);
            if (c == '+' || c == '/') {
                out.append("<wbr>");
            }
            escape(c);
            if (c == ':' || c == ',') {
                out.append("<wbr>");
            }
        }
        return close();
    }

    /** What was written. Every element must have been closed. */
    String html() {
        if (!open.isEmpty()) {
            throw new IllegalStateException("elements left open: " + open);
        }
        return out.toString();
    }

    private void startTag(String tag, String... attributes) {
        out.append('<').append(tag);
        for (int i = 0; i < attributes.length; i += 2) {
            String value = attributes[i + 1];
            if (value == null) {
                continue;
            }
            out.append(' ').append(attributes[i]);
            if (!value.isEmpty()) {
                out.append("=\"");
                escape(value);
                out.append('"');
            }
        }
        out.append('>');
    }

    private void escape(String text) {
        for (int i = 0; i < text.length(); i++) {
            escape(text.charAt(i));
        }
    }

    private void escape(char c) {
        switch (c) {
            case '&' -> out.append("&amp;");
            case '<' -> out.append("&lt;");
            case '>' -> out.append("&gt;");
            case '"' -> out.append("&quot;");
            case '\'' -> out.append("&#39;");
            default -> out.append(c);
        }
    }
}

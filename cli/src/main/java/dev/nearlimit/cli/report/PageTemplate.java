package dev.nearlimit.cli.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The page with its slots, written {@code {{name}}}. They are filled in one pass, so that what is put into one slot is
 * never taken for another slot.
 */
final class PageTemplate {
    private static final Pattern SLOT = Pattern.compile("\\{\\{([a-z-]+)}}");

    private final String page;

    private PageTemplate(String page) {
        this.page = page;
    }

    static PageTemplate load() {
        return new PageTemplate(resource("page.html"));
    }

    /** The text of a resource: a name beside this class, or an absolute one on the class path. */
    static String resource(String name) {
        try (InputStream in = PageTemplate.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("the class path lacks " + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The page with each slot replaced by the content of that name, which must be HTML that is already escaped. */
    String fill(Map<String, String> contents) {
        Matcher slots = SLOT.matcher(page);
        StringBuilder filled = new StringBuilder();
        while (slots.find()) {
            String content = contents.get(slots.group(1));
            if (content == null) {
                throw new IllegalStateException("nothing to put into the slot " + slots.group(1));
            }
            slots.appendReplacement(filled, Matcher.quoteReplacement(content));
        }
        return slots.appendTail(filled).toString();
    }
}

package dev.nearlimit.cli.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class MarkupTest {
    @Test
    void escapesTextAndAttributes() {
        String html = new Markup()
                .element("p", "a < b & \"c\" 'd'", "title", "\"><script>")
                .html();

        assertEquals("<p title=\"&quot;&gt;&lt;script&gt;\">a &lt; b &amp; &quot;c&quot; &#39;d&#39;</p>", html);
    }

    @Test
    void leavesOutNullAttributesAndWritesEmptyOnesBare() {
        assertEquals(
                "<input checked>",
                new Markup().empty("input", "class", null, "checked", "").html());
    }

    @Test
    void designatorsMayBreakAfterPunctuationAndAreEscaped() {
        assertEquals(
                "<code>bch:<wbr>127,<wbr>64<wbr>+shorten=&lt;8</code>",
                new Markup().designator("bch:127,64+shorten=<8").html());
    }

    @Test
    void refusesToEndWithOpenElements() {
        assertThrows(IllegalStateException.class, () -> new Markup().open("p").html());
    }
}

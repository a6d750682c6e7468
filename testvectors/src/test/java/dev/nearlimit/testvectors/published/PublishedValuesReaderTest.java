package dev.nearlimit.testvectors.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.StringReader;
import java.math.BigDecimal;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PublishedValuesReaderTest {
    private static final String HEADER = String.join(",", PublishedRow.COLUMNS) + "\n";
    private static final String GOOD =
            "X-1,limit,AWGN,R=1/2,,limit --rate 1/2  --format json,/limits/0/ebn0Db,0.5,dB,absolute,0.01,book,read,,command\n";

    @Test
    void readsARow() {
        PublishedValue row = read(HEADER + GOOD).get(0);
        assertEquals("X-1", row.id());
        assertEquals(2, row.line());
        assertEquals(List.of("limit", "--rate", "1/2", "--format", "json"), row.command());
        assertEquals("/limits/0/ebn0Db", row.pointer());
        assertEquals(new BigDecimal("0.5"), row.value());
        assertEquals(ToleranceKind.ABSOLUTE, row.toleranceKind());
        assertEquals(Basis.READ, row.basis());
        assertEquals(Reach.COMMAND, row.reach());
    }

    @Test
    void countsLinesThroughQuotedLineBreaks() {
        String twoLines = GOOD.replace("book", "\"a\nbook\"");
        List<PublishedValue> rows = read(HEADER + twoLines + GOOD.replace("X-1", "X-2"));
        assertEquals(2, rows.get(0).line());
        assertEquals(4, rows.get(1).line());
    }

    /** What is replaced in a good row, by what, and the objection. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "X-1|''|id is empty",
                "book|''|source is empty",
                "book|' book'|source is ' book', must not begin or end with blanks",
                ",0.5,|,half,|value is 'half', must be a number",
                ",0.01,|,,|tolerance is '', must be a number",
                ",0.01,|,-1,|tolerance is -1, must be at least 0",
                "absolute|exact|tolerance is 0.01, must be 0 for an exact value",
                "absolute|about|tolerance_kind is 'about', must be one of absolute, relative, exact",
                ",read,|,seen,|basis is 'seen', must be one of read, computed, common practice, memory",
                ",command|,later|status is 'later', must be one of command, api",
                ",command|,api|command is 'limit --rate 1/2  --format json', must be empty for status api",
                "/limits/0/ebn0Db|''|pointer is '', must be given for status command",
                "/limits/0/ebn0Db|limits|pointer is 'limits', must begin with '/'",
                ",command|,command,|has 16 fields, must have 15",
            })
    void refusesWhatIsMalformed(String part, String instead, String objection) {
        String text = HEADER + GOOD.replace("X-1", "X-0") + GOOD.replaceFirst(Pattern.quote(part), instead);
        PublishedValueException refused = assertThrows(PublishedValueException.class, () -> read(text));
        assertEquals("x.csv line 3: " + objection, refused.getMessage());
    }

    @Test
    void refusesFilesThatAreNoTable() {
        assertEquals("x.csv is empty, must begin with a header", refusal(""));
        assertEquals(
                "x.csv line 1: header is 'id,value', must be '" + HEADER.strip() + "'", refusal("id,value\nX-1,2\n"));
        assertEquals("x.csv line 3: has 1 fields, must have 15", refusal(HEADER + GOOD + "\n"));
        assertEquals("x.csv line 3: id 'X-1' occurs already in x.csv line 2", refusal(HEADER + GOOD + GOOD));
    }

    @Test
    void refusesBrokenQuotes() {
        assertThrows(PublishedValueException.class, () -> read(HEADER + GOOD.replace("book", "\"book")));
        assertThrows(PublishedValueException.class, () -> read(HEADER + GOOD.replace("book", "\"bo\"ok")));
    }

    private static List<PublishedValue> read(String text) {
        return PublishedValues.read("x.csv", new StringReader(text));
    }

    private static String refusal(String text) {
        return assertThrows(PublishedValueException.class, () -> read(text)).getMessage();
    }
}

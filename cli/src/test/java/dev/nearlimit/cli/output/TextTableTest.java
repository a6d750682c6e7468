package dev.nearlimit.cli.output;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

final class TextTableTest {
    @Test
    void wordsStandLeftAndNumbersRightUnderTheirUnits() {
        TextTable table = new TextTable()
                .words("name")
                .numbers("level", "dB")
                .row("a", "1.00")
                .row("long name", "-12.50");
        assertEquals("""
                name        level
                             [dB]
                -----------------
                a            1.00
                long name  -12.50
                """, table.toString());
    }

    @Test
    void lastColumnOfWordsIsBrokenAtTheWidthOfATerminal() {
        TextTable table = new TextTable()
                .words("name")
                .words("text")
                .row("a", "word ".repeat(40).strip());
        assertTrue(table.toString().lines().allMatch(line -> line.length() <= TextTable.WIDTH), table.toString());
        assertEquals(40, table.toString().split("word", -1).length - 1);
    }

    @Test
    void wordLongerThanTheWidthStaysWhole() {
        assertEquals(java.util.List.of("aa", "bbbbbbbb", "cc"), TextTable.wrap("aa bbbbbbbb cc", 4));
    }

    @Test
    void longDesignatorIsBrokenBehindItsCommas() {
        assertEquals(
                java.util.List.of("of", "name:a=1,", "bb=22,c=3", "x,y"),
                TextTable.wrap("of name:a=1,bb=22,c=3 x,y", 9));
    }

    @Test
    void rowMustFitTheColumns() {
        TextTable table = new TextTable().words("name");
        assertThrows(IllegalArgumentException.class, () -> table.row("a", "b"));
    }
}

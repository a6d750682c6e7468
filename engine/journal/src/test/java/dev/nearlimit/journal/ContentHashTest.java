package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** A key tells apart whatever differs, and is the same on every machine. */
final class ContentHashTest {
    /** The digest of no bytes is a published constant of SHA-256 (common practice). */
    @Test
    void withoutFieldsItIsTheDigestOfNothing() {
        assertEquals(
                "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855",
                ContentHash.builder().build().hex());
    }

    /**
     * Journals of other machines and earlier versions are found by these digits, so they must not change. Expected value
     * from another implementation (Python's struct and hashlib): name and value of each field, each behind its length as
     * 32 bits, most significant byte first.
     */
    @Test
    void fieldsAreDigestedWithTheirLengths() {
        assertEquals(
                "a0216b40b1da73c20579e3c8642e1b4282e58434c2550ee32f5b8794eeb5d123",
                ContentHash.builder()
                        .add("code", "h\u00e4mming")
                        .add("n", 7)
                        .add("row", new int[] {1, -2})
                        .build()
                        .hex());
    }

    @Test
    void differentFieldsNeverRunTogether() {
        List<ContentHash> keys = List.of(
                ContentHash.builder().add("ab", "c").build(),
                ContentHash.builder().add("a", "bc").build(),
                ContentHash.builder().add("a", "b").add("c", "").build(),
                ContentHash.builder().add("a", "").add("b", "c").build(),
                ContentHash.builder().add("abc", "").build(),
                ContentHash.builder().add("n", 1).build(),
                ContentHash.builder().add("n", "1").build(),
                ContentHash.builder().add("n", new int[] {0, 1}).add("m", 0).build(),
                ContentHash.builder().add("n", new int[] {1, 0}).build());
        Set<String> digits = keys.stream().map(ContentHash::hex).collect(Collectors.toSet());
        assertEquals(keys.size(), digits.size());
    }

    @Test
    void orderOfFieldsMatters() {
        assertNotEquals(
                ContentHash.builder().add("a", 1).add("b", 2).build(),
                ContentHash.builder().add("b", 2).add("a", 1).build());
    }
}

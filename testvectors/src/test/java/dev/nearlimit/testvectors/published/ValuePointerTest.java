package dev.nearlimit.testvectors.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ValuePointerTest {
    private static final Map<String, Object> DOCUMENT = Map.of(
            "limits",
            List.of(Map.of("name", "shannon", "ebn0Db", 0.0), Map.of("name", "modulation", "ebn0Db", 0.187)),
            "weightEnumerator",
            List.of(
                    Map.of("weight", 0, "count", "1"),
                    Map.of("weight", 3, "count", "7"),
                    Map.of("weight", 4, "count", "7")),
            "a/b",
            Map.of("~", "tilde", "", "empty"),
            "twice",
            List.of(Map.of("n", 1), Map.of("n", 1)));

    @ParameterizedTest
    @CsvSource({
        "/limits/1/ebn0Db, 0.187",
        "/limits[name=shannon]/ebn0Db, 0.0",
        "/weightEnumerator[weight=3]/count, 7",
        "/weightEnumerator[count=1]/weight, 0",
        "/a~1b/~0, tilde",
        "/a~1b/, empty",
    })
    void findsTheValue(String pointer, String value) {
        assertEquals(value, String.valueOf(ValuePointer.of(pointer).select(DOCUMENT)));
    }

    @ParameterizedTest
    @CsvSource({
        "/limits/2/ebn0Db, 2",
        "/limits/01/ebn0Db, 01",
        "/limits/-1, -1",
        "/nothing, nothing",
        "/limits/0/ebn0Db/more, more",
        "/weightEnumerator[weight=5]/count, weightEnumerator[weight=5]",
        "/limits/0[name=shannon], 0[name=shannon]",
    })
    void saysWhereItStops(String pointer, String step) {
        PublishedValueException refused = assertThrows(
                PublishedValueException.class, () -> ValuePointer.of(pointer).select(DOCUMENT));
        assertEquals("pointer " + pointer + ": nothing at step '" + step + "'", refused.getMessage());
    }

    @Test
    void aChoiceMustBeUnique() {
        PublishedValueException refused = assertThrows(
                PublishedValueException.class,
                () -> ValuePointer.of("/twice[n=1]").select(DOCUMENT));
        assertEquals("pointer /twice[n=1]: step 'twice[n=1]' fits 2 elements, must fit one", refused.getMessage());
    }

    @Test
    void refusesWhatIsNoPointer() {
        assertThrows(PublishedValueException.class, () -> ValuePointer.of(""));
        assertThrows(PublishedValueException.class, () -> ValuePointer.of("limits"));
        assertThrows(PublishedValueException.class, () -> ValuePointer.of("/a~2"));
        assertThrows(PublishedValueException.class, () -> ValuePointer.of("/a~"));
    }
}

package dev.nearlimit.codes.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class CatalogueTest {
    private static List<String> listed() {
        return Catalogue.standard().listed();
    }

    @ParameterizedTest
    @MethodSource("listed")
    void everyListedDesignatorBuildsAndRoundTrips(String designator) {
        assertEquals(designator, Catalogue.standard().build(designator).designator());
    }
}

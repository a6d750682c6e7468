package dev.nearlimit.cli.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.codes.catalogue.Catalogue;
import org.junit.jupiter.api.Test;

final class CodesCommandTest {
    @Test
    void everyListedCodeIsShownWithinEightyColumns() {
        Execution execution = Execution.of("codes");
        assertEquals(0, execution.exitCode(), execution.err());
        for (String designator : Catalogue.standard().listed()) {
            assertTrue(execution.out().contains(designator + " "), designator);
        }
        assertTrue(execution.out().lines().allMatch(line -> line.length() <= 80), execution.out());
    }

    @Test
    void jsonCarriesExactRatesAndKnownDistances() {
        JsonNode codes = Execution.of("codes", "--family", "golay", "--format", "json")
                .json()
                .get("codes");
        assertEquals("golay:23,12", codes.get(0).get("code").asText());
        assertEquals("12/23", codes.get(0).get("rate").asText());
        // Golay 1949: distance 7, and 8 with the parity bit.
        assertEquals(7, codes.get(0).get("minimumDistance").asInt());
        assertEquals(8, codes.get(1).get("minimumDistance").asInt());
        assertEquals("syndrome", codes.get(0).get("decoders").get(0).asText());
    }

    @Test
    void distanceThatIsNotKnownIsNullAndEmpty() {
        JsonNode code = Execution.of(
                        "codes", "--family", "ldpc-802.11n", "--length", "648", "--rate", "1/2", "--format", "json")
                .json()
                .get("codes")
                .get(0);
        assertTrue(code.get("minimumDistance").isNull());
        Execution csv = Execution.of("codes", "--length", "648", "--rate", "1/2", "--format", "csv");
        assertTrue(csv.out().contains("\"ldpc-802.11n:648,1/2\",648,324,324/648,,sum-product min-sum,"), csv.out());
    }

    @Test
    void rangesIncludeBothEnds() {
        JsonNode codes = Execution.of("codes", "--rate", "2/3..3/4", "--length", "648..1296", "--format", "json")
                .json()
                .get("codes");
        assertEquals(4, codes.size());
    }

    @Test
    void emptyListIsSaidInWords() {
        assertEquals(
                "no code in the list has these properties\n",
                Execution.of("codes", "--length", "1..2").out());
    }
}

package dev.nearlimit.cli.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.ObjectMapper;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.testvectors.published.Agreement;
import dev.nearlimit.testvectors.published.PublishedValue;
import dev.nearlimit.testvectors.published.PublishedValues;
import dev.nearlimit.testvectors.published.Reach;
import dev.nearlimit.testvectors.published.ValuePointer;
import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every published value that a command yields is asked of that command; each row names its source. */
final class PublishedValuesCommandTest {
    /** Rows of one code share a command; each is run once. */
    private static final Map<List<String>, Object> DOCUMENTS = new HashMap<>();

    static List<PublishedValue> rows() {
        return PublishedValues.all().stream()
                .filter(value -> value.reach() == Reach.COMMAND)
                .toList();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void commandYieldsThePublishedValue(PublishedValue row, TestReporter reporter) {
        Object document = DOCUMENTS.computeIfAbsent(row.command(), PublishedValuesCommandTest::run);
        Object found = ValuePointer.of(row.pointer()).select(document);
        Agreement agreement = row.compare(new BigDecimal(String.valueOf(found)));
        if (row.basis().isGate()) {
            assertTrue(agreement.holds(), agreement::message);
        } else if (!agreement.holds()) {
            reporter.publishEntry("disagrees with a remembered value", agreement.message());
        }
    }

    @Test
    void atLeastThirtyValuesGateTheCommands() {
        long gates = rows().stream().filter(row -> row.basis().isGate()).count();
        assertTrue(gates >= 30, "only " + gates + " published values gate the commands");
    }

    private static Object run(List<String> command) {
        Execution execution = Execution.of(command.toArray(String[]::new));
        assertEquals(0, execution.exitCode(), () -> command + ": " + execution.err());
        return new ObjectMapper().convertValue(execution.json(), Object.class);
    }
}

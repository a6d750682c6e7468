package dev.nearlimit.shortlist.requirement;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.limits.Modulation;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class RequirementTest {
    private static Link link(
            double bandwidth, double rollOff, double bitRate, OptionalDouble cn0, OptionalDouble ebn0) {
        return new Link(
                bandwidth,
                rollOff,
                bitRate,
                cn0,
                ebn0,
                List.of(new Loss("rain", 1.25), new Loss("cable", 0.5)),
                List.of(Modulation.QPSK));
    }

    @Test
    void whatIsLeftFollowsFromTheBudget() {
        OptionalDouble none = OptionalDouble.empty();
        assertEquals(
                50 - 10 * Math.log10(9600) - 1.75,
                link(1e4, 0.2, 9600, OptionalDouble.of(50), none).leftEbn0Db(),
                1e-12);
        assertEquals(6 - 1.75, link(1e4, 0.2, 9600, none, OptionalDouble.of(6)).leftEbn0Db(), 1e-12);
    }

    @Test
    void impossibleValuesAreRefusedByName() {
        OptionalDouble none = OptionalDouble.empty();
        OptionalDouble five = OptionalDouble.of(5);
        refused("link.bandwidthHz", "bandwidthHz is 0.0, must be above 0 Hz", () -> link(0, 0, 1, five, none));
        refused("link.bandwidthHz", "bandwidthHz is NaN, must be above 0 Hz", () -> link(Double.NaN, 0, 1, five, none));
        refused("link.bitRateBps", "bitRateBps is -1.0, must be above 0 bit/s", () -> link(1, 0, -1, five, none));
        refused("link.rollOff", "rollOff is 1.5, must be 0 .. 1", () -> link(1, 1.5, 1, five, none));
        refused(
                "link",
                "link needs exactly one of cOverN0DbHz and availableEbn0Db, found neither",
                () -> link(1, 0, 1, none, none));
        refused(
                "link.availableEbn0Db",
                "link needs exactly one of cOverN0DbHz and availableEbn0Db, found both",
                () -> link(1, 0, 1, five, five));
        refused(
                "link.cOverN0DbHz",
                "cOverN0DbHz is Infinity, must be a number of dB between -400 and 400",
                () -> link(1, 0, 1, OptionalDouble.of(Double.POSITIVE_INFINITY), none));
        refused("link.losses", "loss 'rain' is -1.0 dB, must be 0 .. 200 dB", () -> new Loss("rain", -1));
        refused("payload.bits", "bits is 0, must be 1 .. 1000000", () -> new Payload(0, 0.1));
        for (double fer : new double[] {0, 0.5, 1, Double.NaN, -0.1}) {
            refused(
                    "payload.fer",
                    "target FER is " + fer + ", must be above 0 and below 0.5",
                    () -> new Payload(1, fer));
        }
        refused(
                "candidates",
                "candidates is empty, needs at least one code",
                () -> new Requirement("", "", link(1, 0, 1, five, none), new Payload(1, 0.1), none, none, List.of()));
        refused(
                "latencyS",
                "latencyS is 0.0, must be above 0 s",
                () -> new Requirement(
                        "", "", link(1, 0, 1, five, none), new Payload(1, 0.1), OptionalDouble.of(0), none, List.of()));
    }

    private static void refused(String field, String message, org.junit.jupiter.api.function.Executable action) {
        InvalidRequirementException refused = assertThrows(InvalidRequirementException.class, action);
        assertEquals(message, refused.getMessage());
        assertEquals(field, refused.field());
    }
}

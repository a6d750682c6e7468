package dev.nearlimit.cli.requirement;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.codes.matrix.MatrixFormatException;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.shortlist.requirement.Candidate;
import dev.nearlimit.shortlist.requirement.Requirement;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A requirement file is read whole or refused at the line where it is wrong. */
class RequirementReaderTest {
    private static final String GOOD = """
            name: Test link
            link:
              bandwidthHz: 12500
              rollOff: 0.35
              bitRateBps: 4800
              cOverN0DbHz: 42.5
              losses:
                - { name: rain, db: 0.5 }
              modulations: [bpsk, qpsk]
            payload:
              bits: 320
              fer: 1e-3
            latencyS: 0.25
            decoderBudget:
              operationsPerBit: 1500
            candidates:
              - code: golay:24,12
                decoders: [bounded-distance, maximum-likelihood]
            """;

    @TempDir
    Path folder;

    private Requirement read(String text) throws IOException {
        Path file = folder.resolve("link.yaml");
        Files.writeString(file, text);
        return RequirementReader.read(file);
    }

    @Test
    void everyFieldIsRead() throws IOException {
        Requirement requirement = read(GOOD);
        assertEquals("Test link", requirement.name());
        assertEquals(12500, requirement.link().bandwidthHz());
        assertEquals(0.35, requirement.link().rollOff());
        assertEquals(4800, requirement.link().bitRateBps());
        assertEquals(OptionalDouble.of(42.5), requirement.link().cOverN0DbHz());
        assertEquals(OptionalDouble.empty(), requirement.link().availableEbn0Db());
        assertEquals(0.5, requirement.link().totalLossDb());
        assertEquals(
                List.of(Modulation.BPSK, Modulation.QPSK), requirement.link().modulations());
        assertEquals(320, requirement.payload().bits());
        assertEquals(1e-3, requirement.payload().fer());
        assertEquals(OptionalDouble.of(0.25), requirement.latencyS());
        assertEquals(OptionalDouble.of(1500), requirement.operationsPerBit());
        Candidate candidate = requirement.candidates().get(0);
        assertEquals("golay:24,12", candidate.code().designator());
        assertEquals("golay", candidate.family());
        assertEquals(2, candidate.decoders().size());
    }

    @Test
    void boundsAndLossesMayBeLeftOut() throws IOException {
        Requirement requirement = read(GOOD.replace("latencyS: 0.25\n", "")
                .replace("decoderBudget:\n  operationsPerBit: 1500\n", "")
                .replace("  losses:\n    - { name: rain, db: 0.5 }\n", ""));
        assertTrue(requirement.latencyS().isEmpty()
                && requirement.operationsPerBit().isEmpty());
        assertEquals(0, requirement.link().totalLossDb());
    }

    @Test
    void aFamilyStandsForAllItsListedCodes() throws IOException {
        Requirement requirement = read(GOOD.replace("code: golay:24,12", "family: golay")
                .replace("[bounded-distance, maximum-likelihood]", "bounded-distance"));
        assertEquals(
                List.of("golay:23,12", "golay:24,12"),
                requirement.candidates().stream()
                        .map(each -> each.code().designator())
                        .toList());
    }

    @Test
    void aMatrixIsLookedForBesideTheFile() throws IOException {
        Files.writeString(folder.resolve("h.csv"), "1,1,0,1\n0,1,1,1\n");
        Requirement requirement = read(GOOD.replace("code: golay:24,12", "code: h.csv\n    matrix: parity")
                .replace("[bounded-distance, maximum-likelihood]", "syndrome"));
        Candidate candidate = requirement.candidates().get(0);
        assertEquals("matrix", candidate.family());
        assertEquals(4, candidate.code().n());
        assertEquals(2, candidate.code().k());
    }

    @Test
    void aBadMatrixIsReportedAtItsOwnLine() throws IOException {
        Files.writeString(folder.resolve("h.csv"), "1,1,0,1\n0,1,2,1\n");
        String text = GOOD.replace("code: golay:24,12", "code: h.csv\n    matrix: parity");
        MatrixFormatException refused = assertThrows(MatrixFormatException.class, () -> read(text));
        assertEquals(2, refused.line());
    }

    /** Each row changes one piece of the good file: what is replaced, by what, where the mistake is, and the message. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "name: Test link | '' | 2:1 | field 'name' is missing; found here are link, payload, latencyS, decoderBudget, candidates",
                "bandwidthHz: 12500 | bandwidth: 12500 | 3:3 | field 'link.bandwidthHz' is missing; found here are bandwidth, rollOff, bitRateBps, cOverN0DbHz, losses, modulations",
                "bandwidthHz: 12500 | bandwidthHz: 12500\\n  speed: 3 | 4:3 | unknown field 'link.speed'; known here are bandwidthHz, rollOff, bitRateBps, cOverN0DbHz, availableEbn0Db, losses, modulations",
                "bandwidthHz: 12500 | bandwidthHz: wide | 3:16 | link.bandwidthHz is 'wide', expected a number [Hz]",
                "bandwidthHz: 12500 | bandwidthHz: -1 | 3:16 | bandwidthHz is -1.0, must be above 0 Hz",
                "bandwidthHz: 12500 | bandwidthHz: .nan | 3:16 | link.bandwidthHz is '.nan', expected a number [Hz]",
                "bandwidthHz: 12500 | bandwidthHz: [1, 2] | 3:16 | link.bandwidthHz is a list, expected a single value",
                "bandwidthHz: 12500 | bandwidthHz: | 3:15 | link.bandwidthHz is nothing, expected a single value",
                "rollOff: 0.35 | rollOff: 35 | 4:12 | rollOff is 35.0, must be 0 .. 1",
                "cOverN0DbHz: 42.5 | cOverN0DbHz: loud | 6:16 | link.cOverN0DbHz is 'loud', expected a number [dBHz]",
                "cOverN0DbHz: 42.5 | availableEbn0Db: 1e999 | 6:20 | link.availableEbn0Db is '1e999', expected a number [dB]",
                "cOverN0DbHz: 42.5 | cOverN0DbHz: 42.5\\n  availableEbn0Db: 3 | 7:20 | link needs exactly one of cOverN0DbHz and availableEbn0Db, found both",
                "'  cOverN0DbHz: 42.5\\n' | '' | 3:3 | link needs exactly one of cOverN0DbHz and availableEbn0Db, found neither",
                "db: 0.5 | db: -0.5 | 8:25 | loss 'rain' is -0.5 dB, must be 0 .. 200 dB",
                "db: 0.5 | dB: 0.5 | 8:7 | field 'link.losses[0].db' is missing; found here are name, dB",
                "qpsk] | 8psk] | 9:23 | unknown modulation '8psk'; known are bpsk, qpsk",
                "bits: 320 | bits: 0 | 11:9 | bits is 0, must be 1 .. 1000000",
                "bits: 320 | bits: 3.5 | 11:9 | payload.bits is '3.5', expected a whole number of bits",
                "fer: 1e-3 | fer: 0 | 12:8 | target FER is 0.0, must be above 0 and below 0.5",
                "fer: 1e-3 | fer: 1 | 12:8 | target FER is 1.0, must be above 0 and below 0.5",
                "latencyS: 0.25 | latencyS: 0 | 13:11 | latencyS is 0.0, must be above 0 s",
                "latencyS: 0.25 | latency: 250 ms | 13:1 | unknown field 'latency'; known here are name, description, link, payload, latencyS, decoderBudget, candidates",
                "operationsPerBit: 1500 | operationsPerBit: -3 | 15:21 | operationsPerBit is -3.0, must be above 0 operations per information bit",
                "golay:24,12 | golay:24,11 | 17:11 | ",
                "golay:24,12 | goley:24,12 | 17:11 | ",
                "'code: golay:24,12' | 'family: goley' | 17:13 | unknown family 'goley'; known are repetition, parity-check, hamming, hamming-extended, golay, reed-muller, bch, bch-extended, ldpc-802.11n",
                "'code: golay:24,12' | 'matrix: parity' | 17:5 | a candidate needs exactly one of 'code' and 'family', found neither",
                "'[bounded-distance, maximum-likelihood]' | '[]' | 17:5 | field 'candidates[0].decoders' is missing or empty",
                "'code: golay:24,12' | 'code: ./h.mtx' | 17:11 | ./h.mtx looks like a matrix file: add matrix: generator or matrix: parity",
                "'[bounded-distance,' | '[guess,' | 18:16 | ",
                "'code: golay:24,12' | 'code: ldpc-802.11n:648,1/2' | 18:16 | ",
                "'code: golay:24,12' | 'code: h.mtx\\n    matrix: both' | 18:13 | matrix is 'both', expected generator or parity",
            })
    void aMistakeIsReportedWhereItStands(String from, String to, String place, String message) {
        String text = GOOD.replace(from.replace("\\n", "\n"), to == null ? "" : to.replace("\\n", "\n"));
        InputException refused = assertThrows(InputException.class, () -> read(text));
        assertEquals(place, refused.line() + ":" + refused.column(), refused.getMessage());
        assertTrue(refused.file().endsWith("link.yaml"));
        assertEquals(1, refused.getMessage().lines().count());
        if (message != null) {
            assertEquals(message, refused.getMessage());
        }
    }

    @Test
    void aFieldThatStandsTwiceIsReported() {
        InputException refused =
                assertThrows(InputException.class, () -> read(GOOD.replace("latencyS: 0.25", "name: again")));
        assertEquals("field 'name' stands here again, first on line 1", refused.getMessage());
        assertEquals(13, refused.line());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'' | the file is empty, expected a requirement",
                "'just words' | found 'just words', expected fields such as 'link:'",
                "'- a\n- b' | found a list, expected fields such as 'link:'",
            })
    void whatIsNoRequirementIsRefused(String text, String message) {
        InputException refused = assertThrows(InputException.class, () -> read(text));
        assertEquals(message, refused.getMessage());
    }

    @Test
    void brokenYamlIsReportedWithItsLine() {
        InputException refused =
                assertThrows(InputException.class, () -> read(GOOD.replace("[bpsk, qpsk]", "[bpsk, qpsk")));
        assertTrue(refused.getMessage().startsWith("no valid YAML: "), refused.getMessage());
        assertTrue(refused.line() >= 9, "line " + refused.line());
    }

    @Test
    void aFileThatCannotBeReadIsNamed() {
        InputException absent =
                assertThrows(InputException.class, () -> RequirementReader.read(folder.resolve("absent.yaml")));
        assertEquals("there is no such file", absent.getMessage());
        InputException directory = assertThrows(InputException.class, () -> RequirementReader.read(folder));
        assertEquals("is a folder, expected a requirement file", directory.getMessage());
    }
}

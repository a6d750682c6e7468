package dev.nearlimit.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever a user gets wrong is answered by one line on standard error, exit code 2, and nothing else. */
final class BadInputTest {
    @TempDir
    Path folder;

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "inspect | nearlimit inspect needs CODE",
                "inspect hamming:7,4 --matrix parity | --matrix goes with the path of a matrix file, but 'hamming:7,4' is none",
                "inspect ./none.mtx --matrix parity | ./none.mtx: found no such file, expected a matrix file",
                "inspect ./none.mtx | ./none.mtx: say what the matrix is: --matrix generator or --matrix parity is needed with a path",
                "inspect hamming:7,4 --threads 0 | --threads is 0, must be 1 to 1024",
                "inspect hamming:7,4 --matrix columns | --matrix is 'columns', expected one of generator, parity",
                "codes --family turbo | unknown code family 'turbo'; known are repetition, parity-check, hamming, hamming-extended, golay, reed-muller, bch, bch-extended, ldpc-802.11n",
                "codes --rate 3/4..1/2 | range '3/4..1/2' ends below its start",
                "codes --rate high | 'high' is no ratio; expected a fraction such as 1/2 or a number such as 0.5",
                "codes --length 10..5 | range '10..5' ends below its start",
                "codes --length long | 'long' is no range of lengths; expected such as 100..700",
                "codes --format xml | --format is 'xml', expected one of table, csv, json",
                "codes extra | unknown argument 'extra' (see nearlimit codes --help)",
                "codes --lenght 7 | unknown option '--lenght'; did you mean --length? (see nearlimit codes --help)",
                "codez | unknown command 'codez'; did you mean codes? (see nearlimit --help)",
                "limit | limit needs --rate, or --length and --information",
                "limit --rate 1/2 --rate 1/3 | --rate is given twice",
                "limit --rate | --rate needs a value",
                "limit --rate 1/0 | '1/0' is no ratio; expected a fraction such as 1/2 or a number such as 0.5",
                "limit --rate 1/2 --length 100 --information fifty --fer 0.1 | --information is 'fifty', expected a whole number up to 2147483647",
                "limit --rate 1/2 --fer 0.1 | a finite-length limit needs length, information bits and FER together; the length is missing",
                "limit --rate 1/2 --modulation am | unknown modulation 'am'; known are bpsk, qpsk",
                "limit --rate 1/2 --step 0.5 | --step needs --word, the bits of the quantised LLR, beside it",
                "limit --rate 1/2 --word 4 --step 1 --clip 7 | --step and --clip exclude each other",
                "limit --rate 1/2 --word 4 --rise flat | unknown rise 'flat'; known are mid-tread, mid-rise",
                "limit --rate 1/2 --word 1 | word of a mid-tread quantiser is 1 bits, must be 2..8",
                "limit --rate 1/2 --word 4 --step wide | --step is 'wide', expected a number",
                "limit --rate 1/2 --word 4 --step NaN | step of the quantiser is NaN, must be above 0 and at most 10000",
                "limit --rate 1/2 --word 4 --clip -3 | clip of the quantiser is -3.0, must be above 0 and at most 10000",
                "simulate hamming:7,4 --ebn0 1 | nearlimit simulate needs --decoder",
                "simulate hamming:7,4 --decoder syndrome | channel awgn needs --ebn0",
                "simulate hamming:7,4 --decoder syndrome --channel bsc:0.1 --ebn0 1 | channel bsc:0.1 has a fixed parameter and takes no --ebn0",
                "simulate hamming:7,4 --decoder syndrome --channel bsc:0.7 | crossover probability is 0.7, must be between 0 and 0.5",
                "simulate hamming:7,4 --decoder syndrome --ebn0 loud | Eb/N0 is 'loud'; expected a number in dB with at most six decimals, a list 1,1.5,2 or a range 1:0.5:3",
                "simulate hamming:7,4 --decoder syndrome --ebn0 NaN | Eb/N0 is 'NaN'; expected a number in dB with at most six decimals, a list 1,1.5,2 or a range 1:0.5:3",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1:2 | '1:2' is no range of Eb/N0; expected start:step:end, such as 1:0.5:3",
                "simulate hamming:7,4 --decoder syndrome --ebn0 3:1:2 | range '3:1:2' needs a step above 0 and an end not below its start",
                "simulate hamming:7,4 --decoder syndrome --ebn0 0:0.001:9 | '0:0.001:9' gives more than 1000 values of Eb/N0",
                "simulate hamming:7,4 --decoder syndrome --ebn0 200 | Eb/N0 is 200 dB; expected -100 to 100",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --frames 0 | frames is 0, must be at least 1",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --frames -1 | frames is -1, must be at least 1",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --frame-errors 0 | frame errors is 0, must be at least 1",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --relative-width 0 | relative width is 0.0, must be 0.001 to 4",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --relative-width NaN | relative width is NaN, must be 0.001 to 4",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --relative-width wide | --relative-width is 'wide', expected a number",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --relative-width 0.001 | --relative-width 0.001 takes 15365836 frame errors, which --frames 1000000 can never give",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --time-limit 0s | time limit is '0s'; expected such as 90s, 5m or 2h",
                "simulate hamming:7,4 --decoder min-sum:iterations=0 --ebn0 1 | iterations of min-sum is 0, must be a whole number 1..1000",
                "simulate hamming:7,4 --decoder min-sum:word=9 --ebn0 1 | word of min-sum is 9, must be a whole number 1..8",
                "simulate hamming:7,4 --decoder min-sum:word=1 --ebn0 1 | word of a mid-tread quantiser is 1 bits, must be 2..8",
                "simulate hamming:7,4 --decoder min-sum:word=2 --ebn0 1 | messages of 2 bits reach 1, and offset=1 takes all of them to 0; needs a longer message-word or less of it",
                "simulate hamming:7,4 --decoder min-sum:word=2,scale=6/8 --ebn0 1 | messages of 2 bits reach 1, and scale=6/8 takes all of them to 0; needs a longer message-word or less of it",
                "simulate hamming:7,4 --decoder min-sum:word=6,posterior-word=5 --ebn0 1 | posterior-word of min-sum is 5, must be a whole number 6..15",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --channel awgn:gain=loud | gain is 'loud', must be a number in dB with at most six decimals",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --channel awgn:loss=1 | unknown setting 'loss' of channel awgn; allowed are noise-estimate, gain",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --channel bsc:gain=1 | crossover probability of channel 'bsc:gain=1' is no number",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --sweep word=4..8 | unknown setting 'word' in --sweep; the decoder takes none, the channel noise-estimate, gain",
                "simulate hamming:7,4 --decoder min-sum:iterations=5 --ebn0 1 --sweep iterations=4..8 | iterations is fixed in --decoder and swept as well",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --channel awgn:gain=1 --sweep gain=1..2 | gain is fixed in --channel and swept as well",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep word=8..4 | range '8..4' in sweep 'word=8..4' is empty: needs a step above 0 and an end not below its start",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep word | sweep 'word' names no setting; expected such as word=4..8, step=0.25,0.5 or gain=-2..2:0.5",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep word=4 --sweep word=5 | word is swept twice",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep word=4 --sweep gain=1 --sweep step=1 | --sweep is given 3 times; at most 2 settings can be swept",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep iterations=1..500 --sweep gain=1,2,3 | the sweeps have 1500 combinations, more than 1000; sweep fewer values",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep word=7..9 | word of min-sum is 9, must be a whole number 1..8",
                "simulate hamming:7,4 --decoder min-sum --ebn0 1 --sweep step=0.5 | step needs word=, the bits of the quantised LLR, beside it",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --journal a --no-journal | --journal and --no-journal exclude each other",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --journal ./none/a | ./none/a: the journal's folder does not exist",
                "rare-errors hamming:7,4 --decoder syndrome --sets lightest | nearlimit rare-errors needs --ebn0",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 | nearlimit rare-errors needs --sets",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets ./none | ./none: found no such file, expected a file of sets of positions",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets . | .: is a folder, expected a file of sets of positions",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets weight:2 | hamming:7,4 has no word of weight 2 or less but zero",
                "rare-errors bch:127,64 --decoder bounded-distance --ebn0 5 --sets lightest | bch:127,64 has 2^64 codewords; those of low weight are listed for up to 2^26",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets lightest --shifts 0.5,far | shift is 'far'; expected a list of numbers such as 0.5,0.75,1",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets lightest --shifts 3 | shift is 3.0, must be above 0 and at most 2",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets lightest --channel bsc | channel is bsc, importance sampling is for awgn (on which hard-decision decoders see signs alone)",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 5 --sets lightest --frames 0 | frames is 0, must be at least 1",
                "rare-errors hamming:7,4 --decoder syndrome --ebn0 40 --sets lightest | at Eb/N0 40.0 dB sets of weight 3 cause errors at rates below 1e-130; importance sampling ends there",
                "rare-errors hamming:7,4 --decoder bounded --ebn0 5 --sets lightest | unknown decoder 'bounded'; known are syndrome, bounded-distance, maximum-likelihood, sum-product, min-sum",
                "runs | there is no usual journal; --journal names one",
                "runs --journal ./none | ./none: no such file, a journal was expected",
                "runs --journal . | .: is a folder, a journal file was expected",
                "runs --journal pom.xml | pom.xml: is no journal: the file is not an SQLite database",
                "runs 3f --forget 3f --journal a | ID, --merge and --forget exclude each other",
                "runs 3f 40 | unknown argument '40' (see nearlimit runs --help)",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --time-limit 5 | time limit is '5'; expected such as 90s, 5m or 2h",
            })
    void isRefusedInOneLine(String commandLine, String message) {
        Execution execution = Execution.of(commandLine.split(" +"));
        assertEquals("nearlimit: " + message + "\n", execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("", execution.out());
    }

    /** Messages of other rooms are theirs to word; here it matters that they arrive as one line that names what is wrong. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "inspect bhc:7,4 | unknown code family 'bhc'",
                "inspect bch:7,9 | k is 9",
                "simulate hamming:7,4 --decoder guess --ebn0 1 | unknown decoder 'guess'",
                "simulate hamming:7,4 --decoder min-sum:colour=red --ebn0 1 | colour",
                "simulate ldpc-802.11n:648,1/2 --decoder syndrome --ebn0 1 | syndrome",
                "simulate hamming:7,4 --decoder syndrome --ebn0 1 --channel wire | unknown channel 'wire'",
                "limit --rate 1 | rate",
                "limit --rate 1/2 --length 100 --information 50 --fer 0 | FER",
                "limit --rate 1/2 --length 100 --information 50 --fer 1 | FER",
                "limit --rate 1/2 --length 50 --information 100 --fer 0.1 | 100",
                "limit --rate 1/2 --ber 0.7 | 0.7",
            })
    void ofOtherRoomsIsRefusedInOneLine(String commandLine, String part) {
        Execution execution = Execution.of(commandLine.split(" +"));
        assertTrue(execution.err().startsWith("nearlimit: "), execution.err());
        assertTrue(execution.err().contains(part), execution.err());
        assertEquals(1, execution.err().lines().count(), execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode(), execution.err());
        assertEquals("", execution.out());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "ragged.csv | parity | 1,0,1;0,1 | :2: found 2 entries, expected 3 as in line 1",
                "digits.csv | parity | 1,2,0 | :1:3: found '2', expected 0 or 1, entries separated by commas or semicolons",
                "empty.csv | generator | \"\" | : found an empty file, expected a matrix of 0 and 1",
                "empty.mtx | generator | \"\" | : found an empty file, expected a matrix of 0 and 1",
                "dependent.csv | generator | 1,0,1;1,0,1 | : the generator matrix of FILE has 2 rows but rank 1: its rows are dependent",
                "zero.csv | parity | 1,0;0,1 | : the parity-check matrix of FILE has rank 2 = n, so that it admits only the zero word",
            })
    void matrixFileIsLocated(String name, String role, String content, String message) throws IOException {
        Path file = write(name, content.replace(";", "\n"));
        Execution execution = Execution.of("inspect", file.toString(), "--matrix", role);
        String expected = "nearlimit: " + file + message.replace("FILE", file.toString()) + "\n";
        assertEquals(expected, execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("", execution.out());
    }

    /** The wording is the matrix reader's; the line at which the user has to look must be right. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "%%MatrixMarket matrix cube pattern general;2 2 1;1 1 | 1",
                "%%MatrixMarket matrix coordinate pattern general;2 3 2;1 1;3 1 | 4",
                "%%MatrixMarket matrix coordinate pattern general;2 3 2;1 1;1 4 | 4",
                "%%MatrixMarket matrix coordinate integer general;2 3 2;1 1 1;1 2 7 | 4",
                "%%MatrixMarket matrix coordinate pattern general;2 3 2;1 1;1 1 | 4",
            })
    void matrixMarketErrorsNameTheirLine(String content, int line) throws IOException {
        Path file = write("bad.mtx", content.replace(";", "\n"));
        Execution execution = Execution.of("inspect", file.toString(), "--matrix", "parity", "--format", "json");
        JsonNode error = new ObjectMapper().readTree(execution.err()).get("error");
        assertEquals(file.toString(), error.get("file").asText());
        assertEquals(line, error.get("line").asInt(), execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
    }

    @ParameterizedTest
    @ValueSource(strings = {"--format json", "--format=json", "--format JSON"})
    void jsonIsAnsweredInJson(String format) throws IOException {
        Path file = write("ragged.csv", "1,0\n1\n");
        String[] args = Stream.concat(
                        Stream.of("inspect", file.toString(), "--matrix", "parity"), Arrays.stream(format.split(" ")))
                .toArray(String[]::new);
        Execution execution = Execution.of(args);
        JsonNode error = new ObjectMapper().readTree(execution.err()).get("error");
        assertEquals(
                "found 1 entry, expected 2 as in line 1", error.get("message").asText());
        assertEquals(2, error.get("line").asInt());
        assertTrue(error.get("column").isNull());
        assertEquals(1, execution.err().lines().count());
    }

    @Test
    void argumentsThatCannotBeParsedAreAnsweredInJsonToo() throws IOException {
        Execution execution = Execution.of("limit", "--rat", "1/2", "--format", "json");
        JsonNode error = new ObjectMapper().readTree(execution.err()).get("error");
        assertTrue(error.get("message").asText().startsWith("unknown option '--rat'"), execution.err());
        assertTrue(error.get("file").isNull());
    }

    @Test
    void stackTraceIsPrintedOnlyOnRequest() {
        assertFalse(Execution.of("limit", "--rate", "3").err().contains("\tat "));
        assertTrue(Execution.of("limit", "--rate", "3", "--debug").err().contains("\tat dev.nearlimit"));
    }

    @Test
    void controlCharactersAreSpelledOut() {
        Execution execution = Execution.of("inspect", "bch:7,4\u001b[31m\nnext");
        assertEquals(1, execution.err().lines().count(), execution.err());
        assertFalse(execution.err().contains("\u001b"));
    }

    @Test
    void failedCommandLeavesAnOlderResultAlone() throws IOException {
        Path target = write("result.csv", "older");
        Execution execution = Execution.of("limit", "--rate", "3", "--out", target.toString());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("older", Files.readString(target));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(1, files.count());
        }
    }

    private Path write(String name, String content) throws IOException {
        return Files.writeString(folder.resolve(name), content);
    }
}

package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.structure.QuasiCyclicStructure;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * The twelve quasi-cyclic LDPC codes of IEEE 802.11-2012 Annex F, Tables F-1 to F-3: lengths 648, 1296 and 1944 with
 * lifting sizes 27, 54 and 81, at rates 1/2, 2/3, 3/4 and 5/6. The tables are resources, one file a code.
 */
public final class Ieee80211nLdpcFamily implements CodeFamily {
    private static final int BLOCK_COLUMNS = 24;
    private static final List<Integer> LENGTHS = List.of(648, 1296, 1944);
    private static final List<String> RATES = List.of("1/2", "2/3", "3/4", "5/6");

    @Override
    public String name() {
        return "ldpc-802.11n";
    }

    @Override
    public String form() {
        return "ldpc-802.11n:n,rate";
    }

    @Override
    public String title() {
        return "the LDPC codes of IEEE 802.11, n = 648, 1296, 1944";
    }

    @Override
    public Code build(String parameters) {
        String[] texts = Parameters.texts(this, parameters, 2);
        int n = Parameters.integer(this, parameters, texts[0], "n");
        int length = LENGTHS.indexOf(n);
        if (length < 0) {
            throw Parameters.refuse(this, parameters, "n is " + n + ", expected 648, 1296 or 1944");
        }
        String rate = texts[1];
        if (!RATES.contains(rate)) {
            throw Parameters.refuse(this, parameters, "rate is '" + rate + "', expected 1/2, 2/3, 3/4 or 5/6");
        }
        QuasiCyclicStructure structure = new QuasiCyclicStructure(
                n / BLOCK_COLUMNS, readShifts("ieee80211n/n" + n + "-r" + rate.replace("/", "") + ".csv"));
        return Code.ofParityCheck(
                        "ldpc-802.11n:" + n + "," + rate,
                        "IEEE 802.11-2012 Annex F, Table F-" + (length + 1),
                        structure.parityCheck())
                .withStructure(structure);
    }

    private static int[][] readShifts(String resource) {
        try (InputStream stream = Ieee80211nLdpcFamily.class.getResourceAsStream(resource)) {
            if (stream == null) {
                throw new IllegalStateException("resource " + resource + " is missing");
            }
            List<int[]> rows = new ArrayList<>();
            for (CSVRecord row :
                    CSVParser.parse(new InputStreamReader(stream, StandardCharsets.US_ASCII), CSVFormat.DEFAULT)) {
                rows.add(row.stream().mapToInt(Integer::parseInt).toArray());
            }
            return rows.toArray(int[][]::new);
        } catch (IOException e) {
            throw new UncheckedIOException("cannot read resource " + resource, e);
        }
    }

    @Override
    public List<String> listed() {
        return LENGTHS.stream()
                .flatMap(n -> RATES.stream().map(rate -> name() + ":" + n + "," + rate))
                .toList();
    }
}

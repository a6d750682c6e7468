package dev.nearlimit.cli.shortlist;

import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.shortlist.result.OperatingPoint;
import dev.nearlimit.shortlist.result.SchemeResult;
import dev.nearlimit.shortlist.result.SchemeResult.Operations;
import java.util.stream.Collectors;

/** The ranked table as CSV, a row a scheme, with the digits and units that a spreadsheet wants. */
final class ShortlistCsv {
    private ShortlistCsv() {}

    static CsvText of(OperatingPoint point) {
        CsvText csv = new CsvText(
                "rank",
                "meets",
                "code",
                "decoder",
                "modulation",
                "quantiser",
                "n",
                "k",
                "payloadRate",
                "codewordsPerPayload",
                "neededEbn0Db",
                "neededEbn0DbLow",
                "neededEbn0DbHigh",
                "neededMethod",
                "stage",
                "marginDb",
                "codingGainDb",
                "codingGainDbLow",
                "codingGainDbHigh",
                "gapToShannonDb",
                "gapToModulationLimitDb",
                "gapToHardDecisionLimitDb",
                "gapToFiniteLengthDb",
                "gapToFiniteLengthMethod",
                "uerUpper",
                "latencyS",
                "symbolRateBaud",
                "occupiedBandwidthHz",
                "operationsPerBit",
                "operationsPerBitWorstCase",
                "averageIterations",
                "tiedWithBest",
                "pareto",
                "fails",
                "neededHow",
                "note");
        for (SchemeResult scheme : point.schemes()) {
            Operations operations = scheme.operationsPerBit();
            csv.record(
                    scheme.rank(),
                    scheme.meets(),
                    scheme.code(),
                    scheme.decoder(),
                    scheme.modulation(),
                    scheme.quantiser(),
                    scheme.n(),
                    scheme.k(),
                    scheme.payloadRate(),
                    scheme.codewordsPerPayload(),
                    scheme.neededEbn0Db(),
                    scheme.neededEbn0DbLow(),
                    scheme.neededEbn0DbHigh(),
                    scheme.neededMethod(),
                    scheme.stage(),
                    scheme.marginDb(),
                    scheme.codingGainDb(),
                    scheme.codingGainDbLow(),
                    scheme.codingGainDbHigh(),
                    scheme.gapToShannonDb(),
                    scheme.gapToModulationLimitDb(),
                    scheme.gapToHardDecisionLimitDb(),
                    scheme.gapToFiniteLengthDb(),
                    scheme.gapToFiniteLengthMethod(),
                    scheme.uerUpper(),
                    scheme.latencyS().total(),
                    scheme.symbolRateBaud(),
                    scheme.occupiedBandwidthHz(),
                    operations.total(),
                    operations.worstCase(),
                    scheme.averageIterations(),
                    scheme.tiedWithBest(),
                    scheme.pareto(),
                    fails(scheme),
                    scheme.neededHow(),
                    scheme.note());
        }
        return csv;
    }

    static String fails(SchemeResult scheme) {
        return scheme.fails().stream()
                .map(failure -> failure.demand() + ": " + failure.by())
                .collect(Collectors.joining("; "));
    }
}

package dev.nearlimit.cli.simulate;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.simulation.Histogram;
import java.util.List;

/** A point as columns of CSV and as fields of JSON; names are the same in both and do not change. */
final class PointFields {
    /** Columns of CSV, in the order of {@link #values}. */
    static final List<String> COLUMNS = List.of(
            "ebn0Db",
            "frames",
            "frameErrors",
            "bitErrors",
            "undetectedErrors",
            "fer",
            "ferLow",
            "ferHigh",
            "ber",
            "berLow",
            "berHigh",
            "averageIterations",
            "complete",
            "stoppedBy",
            "detectedErrors",
            "uer",
            "uerHigh",
            "iterationsMedian",
            "iterations99Percent",
            "iterationsMost",
            "bitErrorsPerFailedFrameMean",
            "bitErrorsPerFailedFrameMedian",
            "bitErrorsPerFailedFrame90Percent",
            "bitErrorsPerFailedFrameMost");

    private static final double NEARLY_ALL = 0.99;
    private static final double MANY = 0.9;

    private PointFields() {}

    static List<Object> values(MeasuredPoint point) {
        Histogram iterations = point.outcome().iterations();
        Histogram bitErrors = point.outcome().bitErrors();
        return List.of(
                point.ebn0Db(),
                point.counts().frames(),
                point.counts().frameErrors(),
                point.counts().bitErrors(),
                point.counts().undetectedErrors(),
                point.fer(),
                point.ferInterval().low(),
                point.ferInterval().high(),
                point.ber(),
                point.berInterval().low(),
                point.berInterval().high(),
                point.averageIterations(),
                point.counts().complete(),
                point.stop(),
                point.counts().detectedErrors(),
                point.uer(),
                point.uerHigh(),
                quantile(iterations, 0.5),
                quantile(iterations, NEARLY_ALL),
                quantile(iterations, 1),
                bitErrors.mean(),
                quantile(bitErrors, 0.5),
                quantile(bitErrors, MANY),
                quantile(bitErrors, 1));
    }

    /** As a whole number, or not a number where nothing was counted. */
    private static Object quantile(Histogram histogram, double share) {
        if (histogram.total() == 0) {
            return Double.NaN;
        }
        return histogram.quantile(share);
    }

    static void put(ObjectNode entry, MeasuredPoint point) {
        JsonText.put(entry, "ebn0Db", point.ebn0Db());
        entry.put("frames", point.counts().frames());
        entry.put("frameErrors", point.counts().frameErrors());
        entry.put("bitErrors", point.counts().bitErrors());
        entry.put("undetectedErrors", point.counts().undetectedErrors());
        JsonText.put(entry, "fer", point.fer());
        JsonText.put(entry, "ferLow", point.ferInterval().low());
        JsonText.put(entry, "ferHigh", point.ferInterval().high());
        JsonText.put(entry, "ber", point.ber());
        JsonText.put(entry, "berLow", point.berInterval().low());
        JsonText.put(entry, "berHigh", point.berInterval().high());
        JsonText.put(entry, "averageIterations", point.averageIterations());
        entry.put("complete", point.counts().complete());
        entry.put("stoppedBy", point.stop().toString());
        entry.put("detectedErrors", point.counts().detectedErrors());
        JsonText.put(entry, "uer", point.uer());
        JsonText.put(entry, "uerHigh", point.uerHigh());
        putIterations(entry.putObject("iterations"), point.outcome().iterations());
        putBitErrors(entry.putObject("bitErrorsPerFailedFrame"), point.outcome().bitErrors());
    }

    private static void putIterations(ObjectNode entry, Histogram iterations) {
        putQuantile(entry, "median", iterations, 0.5);
        putQuantile(entry, "percentile99", iterations, NEARLY_ALL);
        putQuantile(entry, "most", iterations, 1);
        ArrayNode bins = entry.putArray("histogram");
        for (int value = 0; value <= iterations.largest(); value++) {
            if (iterations.count(value) > 0) {
                bins.addObject().put("iterations", value).put("frames", iterations.count(value));
            }
        }
    }

    private static void putBitErrors(ObjectNode entry, Histogram bitErrors) {
        JsonText.put(entry, "mean", bitErrors.mean());
        putQuantile(entry, "median", bitErrors, 0.5);
        putQuantile(entry, "percentile90", bitErrors, MANY);
        putQuantile(entry, "most", bitErrors, 1);
        ArrayNode bins = entry.putArray("histogram");
        for (Bin bin : Bin.octaves(bitErrors)) {
            bins.addObject().put("from", bin.low()).put("to", bin.high()).put("frames", bin.frames());
        }
    }

    private static void putQuantile(ObjectNode entry, String field, Histogram histogram, double share) {
        if (histogram.total() == 0) {
            entry.putNull(field);
        } else {
            entry.put(field, histogram.quantile(share));
        }
    }
}

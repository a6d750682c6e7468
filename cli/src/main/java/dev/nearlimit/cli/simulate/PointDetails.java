package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.simulation.Histogram;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/** What lies behind the rates, in words: failures of each kind, how many bits they cost, iterations of frames. */
final class PointDetails {
    private static final double MANY = 0.9;
    private static final double NEARLY_ALL = 0.99;
    private static final int BINS = 20;

    private PointDetails() {}

    /** A paragraph for each point. */
    static String text(List<MeasuredPoint> points) {
        StringBuilder text = new StringBuilder("Failures that the decoder declared (detected) or not, wrong information"
                + " bits of\nfailed frames, iterations of all frames; value:frames\n\n");
        for (MeasuredPoint point : points) {
            if (!Double.isNaN(point.ebn0Db())) {
                text.append(Numbers.trimmed(point.ebn0Db())).append(" dB\n");
            }
            text.append(text(point)).append('\n');
        }
        return text.toString();
    }

    private static PropertyList text(MeasuredPoint point) {
        Histogram bits = point.outcome().bitErrors();
        Histogram iterations = point.outcome().iterations();
        PropertyList list = new PropertyList()
                .add(
                        "  failures",
                        point.counts().detectedErrors() + " detected, "
                                + point.counts().undetectedErrors() + " undetected");
        if (bits.total() > 0) {
            list.add("  wrong bits", summary(bits, MANY)).add("", values(Bin.octaves(bits)));
        }
        if (iterations.total() > 0) {
            list.add("  iterations", summary(iterations, NEARLY_ALL)).add("", values(Bin.equal(iterations, BINS)));
        }
        return list;
    }

    private static String summary(Histogram histogram, double share) {
        return String.format(
                Locale.ROOT,
                "mean %s, median %d, %.0f %% up to %d, all up to %d",
                Numbers.fixed(histogram.mean(), 1),
                histogram.quantile(0.5),
                100 * share,
                histogram.quantile(share),
                histogram.largest());
    }

    private static String values(List<Bin> bins) {
        return bins.stream().map(Bin::toString).collect(Collectors.joining(", "));
    }
}

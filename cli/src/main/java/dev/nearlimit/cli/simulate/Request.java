package dev.nearlimit.cli.simulate;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.simulation.Point;
import java.util.List;
import java.util.Optional;

/**
 * What was asked of a run, whatever the scheme.
 *
 * @param points where to measure
 * @param details whether tables show more than the rates
 */
record Request(List<Point> points, long seed, StoppingChoice stopping, boolean details) {
    /** As {@code until 100 frame errors or 1000000 frames, seed 1}. */
    String eachPoint() {
        return stopping.text() + ", seed " + seed;
    }

    /**
     * Fields of JSON: the seed, when points end, which points were asked for (null for that of a fixed parameter), and
     * whether all of it was done.
     *
     * @param endedBy what ended the run early; empty if it was not
     */
    void put(ObjectNode root, Optional<PointStop> endedBy) {
        root.put("seed", seed);
        root.set("stoppingRule", stopping.json());
        ArrayNode asked = root.putArray("requestedEbn0Db");
        for (Point point : points) {
            if (point.ebn0MicroDb().isPresent()) {
                asked.add(point.ebn0Db());
            } else {
                asked.addNull();
            }
        }
        root.put("complete", endedBy.isEmpty());
        root.put("endedBy", endedBy.map(PointStop::toString).orElse(null));
    }

    /**
     * What to say of a run that was not finished; empty if it was.
     *
     * @param measured the points that were measured, the last of them perhaps in part
     * @param asked how many were asked for
     * @param endedBy what ended the run early; empty if it was not
     */
    static String incompleteness(List<MeasuredPoint> measured, int asked, Optional<PointStop> endedBy) {
        if (endedBy.isEmpty()) {
            return "";
        }
        long finished =
                measured.stream().filter(point -> point.counts().complete()).count();
        return "Incomplete: " + finished + " of " + asked + " points were finished.\n"
                + (endedBy.get() == PointStop.TIME_LIMIT
                        ? "Where the time limit cut in is not reproducible; the counts up to there are.\n"
                        : "");
    }
}

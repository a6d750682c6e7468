package dev.nearlimit.cli.simulate;

import dev.nearlimit.simulation.Point;
import java.util.ArrayList;
import java.util.List;

/** A sweep measured: at each point all combinations, before the next point, so that an early end leaves whole comparisons. */
final class SweepRun {
    private final PointMeter meter;

    SweepRun(PointMeter meter) {
        this.meter = meter;
    }

    /** The points that were measured before the run was ended; the last may lack combinations. */
    List<SweepPoint> measure(SweepGrid grid, List<Point> points) {
        int size = grid.combinations().size();
        List<SweepPoint> measured = new ArrayList<>();
        for (int p = 0; p < points.size() && !meter.ended(); p++) {
            List<MeasuredPoint> here = new ArrayList<>();
            for (int c = 0; c < size && !meter.ended(); c++) {
                Combination combination = grid.combinations().get(c);
                PointMeter.Step step = new PointMeter.Step(p * size + c + 1, points.size() * size);
                meter.measure(combination.scheme(), points.get(p), step, where(grid, combination, points.get(p)))
                        .ifPresent(here::add);
            }
            if (!here.isEmpty()) {
                measured.add(new SweepPoint(points.get(p), here));
            }
        }
        return measured;
    }

    private static String where(SweepGrid grid, Combination combination, Point point) {
        StringBuilder text = new StringBuilder();
        for (int s = 0; s < grid.settings().size(); s++) {
            text.append(grid.settings().get(s))
                    .append('=')
                    .append(combination.values().get(s))
                    .append(' ');
        }
        return text.append(point.ebn0MicroDb().isPresent() ? point.toString() : "")
                .toString()
                .trim();
    }
}

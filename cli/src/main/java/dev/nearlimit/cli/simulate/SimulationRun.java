package dev.nearlimit.cli.simulate;

import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.Scheme;
import java.util.ArrayList;
import java.util.List;

/** One scheme measured at one point after the other. */
final class SimulationRun {
    private final PointMeter meter;

    SimulationRun(PointMeter meter) {
        this.meter = meter;
    }

    /** The points that were measured before the run was ended, all of them if it was not. */
    List<MeasuredPoint> measure(Scheme scheme, List<Point> points) {
        List<MeasuredPoint> measured = new ArrayList<>();
        for (int i = 0; i < points.size() && !meter.ended(); i++) {
            Point point = points.get(i);
            String where = point.ebn0MicroDb().isPresent()
                    ? point.toString()
                    : scheme.channel().designator();
            meter.measure(scheme, point, new PointMeter.Step(i + 1, points.size()), where)
                    .ifPresent(measured::add);
        }
        return measured;
    }
}

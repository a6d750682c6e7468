package dev.nearlimit.cli.command;

import dev.nearlimit.cli.Interruption;
import dev.nearlimit.cli.input.TimeLimit;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import dev.nearlimit.simulation.StoppingRule;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;

/** One scheme measured at one point after the other, until all are finished, time is up or the user has had enough. */
final class SimulationRun {
    private static final double NANOSECONDS = 1e9;

    private final Simulator simulator;
    private final Scheme scheme;
    private final long seed;
    private final StoppingRule rule;
    private final Interruption interruption;

    SimulationRun(Simulator simulator, Scheme scheme, long seed, StoppingRule rule, Interruption interruption) {
        this.simulator = simulator;
        this.scheme = scheme;
        this.seed = seed;
        this.rule = rule;
        this.interruption = interruption;
    }

    /**
     * Measures the points.
     *
     * @param timeLimit for all points together; null for none
     * @param kept whether blocks are kept in a journal that outlives the run
     */
    SimulationReport measure(List<Point> points, TimeLimit timeLimit, boolean kept, Progress progress) {
        long start = System.nanoTime();
        RunControl control = RunControl.none().withCancellation(interruption::requested);
        if (timeLimit != null) {
            control = control.withTimeLimit(timeLimit.duration());
        }
        List<MeasuredPoint> measured = new ArrayList<>();
        for (int i = 0; i < points.size(); i++) {
            PointCounts counts = measure(points, i, control, progress);
            if (counts.frames() > 0) {
                measured.add(MeasuredPoint.of(
                        points.get(i), counts, rule, scheme.code().k()));
            }
            if (!counts.complete()) {
                break;
            }
        }
        double elapsedS = (System.nanoTime() - start) / NANOSECONDS;
        return new SimulationReport(
                scheme,
                seed,
                rule,
                measured,
                points.size(),
                new SimulationReport.Performance(
                        Kernels.name(), simulator.threads(), elapsedS, simulator.blocks(), kept));
    }

    private PointCounts measure(List<Point> points, int index, RunControl control, Progress progress) {
        Point point = points.get(index);
        String where = point.ebn0MicroDb().equals(OptionalLong.empty())
                ? scheme.channel().designator()
                : point + ", " + (index + 1) + " of " + points.size();
        return simulator.run(scheme, point, seed, rule, control.withProgress((frames, frameErrors) -> {
            double ofPoint = Math.max((double) frames / rule.maxFrames(), (double) frameErrors / rule.frameErrors());
            progress.at((index + Math.min(1, ofPoint)) / points.size(), where);
        }));
    }
}

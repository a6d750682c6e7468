package dev.nearlimit.simulation.search;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;

/**
 * A smooth error-rate curve through measured points, near the Eb/N0 at which it meets a target.
 *
 * <p>The model. FER is 1 - exp(-exp(eta)) (complementary log-log: eta is ln FER where FER is small, and exactly ln of the
 * bit error exponent for uncoded frames), and eta is a parabola in Eb/N0 x around the crossing x*: with u = s (x - x*), s
 * the slope there in nats a dB, eta = eta(target) - b u + c u^2 / 2, where b is near 1 and c, the curve's bend, has no
 * unit. Frame errors are binomial.
 *
 * <p>What is assumed of the bend: c is normal with mean {@value #MEAN_BEND} and standard deviation {@value #SPREAD_OF_BEND}
 * before anything is measured. A straight line in log FER has c = 0; a waterfall FER = Q((x - x0)/w) has c = -0.06 at FER
 * 1e-4 and -0.13 at 1e-2; uncoded bits have -1/(Eb/N0), -0.1 to -0.3; at the knee of an error floor c rises to 1.
 *
 * <p>What a parabola misses far from the crossing is treated as noise of the points there: eta at distance u may be off by
 * a normal deviation of standard deviation {@value #MISFIT} |u|^3, so that a point's count weighs as 1 / (1 + I t^2) of
 * what it would, I being its Fisher information on eta and t that deviation (quasi-likelihood with extra-binomial
 * variance: D. A. Williams, "Extra-binomial variation in logistic linear models", Applied Statistics 31, 1982).
 *
 * <p>The estimate maximises the likelihood, and the interval is where twice the logarithm of the profile likelihood of x*
 * lies within {@value #DEVIANCE} of its maximum. The 0.95 quantile of chi-squared with one degree of freedom would be 3.84;
 * but a search stops when its interval has become narrow, which it does first where chance made it so, and counts are
 * small: with 3.84 up to 10 % of the intervals missed. With this value 2 to 5 % do, whatever the curve; the tests hold
 * the coverage to 95 %. At the very knee of an error floor a parabola is too stiff: estimates come out a little high there.
 */
final class WaterfallFit {
    static final double MEAN_BEND = -0.1;
    static final double SPREAD_OF_BEND = 0.3;
    static final double MISFIT = 0.01;
    static final double DEVIANCE = 6.25;

    /** The slope may be anything near what the points say; this keeps a parabola from turning up between them. */
    private static final double SPREAD_OF_SLOPE = 1.0;

    private static final double SLOPE_PRECISION = 1 / (SPREAD_OF_SLOPE * SPREAD_OF_SLOPE);
    private static final double BEND_PRECISION = 1 / (SPREAD_OF_BEND * SPREAD_OF_BEND);
    private static final double LEAST_SLOPE = 0.1;
    private static final double LEAST_ETA = -60;
    private static final double MOST_ETA = 6;
    private static final int RESCALINGS = 12;
    private static final double MOST_MOVE = 2;
    private static final int MOST_STEPS = 50;
    private static final double GAIN = 1e-7;
    private static final double REACH = 8;
    private static final double FIRST_STEP = 1e-3;
    private static final double ACCURACY = 1e-4;

    /** A measured point on the scale of the fit. */
    private record Datum(double u, double frames, double errors, double weight) {}

    private final double targetEta;
    private final List<Datum> data = new ArrayList<>();
    private final double originDb;
    private final double scale;

    /** The best curve: offset of eta at the origin, slope and bend there. */
    private final double[] best = {0, 1, MEAN_BEND};

    private final double bestValue;

    private WaterfallFit(double targetFer, Collection<MeasuredPoint> points, double originDb, double scale) {
        this.targetEta = eta(targetFer);
        this.originDb = originDb;
        this.scale = scale;
        for (MeasuredPoint point : points) {
            double frames = point.counts().frames();
            double errors = point.counts().frameErrors();
            double u = scale * (point.ebn0Db() - originDb);
            double seen = eta((errors + 0.5) / (frames + 1));
            data.add(new Datum(u, frames, errors, weight(u, frames * information(seen))));
        }
        this.bestValue = climb(0, best, false);
    }

    /**
     * Fits a curve.
     *
     * @param points measured points with some frames each
     * @param startDb a first guess of the crossing [dB]
     * @param startSlope a first guess of the slope [nats a dB], above 0
     */
    static WaterfallFit of(double targetFer, Collection<MeasuredPoint> points, double startDb, double startSlope) {
        WaterfallFit fit = new WaterfallFit(targetFer, points, startDb, startSlope);
        // The scale of u is that of the slope at the crossing; a few rounds settle it.
        for (int i = 0; i < RESCALINGS && !fit.settled(); i++) {
            double slope = Math.max(0.5, Math.min(2, fit.best[1] - fit.best[2] * fit.crossing()));
            fit = new WaterfallFit(targetFer, points, fit.crossingDb(), fit.scale * slope);
        }
        return fit;
    }

    private boolean settled() {
        return Math.abs(best[0]) < 1e-3 && Math.abs(best[1] - 1) < 1e-2;
    }

    /** Where the best curve meets the target, by Newton's method; no further from the origin than a nat or so. */
    private double crossing() {
        double u = 0;
        for (int i = 0; i < 20; i++) {
            double value = best[0] - best[1] * u + best[2] * u * u / 2;
            double falls = Math.max(LEAST_SLOPE, best[1] - best[2] * u);
            u = Math.max(-MOST_MOVE, Math.min(MOST_MOVE, u + value / falls));
        }
        return u;
    }

    static double eta(double fer) {
        return Math.log(-Math.log1p(-Math.min(fer, 1 - 1e-9)));
    }

    /** Fisher information on eta of one frame. */
    private static double information(double eta) {
        double hazard = Math.exp(eta);
        return hazard * hazard / Math.expm1(hazard);
    }

    /** How much of a point's count is believed, for a distance and the count's information. */
    private static double weight(double u, double information) {
        double misfit = MISFIT * Math.abs(u * u * u);
        return 1 / (1 + information * misfit * misfit);
    }

    /** Where the curve meets the target [dB]. */
    double crossingDb() {
        return originDb + crossing() / scale;
    }

    /** Slope at the crossing [nats a dB], positive for a falling curve. */
    double slopePerDb() {
        return scale * Math.max(LEAST_SLOPE, best[1] - best[2] * crossing());
    }

    /** Lower end of the 95 % interval of the crossing [dB]; -infinity if nothing bounds it. */
    double lowDb() {
        return originDb + end(-1) / scale;
    }

    /** Upper end [dB]; +infinity if nothing bounds it. */
    double highDb() {
        return originDb + end(1) / scale;
    }

    /**
     * Standard deviation that the crossing would have [dB] if so many frames were added at an Eb/N0.
     *
     * @param ebn0Db where [dB]
     * @param frames how many; 0 for what it has now
     */
    double deviationDb(double ebn0Db, double frames) {
        double at = crossing();
        double vv = 0;
        double vb = 0;
        double vc = 0;
        double bb = SLOPE_PRECISION;
        double bc = 0;
        double cc = BEND_PRECISION;
        for (int i = 0; i <= data.size(); i++) {
            boolean added = i == data.size();
            double u = added ? scale * (ebn0Db - originDb) : data.get(i).u();
            double perFrame = information(value(u, 0, best));
            double weight = added ? weight(u, frames * perFrame) : data.get(i).weight();
            double known = weight * perFrame * (added ? frames : data.get(i).frames());
            double toV = best[1] - best[2] * (u - at);
            double toB = -(u - at);
            double toC = (u - at) * (u - at) / 2;
            vv += known * toV * toV;
            vb += known * toV * toB;
            vc += known * toV * toC;
            bb += known * toB * toB;
            bc += known * toB * toC;
            cc += known * toC * toC;
        }
        double unexplained = vv - (vb * vb * cc - 2 * vb * vc * bc + vc * vc * bb) / (bb * cc - bc * bc);
        return 1 / Math.sqrt(Math.max(unexplained, 1e-12)) / scale;
    }

    /** eta of a curve at u, whose parameters hold at an origin. */
    private double value(double u, double origin, double[] curve) {
        double distance = u - origin;
        double eta = targetEta + curve[0] - curve[1] * distance + curve[2] * distance * distance / 2;
        return Math.max(LEAST_ETA, Math.min(MOST_ETA, eta));
    }

    /** The crossing in one direction at which the likelihood has fallen as far as the interval reaches. */
    private double end(int direction) {
        double[] curve = {0, best[1], best[2]};
        double inside = crossing();
        double outside = inside;
        double step = Math.max(FIRST_STEP, deviationDb(originDb, 0) * scale);
        boolean found = false;
        while (!found && Math.abs(outside) < REACH) {
            inside = outside;
            outside += direction * step;
            found = lies(outside, curve);
        }
        while (found && Math.abs(outside - inside) > ACCURACY) {
            double middle = (inside + outside) / 2;
            if (lies(middle, curve)) {
                outside = middle;
            } else {
                inside = middle;
            }
        }
        return found ? outside : direction * Double.POSITIVE_INFINITY;
    }

    /** Whether a crossing there is ruled out; leaves in {@code curve} the best curve that has it. */
    private boolean lies(double crossing, double[] curve) {
        return 2 * (bestValue - climb(crossing, curve, true)) > DEVIANCE;
    }

    /**
     * Finds the likeliest curve by Newton's method; the logarithm of the likelihood is concave.
     *
     * @param origin where the curve's parameters hold
     * @param curve in: where to begin; out: the likeliest
     * @param fixed whether the curve meets the target at the origin
     * @return its log-likelihood, what is known of the bend beforehand included
     */
    private double climb(double origin, double[] curve, boolean fixed) {
        double value = likelihood(origin, curve);
        double[][] information = new double[3][3];
        double[] score = new double[3];
        for (int i = 0; i < MOST_STEPS; i++) {
            score(origin, curve, score, information);
            double[] step = fixed ? solveLastTwo(information, score) : solve(information, score);
            double length = 1;
            double next;
            double[] moved = new double[3];
            do {
                for (int j = 0; j < 3; j++) {
                    moved[j] = curve[j] + length * step[j];
                }
                moved[1] = Math.max(LEAST_SLOPE, moved[1]);
                next = likelihood(origin, moved);
                length /= 2;
            } while (!(next >= value) && length > 1e-4);
            if (!(next >= value)) {
                break;
            }
            double gain = next - value;
            value = next;
            System.arraycopy(moved, 0, curve, 0, 3);
            if (gain < GAIN) {
                break;
            }
        }
        return value;
    }

    private void score(double origin, double[] curve, double[] score, double[][] information) {
        Arrays.fill(score, 0);
        for (double[] row : information) {
            Arrays.fill(row, 0);
        }
        score[1] = (1 - curve[1]) * SLOPE_PRECISION;
        score[2] = (MEAN_BEND - curve[2]) * BEND_PRECISION;
        information[0][0] = 1e-9;
        information[1][1] = SLOPE_PRECISION;
        information[2][2] = BEND_PRECISION;
        double[] gradient = new double[3];
        for (Datum datum : data) {
            double distance = datum.u() - origin;
            double eta = value(datum.u(), origin, curve);
            double hazard = Math.exp(eta);
            double pull = datum.weight()
                    * (datum.errors() * hazard / Math.expm1(hazard) - (datum.frames() - datum.errors()) * hazard);
            double known = datum.weight() * curvature(datum, hazard);
            gradient[0] = 1;
            gradient[1] = -distance;
            gradient[2] = distance * distance / 2;
            for (int r = 0; r < 3; r++) {
                score[r] += pull * gradient[r];
                for (int c = 0; c < 3; c++) {
                    information[r][c] += known * gradient[r] * gradient[c];
                }
            }
        }
    }

    /** Minus the second derivative of a point's log-likelihood by eta, which is never negative. */
    private static double curvature(Datum datum, double hazard) {
        double right = Math.exp(-hazard);
        double ofErrors =
                hazard < 1e-4 ? hazard / 2 : hazard * right * (hazard - 1 + right) / ((1 - right) * (1 - right));
        return (datum.frames() - datum.errors()) * hazard + datum.errors() * ofErrors;
    }

    private static double[] solveLastTwo(double[][] m, double[] y) {
        double determinant = m[1][1] * m[2][2] - m[1][2] * m[2][1];
        return new double[] {
            0, (y[1] * m[2][2] - y[2] * m[1][2]) / determinant, (y[2] * m[1][1] - y[1] * m[2][1]) / determinant
        };
    }

    /** Eliminates the first unknown, whose pivot is positive as the matrix is positive definite. */
    private static double[] solve(double[][] m, double[] y) {
        double[][] rest = new double[3][3];
        double[] right = new double[3];
        for (int r = 1; r < 3; r++) {
            double factor = m[r][0] / m[0][0];
            right[r] = y[r] - factor * y[0];
            for (int c = 1; c < 3; c++) {
                rest[r][c] = m[r][c] - factor * m[0][c];
            }
        }
        double[] x = solveLastTwo(rest, right);
        x[0] = (y[0] - m[0][1] * x[1] - m[0][2] * x[2]) / m[0][0];
        return x;
    }

    private double likelihood(double origin, double[] curve) {
        double sum = -SLOPE_PRECISION * (curve[1] - 1) * (curve[1] - 1) / 2
                - BEND_PRECISION * (curve[2] - MEAN_BEND) * (curve[2] - MEAN_BEND) / 2;
        for (Datum datum : data) {
            double hazard = Math.exp(value(datum.u(), origin, curve));
            sum += datum.weight()
                    * (datum.errors() * Math.log(-Math.expm1(-hazard)) - (datum.frames() - datum.errors()) * hazard);
        }
        return sum;
    }
}

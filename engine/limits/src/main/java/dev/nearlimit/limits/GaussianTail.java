package dev.nearlimit.limits;

import org.apache.commons.math3.special.Erf;
import org.apache.commons.math3.util.ContinuedFraction;

/**
 * The tail of the standard normal distribution, Q(x) = P(Z &gt; x), with its logarithm and inverse.
 *
 * <p>Up to x = {@value #TAIL_BEGINS} by the complementary error function; beyond, by Laplace's continued fraction for the
 * hazard phi(x)/Q(x) = x + 1/(x + 2/(x + 3/(x + ...))) (Abramowitz and Stegun 26.2.14), which keeps its relative
 * accuracy however far out. Relative error below 1e-12 while the result is a normal double.
 */
public final class GaussianTail {
    private static final double TAIL_BEGINS = 3;
    private static final double LOG_SQRT_TWO_PI = 0.5 * Math.log(2 * Math.PI);
    private static final double LOG_HALF = -Math.log(2);
    private static final double HAZARD_ERROR = 1e-15;
    private static final int MAX_ITERATIONS = 1000;

    private static final ContinuedFraction HAZARD = new ContinuedFraction() {
        @Override
        protected double getA(int n, double x) {
            return x;
        }

        @Override
        protected double getB(int n, double x) {
            return n;
        }
    };

    private GaussianTail() {}

    /** Q(x) for any x; 0 where it is below the least double, from x = 38.6 on. */
    public static double q(double x) {
        notNan(x);
        return x < TAIL_BEGINS ? 0.5 * Erf.erfc(x / Math.sqrt(2)) : Math.exp(logQ(x));
    }

    /** ln Q(x) in nats, also where Q(x) itself is below the least double. */
    public static double logQ(double x) {
        notNan(x);
        if (x < -TAIL_BEGINS) {
            return Math.log1p(-q(-x));
        }
        if (x < TAIL_BEGINS) {
            return Math.log(q(x));
        }
        if (Double.isInfinite(x)) {
            return Double.NEGATIVE_INFINITY;
        }
        return logDensity(x) - Math.log(hazard(x));
    }

    /**
     * The x with Q(x) = p.
     *
     * @param p in (0, 1), subnormal doubles included
     * @throws InvalidLimitException if p is outside (0, 1)
     */
    public static double inverse(double p) {
        Checks.insideUnitInterval(p, "probability");
        return p <= 0.5 ? inverseOfLog(Math.log(p)) : -inverseOfLog(Math.log1p(-p));
    }

    /**
     * The x with ln Q(x) = logP, for probabilities below the least double.
     *
     * @param logP below 0, in nats
     */
    public static double inverseOfLog(double logP) {
        if (!(logP < 0 && Double.isFinite(logP))) {
            throw new InvalidLimitException("log probability is " + logP + ", must be finite and below 0");
        }
        if (logP > LOG_HALF) {
            return -inverseOfLog(Math.log(-Math.expm1(logP)));
        }
        // Newton on ln Q, which is concave and falling: from the right of the root every step stays on the right and
        // closes in. Q(x) <= exp(-x^2/2) puts the start there.
        double x = Math.sqrt(-2 * logP);
        for (int i = 0; i < MAX_ITERATIONS; i++) {
            double next = x + (logQ(x) - logP) / hazard(x);
            if (!(next < x)) {
                return x;
            }
            x = next;
        }
        return x;
    }

    /** phi(x)/Q(x). */
    private static double hazard(double x) {
        return x < TAIL_BEGINS ? Math.exp(logDensity(x)) / q(x) : HAZARD.evaluate(x, HAZARD_ERROR);
    }

    private static double logDensity(double x) {
        return -0.5 * x * x - LOG_SQRT_TWO_PI;
    }

    private static void notNan(double x) {
        if (Double.isNaN(x)) {
            throw new InvalidLimitException("argument of the Gaussian tail is not a number");
        }
    }
}

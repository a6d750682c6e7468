package dev.nearlimit.simulation.importance;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.numerics.functions.Exponential;

/**
 * The mixture of distributions that biased noise is drawn from, and the weights that undo the bias: the balance heuristic
 * of multiple importance sampling (E. Veach, L. Guibas, "Optimally combining sampling techniques for Monte Carlo
 * rendering", SIGGRAPH 1995, section 3.3), under which it does not matter which distribution a frame came from.
 *
 * <p>Let e be the n noise samples of a frame of unit variance, each times the sign that was sent, d_c the shift of
 * distribution c over the noise's standard deviation, S_c its set of weight w_c, T_c the sum of e over S_c and C the
 * number of distributions. The density of e is that of unbiased noise times the mean over c of exp(-d_c T_c - d_c^2 w_c /
 * 2), and a frame's weight is one over that mean. It is formed of logarithms, so that weights of 1e-130 keep their
 * digits, by exactly rounded operations and StrictMath, so that they are the same on every machine.
 */
final class BiasMixture {
    /** Terms are left out whose sum is below this part of the largest. */
    private static final double NEGLIGIBLE = 1e-10;

    private final int[] weights;
    /** By shift: what is added to a noise sample, exactly as the link adds it. */
    private final float[] noiseShifts;

    private final double sigma;
    private final double[] exponents;
    private final double reach;

    /**
     * The mixture at one point. Keeps scratch memory, so each thread makes its own.
     *
     * @param shifts in signal amplitudes
     * @param sigma standard deviation of the noise where the signal is +-1
     */
    BiasMixture(NoiseBias bias, double sigma) {
        this(
                bias.sets().stream().mapToInt(ErrorSet::weight).toArray(),
                bias.shifts().stream().mapToDouble(Double::doubleValue).toArray(),
                sigma);
    }

    BiasMixture(int[] weights, double[] shifts, double sigma) {
        this.weights = weights;
        this.sigma = sigma;
        this.noiseShifts = new float[shifts.length];
        for (int s = 0; s < shifts.length; s++) {
            noiseShifts[s] = (float) (shifts[s] / sigma);
        }
        this.exponents = new double[weights.length * shifts.length];
        this.reach = Math.log(exponents.length / NEGLIGIBLE);
    }

    /** Number of distributions: sets times shifts. */
    int size() {
        return exponents.length;
    }

    /** The set of a distribution. */
    int set(int distribution) {
        return distribution / noiseShifts.length;
    }

    /** What a distribution takes off the noise of unit variance on its set, times the sign that was sent. */
    float noiseShift(int distribution) {
        return noiseShifts[distribution % noiseShifts.length];
    }

    /**
     * How far the noise moved a set's mean towards the wrong side, in signal amplitudes: 1 takes it to 0.
     *
     * @param sum the frame's T of that set
     */
    double lean(int set, double sum) {
        return -sigma * sum / weights[set];
    }

    /**
     * The logarithm of a frame's weight.
     *
     * @param sums T of every set and lane, lane f of set j at 64*j + f
     */
    double logWeight(double[] sums, int lane) {
        double largest = Double.NEGATIVE_INFINITY;
        int c = 0;
        for (int set = 0; set < weights.length; set++) {
            double sum = sums[FrameBatch.softIndex(set, lane)];
            for (float shift : noiseShifts) {
                double exponent = -shift * sum - 0.5 * shift * (double) shift * weights[set];
                exponents[c++] = exponent;
                largest = Math.max(largest, exponent);
            }
        }
        double total = 0;
        for (double exponent : exponents) {
            if (exponent > largest - reach) {
                total += Exponential.of(exponent - largest);
            }
        }
        return StrictMath.log(size()) - largest - StrictMath.log(total);
    }

    /** What no weight exceeds of a frame that leans half way or more to some set. */
    double largestWeightHalfWay() {
        // At lean 1/2, -d T = d w / (2 sigma); more lean means less weight.
        double least = Double.POSITIVE_INFINITY;
        for (int weight : weights) {
            double best = Double.NEGATIVE_INFINITY;
            for (float shift : noiseShifts) {
                best = Math.max(best, 0.5 * shift * weight / sigma - 0.5 * shift * (double) shift * weight);
            }
            least = Math.min(least, best);
        }
        return size() * StrictMath.exp(-least);
    }
}

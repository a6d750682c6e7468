package dev.nearlimit.limits;

import java.util.function.DoubleUnaryOperator;

/**
 * The real AWGN channel with equiprobable antipodal input and unquantised output (BI-AWGN): what BPSK, and each axis of
 * QPSK, can carry when the decoder sees exact log-likelihood ratios.
 *
 * <p>With g = esn0, the energy per real dimension over N0, the LLR given the sent bit is normal with mean 4g and
 * variance 8g, and C = 1 - E log2(1 + exp(-LLR)) (e.g. Richardson and Urbanke, Modern Coding Theory, 2008, chapter 4).
 * The density of the LLR l satisfies p(-l) = exp(-l) p(l); folding the two halves together, with u = l/2,
 *
 * <pre>
 * 1 - C = w integral_0^inf exp(-u^2/4g) (cosh u ln(1 + exp(-2u)) + u exp(-u)) du
 *     C = w integral_0^inf exp(-u^2/4g) (u sinh u - cosh u ln cosh u) du,     w = exp(-g) / (sqrt(pi g) ln 2)
 * </pre>
 *
 * <p>whose integrands are positive and smooth, so that both the capacity at low and the loss at high Es/N0 keep a
 * relative error below 1e-11, far beyond the -20..+20 dB that the tests cover (up to 28 dB, where the loss underflows).
 */
public final class BinaryInputAwgn {
    private static final double LN2 = Math.log(2);
    /** Below this Es/N0 the capacity, above it the loss, is what gets integrated. */
    private static final double FORMS_MEET = 1;
    /** exp(-45) is below the rounding of the integral. */
    private static final double HIGHEST_U = 45;

    private BinaryInputAwgn() {}

    /** Capacity in bits per real dimension, in [0, 1]. */
    public static double capacity(double esn0) {
        Checks.energy(esn0);
        return esn0 < FORMS_MEET ? integrateCapacity(esn0) : 1 - integrateLoss(esn0);
    }

    /** One minus the capacity, in bits, with its relative accuracy kept where it is tiny. */
    static double loss(double esn0) {
        Checks.energy(esn0);
        return esn0 < FORMS_MEET ? 1 - integrateCapacity(esn0) : integrateLoss(esn0);
    }

    /**
     * Channel dispersion V in bits squared per real dimension: the variance of the information density
     * 1 - log2(1 + exp(-LLR)) (Polyanskiy, Poor and Verdu, IEEE Trans. IT 56(5), 2010, section IV).
     */
    public static double dispersion(double esn0) {
        Checks.energy(esn0);
        if (esn0 == 0) {
            return 0;
        }
        if (esn0 < FORMS_MEET) {
            double mean = integrateCapacity(esn0);
            return weighted(esn0, BinaryInputAwgn::densitySquared) / LN2 - mean * mean;
        }
        double mean = integrateLoss(esn0);
        return weighted(esn0, BinaryInputAwgn::lossSquared) / LN2 - mean * mean;
    }

    /** The least Es/N0 (linear, per real dimension) at which the capacity reaches a rate in (0, 1). */
    public static double leastEsn0(double rate) {
        Checks.insideUnitInterval(rate, "rate");
        // Capacity never exceeds that with free input, 1/2 log2(1 + 2g) <= g / ln 2.
        return BinaryCapacity.esn0ForRate(BinaryInputAwgn::capacity, BinaryInputAwgn::loss, 1 / LN2, rate);
    }

    /**
     * The least Eb/N0 in dB at which reliable transmission at a rate is possible with this input.
     *
     * @param rate in (0, 1), bits per real dimension
     */
    public static double leastEbn0Db(double rate) {
        return Decibels.fromLinear(leastEsn0(rate) / rate);
    }

    private static double integrateCapacity(double esn0) {
        return esn0 == 0 ? 0 : weighted(esn0, BinaryInputAwgn::density);
    }

    private static double integrateLoss(double esn0) {
        return weighted(esn0, BinaryInputAwgn::lossDensity);
    }

    /** w times the integral of exp(-u^2/4g) f(u). */
    private static double weighted(double esn0, DoubleUnaryOperator f) {
        // exp(-u^2/4g) cosh u has fallen by exp(-42) at 2g + 13 sqrt(g).
        double upper = Math.min(HIGHEST_U, 2 * esn0 + 13 * Math.sqrt(esn0));
        double integral = PanelQuadrature.integrate(u -> Math.exp(-u * u / (4 * esn0)) * f.applyAsDouble(u), upper);
        return Math.exp(-esn0) / (Math.sqrt(Math.PI * esn0) * LN2) * integral;
    }

    private static double density(double u) {
        return u * Math.sinh(u) - Math.cosh(u) * logCosh(u);
    }

    private static double densitySquared(double u) {
        double q = logCosh(u);
        return Math.cosh(u) * (u * u + q * q) - 2 * u * q * Math.sinh(u);
    }

    private static double lossDensity(double u) {
        return Math.cosh(u) * Math.log1p(Math.exp(-2 * u)) + u * Math.exp(-u);
    }

    private static double lossSquared(double u) {
        double right = Math.log1p(Math.exp(-2 * u));
        double wrong = 2 * u + right;
        return 0.5 * (Math.exp(u) * right * right + Math.exp(-u) * wrong * wrong);
    }

    private static double logCosh(double u) {
        double s = Math.sinh(0.5 * u);
        return Math.log1p(2 * s * s);
    }
}

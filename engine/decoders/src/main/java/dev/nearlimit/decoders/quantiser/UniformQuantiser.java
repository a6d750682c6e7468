package dev.nearlimit.decoders.quantiser;

import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.setting.SettingReader;
import dev.nearlimit.numerics.kernels.Kernels;

/**
 * A uniform quantiser of b bits, rounding half away from zero. All operations are in single precision, each exactly
 * rounded: y = |x / step|, then
 *
 * <ul>
 *   <li>mid-tread: y is limited to 2^(b-1)-1 and its whole part raised by 1 where the rest, which is exact, is at least
 *       1/2; the level is that integer with the sign of x;
 *   <li>mid-rise: y is limited to 2^(b-1)-1 and i is its whole part; the level is the odd integer 2i+1 with the sign of
 *       x (plus for 0), counted in half steps. A value on a threshold other than 0 goes to the outer side.
 * </ul>
 *
 * The value that a level stands for is level * step, or level * (step * 0.5f).
 *
 * @param wordBits b: 2 .. 8 for mid-tread, 1 .. 7 for mid-rise, whose levels in half steps take b + 1 bits of the byte
 * @param step distance of neighbouring levels in LLR units, above 0
 * @param rise where the levels are
 */
public record UniformQuantiser(int wordBits, float step, Rise rise) implements Quantiser {
    public UniformQuantiser {
        int least = rise == Rise.MID_TREAD ? 2 : 1;
        int most = rise == Rise.MID_TREAD ? 8 : 7;
        if (wordBits < least || wordBits > most) {
            throw new InvalidDecoderException(
                    "word of a " + rise + " quantiser is " + wordBits + " bits, must be " + least + ".." + most);
        }
        if (!(step > 0 && step < Float.POSITIVE_INFINITY)) {
            throw new InvalidDecoderException("step of the quantiser is " + step + ", must be above 0");
        }
    }

    /**
     * The step that holds when the user gives none: 16 / 2^b, so that the levels span LLRs of about -8 .. 8. Near the
     * waterfall of codes of rates 1/2 to 5/6 with BPSK or QPSK the LLRs have a mean of 2 to 8 and a variance of twice
     * the mean: a much wider span wastes levels on values that decide alike, a much narrower one clips those that tell
     * sure bits from doubtful ones. A scheme far from that should state its own step.
     */
    public static float standardStep(int wordBits) {
        return 16f / (1 << wordBits);
    }

    /**
     * A quantiser by the value of its outermost level instead of its step.
     *
     * @param clip magnitude of the outermost level, LLR units; step is clip / (2^(b-1)-1), or 2 clip / (2^b-1) for
     *     mid-rise, in single precision
     */
    public static UniformQuantiser ofClip(int wordBits, float clip, Rise rise) {
        return new UniformQuantiser(
                wordBits,
                rise == Rise.MID_TREAD ? clip / ((1 << (wordBits - 1)) - 1) : 2 * clip / ((1 << wordBits) - 1),
                rise);
    }

    @Override
    public String designator() {
        return "uniform:word=" + wordBits + ",step=" + SettingReader.plain(step) + ",rise=" + rise;
    }

    @Override
    public int largestLevel() {
        return rise == Rise.MID_TREAD ? (1 << (wordBits - 1)) - 1 : (1 << wordBits) - 1;
    }

    @Override
    public void apply(float[] values, int at, int count, byte[] levels, int levelsAt) {
        int rail = (1 << (wordBits - 1)) - 1;
        if (rise == Rise.MID_TREAD) {
            Kernels.reception().midTread(values, at, count, step, rail, levels, levelsAt);
        } else {
            Kernels.reception().midRise(values, at, count, step, rail, levels, levelsAt);
        }
    }
}

package dev.nearlimit.decoders.quantiser;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UniformQuantiserTest {
    private static LlrBatch quantised(UniformQuantiser quantiser, float... values) {
        LlrBatch batch = new LlrBatch(1 + values.length / 64);
        System.arraycopy(values, 0, batch.values(), 0, values.length);
        quantiser.apply(batch);
        return batch;
    }

    @ParameterizedTest
    @CsvSource({
        // 3 bits, mid-tread, step 2: levels -3 .. 3, thresholds at odd values, ties away from zero.
        "mid-tread,3,2, 0.99,0",
        "mid-tread,3,2, 1,1",
        "mid-tread,3,2, -1,-1",
        "mid-tread,3,2, -0.99,0",
        "mid-tread,3,2, 3,2",
        "mid-tread,3,2, 4.99,2",
        "mid-tread,3,2, 5,3",
        "mid-tread,3,2, 1e30,3",
        "mid-tread,3,2, -1e30,-3",
        "mid-tread,3,2, Infinity,3",
        "mid-tread,3,2, -Infinity,-3",
        "mid-tread,3,2, -0.0,0",
        "mid-tread,8,0.25, 31.7,127",
        "mid-tread,8,0.25, -99,-127",
        // 2 bits, mid-rise, step 2: values -3, -1, 1, 3 as odd half steps, thresholds at -2, 0, 2.
        "mid-rise,2,2, 0,1",
        "mid-rise,2,2, -0.0,1",
        "mid-rise,2,2, -1e-9,-1",
        "mid-rise,2,2, 1.99,1",
        "mid-rise,2,2, 2,3",
        "mid-rise,2,2, -2,-3",
        "mid-rise,2,2, -1.99,-1",
        "mid-rise,2,2, 77,3",
        // One bit is the sign.
        "mid-rise,1,8, 0.1,1",
        "mid-rise,1,8, -0.1,-1",
        "mid-rise,1,8, 500,1",
        "mid-rise,7,0.25, 1000,127"
    })
    void levelsRailsAndTies(String rise, int word, float step, float value, int level) {
        UniformQuantiser quantiser =
                new UniformQuantiser(word, step, rise.equals("mid-rise") ? Rise.MID_RISE : Rise.MID_TREAD);
        LlrBatch batch = quantised(quantiser, value);
        assertEquals(level, batch.levels()[0]);
        float stands = rise.equals("mid-rise") ? level * step / 2 : level * step;
        assertEquals(stands, batch.values()[0]);
    }

    /** Half away from zero by decimal arithmetic, which rounds exactly, on the single-precision quotient. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void midTreadRoundsAsDecimalArithmeticDoes(long seed) {
        Random random = new Random(seed);
        int word = 2 + random.nextInt(7);
        float step = 0.1f + random.nextFloat();
        UniformQuantiser quantiser = new UniformQuantiser(word, step, Rise.MID_TREAD);
        int rail = (1 << (word - 1)) - 1;
        float[] values = new float[6400];
        for (int i = 0; i < values.length; i++) {
            float onThreshold = (random.nextInt(2 * rail + 3) - rail - 1.5f) * step;
            values[i] = switch (i % 4) {
                case 0 -> onThreshold;
                case 1 -> Math.nextUp(onThreshold);
                case 2 -> Math.nextDown(onThreshold);
                default -> (float) random.nextGaussian() * rail * step;
            };
        }
        LlrBatch batch = quantised(quantiser, values);
        for (int i = 0; i < values.length; i++) {
            int rounded = new BigDecimal(values[i] / step)
                    .setScale(0, RoundingMode.HALF_UP)
                    .intValueExact();
            int expected = Math.max(-rail, Math.min(rail, rounded));
            assertEquals(expected, batch.levels()[i], "seed " + seed + " value " + values[i] + " step " + step);
        }
    }

    /** Just below half a step must not be lifted over it by adding a half. */
    @Test
    void theGreatestNumberBelowAHalfRoundsDown() {
        LlrBatch batch =
                quantised(new UniformQuantiser(4, 1f, Rise.MID_TREAD), Math.nextDown(0.5f), 0.5f, -Math.nextDown(0.5f));
        assertArrayEquals(new byte[] {0, 1, 0}, java.util.Arrays.copyOf(batch.levels(), 3));
    }

    @Test
    void clipIsTheOutermostValue() {
        assertEquals(0.25f, UniformQuantiser.ofClip(6, 7.75f, Rise.MID_TREAD).step());
        assertEquals(
                7.75f,
                quantised(UniformQuantiser.ofClip(6, 7.75f, Rise.MID_TREAD), 50f)
                        .values()[0]);
        assertEquals(
                3f,
                quantised(UniformQuantiser.ofClip(2, 3f, Rise.MID_RISE), 50f).values()[0]);
    }

    @ParameterizedTest
    @CsvSource({
        "none",
        "'uniform:word=6,step=0.25,rise=mid-tread'",
        "'uniform:word=1,step=8,rise=mid-rise'",
        "'uniform:word=5,step=0.37,rise=mid-rise'"
    })
    void designatorsAreReadBack(String designator) {
        assertEquals(designator, QuantiserDesignator.parse(designator).designator());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "linear:word=3 | unknown quantiser 'linear:word=3'; known are none, uniform:word=b,step=s,rise=r",
                "uniform:step=1 | quantiser 'uniform:step=1' lacks word=",
                "uniform:word=4,width=3 | unknown setting 'width' of uniform quantiser; allowed are word, step, clip, rise",
            })
    void wrongDesignatorsAreRefused(String designator, String message) {
        assertEquals(
                message,
                assertThrows(InvalidDecoderException.class, () -> QuantiserDesignator.parse(designator))
                        .getMessage());
    }
}

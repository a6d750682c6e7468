package dev.nearlimit.codes.crc;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.codes.field.BinaryPolynomial;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Random;
import java.util.function.Supplier;
import java.util.stream.LongStream;
import java.util.zip.CRC32;
import java.util.zip.CRC32C;
import java.util.zip.Checksum;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class BatchCrcTest {
    /** IEEE 802.3 clause 3.2.9: the frame check sequence. */
    private static final CrcDefinition IEEE_802_3 =
            new CrcDefinition("IEEE 802.3", BinaryPolynomial.of(0x104C11DB7L), 0xFFFFFFFFL, true, 0xFFFFFFFFL);

    /** IETF RFC 3720 section 12.1: CRC32C with polynomial 0x11EDC6F41. */
    private static final CrcDefinition CASTAGNOLI =
            new CrcDefinition("CRC32C", BinaryPolynomial.of(0x11EDC6F41L), 0xFFFFFFFFL, true, 0xFFFFFFFFL);

    static LongStream seeds() {
        return LongStream.range(1, 21);
    }

    /** A batch of frames given as octets, the highest bit of each at the first of its eight positions. */
    private static long[] batch(byte[][] frames, int room) {
        int octets = frames[0].length;
        long[] bits = new long[8 * octets + room];
        for (int f = 0; f < frames.length; f++) {
            for (int i = 0; i < 8 * octets; i++) {
                bits[i] |= (frames[f][i / 8] >> (7 - i % 8) & 1L) << f;
            }
        }
        return bits;
    }

    /** The JDK's implementations work on octets with tables or instructions: independent of everything here. */
    @ParameterizedTest
    @MethodSource("seeds")
    void agreesWithTheJdkInEveryLane(long seed) {
        assertAgrees(IEEE_802_3, CRC32::new, seed);
        assertAgrees(CASTAGNOLI, CRC32C::new, seed);
    }

    private static void assertAgrees(CrcDefinition definition, Supplier<Checksum> judge, long seed) {
        Random random = new Random(seed);
        byte[][] frames = new byte[64][random.nextInt(70)];
        for (byte[] frame : frames) {
            random.nextBytes(frame);
        }
        int messageBits = 8 * frames[0].length;
        long[] bits = batch(frames, 32);
        BatchCrc crc = new BatchCrc(definition);
        crc.append(bits, messageBits);
        for (int f = 0; f < 64; f++) {
            Checksum checksum = judge.get();
            checksum.update(frames[f], 0, frames[f].length);
            assertEquals(checksum.getValue(), crc.valueOf(bits, messageBits, f), "seed " + seed + " frame " + f);
        }
    }

    /**
     * Check values of the octets "123456789", common practice in the trade, from memory: CRC-32 and CRC32C as the JDK gives
     * them; the plain remainder of x^16 + x^12 + x^5 + 1 (0x31C3), the same from a register of ones (0x29B1), and the one
     * of ITU-T X.25, reflected and complemented (0x906E); the 24-bit check of IETF RFC 4880 section 6.1 with its initial
     * register 0xB704CE (0x21CF02); TS 38.212 CRC24A (0xCDE703) and CRC24B (0x23EF52).
     */
    @ParameterizedTest
    @CsvSource({
        "104C11DB7,FFFFFFFF,true,FFFFFFFF,CBF43926",
        "11EDC6F41,FFFFFFFF,true,FFFFFFFF,E3069283",
        "11021,0,false,0,31C3",
        "11021,FFFF,false,0,29B1",
        "11021,FFFF,true,FFFF,906E",
        "1864CFB,B704CE,false,0,21CF02",
        "1864CFB,0,false,0,CDE703",
        "1800063,0,false,0,23EF52",
    })
    void publishedCheckValues(String polynomial, String initial, boolean reflected, String finalXor, String check) {
        CrcDefinition definition = new CrcDefinition(
                "published",
                BinaryPolynomial.of(Long.parseLong(polynomial, 16)),
                Long.parseLong(initial, 16),
                reflected,
                Long.parseLong(finalXor, 16));
        byte[] octets = "123456789".getBytes(StandardCharsets.US_ASCII);
        long[] bits = batch(new byte[][] {octets}, definition.bits());
        BatchCrc crc = new BatchCrc(definition);
        crc.append(bits, 72);
        assertEquals(check, String.format("%X", crc.valueOf(bits, 72, 0)));
    }

    /** TS 38.212 clause 5.1 says it so: message and check together, as a polynomial, are divisible by the generator. */
    @ParameterizedTest
    @EnumSource(Ts38212Crc.class)
    void messageWithCheckIsAMultipleOfTheGenerator(Ts38212Crc standard) {
        CrcDefinition definition = standard.definition();
        for (long seed = 1; seed <= 5; seed++) {
            Random random = new Random(seed);
            int messageBits = random.nextInt(150);
            long[] bits = Arrays.copyOf(random.longs(messageBits).toArray(), messageBits + definition.bits());
            new BatchCrc(definition).append(bits, messageBits);
            for (int f = 0; f < 64; f++) {
                int frame = f;
                int[] powers = java.util.stream.IntStream.range(0, bits.length)
                        .filter(i -> (bits[i] >>> frame & 1) != 0)
                        .map(i -> bits.length - 1 - i)
                        .toArray();
                assertEquals(
                        BinaryPolynomial.zero(),
                        BinaryPolynomial.ofExponents(powers).remainder(definition.generator()),
                        standard + " seed " + seed + " frame " + f);
            }
        }
    }

    /** The polynomials in hexadecimal, as TS 38.212 is usually implemented (common practice). */
    @ParameterizedTest
    @CsvSource({
        "CRC24A,1864CFB",
        "CRC24B,1800063",
        "CRC24C,1B2B117",
        "CRC16,11021",
        "CRC11,E21",
        "CRC6,61",
    })
    void polynomialsOfTheStandard(Ts38212Crc standard, String hexadecimal) {
        assertEquals(
                BinaryPolynomial.of(Long.parseLong(hexadecimal, 16)),
                standard.definition().generator());
    }

    /** Degrees up to the 64 that a register may have, generators of two terms and of all. */
    @ParameterizedTest
    @MethodSource("seeds")
    void appendedChecksHoldAndEveryBurstUpToTheirLengthIsFound(long seed) {
        Random random = new Random(seed);
        int r = seed == 1 ? 1 : seed == 2 ? 64 : 1 + random.nextInt(64);
        long middle = seed == 3 ? 0 : seed == 4 ? -1 : random.nextLong();
        BinaryPolynomial generator = BinaryPolynomial.ofExponents(r)
                .add(BinaryPolynomial.of((r == 64 ? middle : middle & (1L << r) - 1) | 1));
        long mask = -1L >>> (64 - r);
        boolean reflected = r % 8 == 0 && random.nextBoolean();
        CrcDefinition definition =
                new CrcDefinition("random", generator, random.nextLong() & mask, reflected, random.nextLong() & mask);
        BatchCrc crc = new BatchCrc(definition);
        int messageBits = 8 * random.nextInt(12);
        long[] sent = Arrays.copyOf(random.longs(messageBits).toArray(), messageBits + r + 1);
        sent[messageBits + r] = 42;
        crc.append(sent, messageBits);
        assertEquals(0, crc.failedLanes(sent, messageBits), "seed " + seed);
        assertEquals(42, sent[messageBits + r], "guard word, seed " + seed);
        if (reflected) {
            return;
        }
        // One burst a lane, of at most r positions: no multiple of the generator fits in so few.
        long[] received = sent.clone();
        long hit = 0;
        for (int f = 0; f < 64; f += 3) {
            int start = random.nextInt(messageBits + r);
            received[start] ^= 1L << f;
            for (int i = start + 1; i < Math.min(start + r, messageBits + r); i++) {
                received[i] ^= (random.nextLong() & 1) << f;
            }
            hit |= 1L << f;
        }
        assertEquals(hit, crc.failedLanes(received, messageBits), "seed " + seed);
    }

    @Test
    void anEmptyMessageHasTheInitialRegisterAsCheck() {
        CrcDefinition definition = new CrcDefinition("initial", BinaryPolynomial.of(0x13), 0xA, false, 0x3);
        long[] bits = new long[4];
        BatchCrc crc = new BatchCrc(definition);
        crc.append(bits, 0);
        assertArrayEquals(new long[] {-1, 0, 0, -1}, bits);
        assertEquals(0xA ^ 0x3, crc.valueOf(bits, 0, 63));
        assertNotEquals(0, crc.failedLanes(new long[4], 0));
    }

    @Test
    void unusableDefinitionsAndShortBuffersAreRefused() {
        assertThrows(
                IllegalArgumentException.class,
                () -> CrcDefinition.plain("no constant term", BinaryPolynomial.of(0x12)));
        assertThrows(IllegalArgumentException.class, () -> CrcDefinition.plain("degree 0", BinaryPolynomial.one()));
        assertThrows(
                IllegalArgumentException.class,
                () -> CrcDefinition.plain("degree 65", BinaryPolynomial.ofExponents(65, 0)));
        assertThrows(
                IllegalArgumentException.class,
                () -> new CrcDefinition("five bits", BinaryPolynomial.of(0x13), 0x10, false, 0));
        assertThrows(
                IllegalArgumentException.class,
                () -> new CrcDefinition("no octets", BinaryPolynomial.of(0x13), 0, true, 0));
        BatchCrc crc = new BatchCrc(IEEE_802_3);
        assertThrows(IndexOutOfBoundsException.class, () -> crc.append(new long[39], 8));
        assertThrows(IndexOutOfBoundsException.class, () -> crc.failedLanes(new long[39], 8));
        assertThrows(IllegalArgumentException.class, () -> crc.append(new long[64], 9));
    }
}

package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BlockTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void comesBackFromBytes(long seed) {
        Block block = Blocks.random(new SplittableRandom(seed), 64 * (int) seed);
        Block back = Block.fromBytes(block.toBytes());
        assertEquals(block.frames(), back.frames(), "seed " + seed);
        assertArrayEquals(block.failed(), back.failed(), "seed " + seed);
        assertArrayEquals(block.bitErrors(), back.bitErrors(), "seed " + seed);
        assertArrayEquals(block.undetected(), back.undetected(), "seed " + seed);
        assertArrayEquals(block.iterations(), back.iterations(), "seed " + seed);
    }

    @Test
    void frameWithoutErrorsTakesFewBytes() {
        assertTrue(new Block(65536, new int[0], new int[0], new boolean[0], new int[0]).toBytes().length < 8);
        int[] same = new int[65536];
        Arrays.fill(same, 20);
        assertTrue(new Block(65536, new int[0], new int[0], new boolean[0], same).toBytes().length < 16);
    }

    /** Any cut, and any byte appended, is noticed; nothing but our own exception gets out. */
    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13})
    void damageIsReported(long seed) {
        byte[] bytes = Blocks.random(new SplittableRandom(seed), 128).toBytes();
        for (int length = 0; length < bytes.length; length++) {
            byte[] cut = Arrays.copyOf(bytes, length);
            assertThrows(InvalidSimulationException.class, () -> Block.fromBytes(cut), "seed " + seed);
        }
        byte[] longer = Arrays.copyOf(bytes, bytes.length + 1);
        assertThrows(InvalidSimulationException.class, () -> Block.fromBytes(longer), "seed " + seed);
        byte[] other = bytes.clone();
        other[0] = 9;
        InvalidSimulationException thrown =
                assertThrows(InvalidSimulationException.class, () -> Block.fromBytes(other));
        assertEquals("a block kept in the journal is damaged: format 9, expected 1", thrown.getMessage());
    }
}

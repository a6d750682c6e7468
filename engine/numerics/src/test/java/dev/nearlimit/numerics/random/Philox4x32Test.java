package dev.nearlimit.numerics.random;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;

import org.junit.jupiter.api.Test;

/** Known answers of philox4x32 with 10 rounds: the file kat_vectors that its authors publish with Random123 (SC 2011). */
class Philox4x32Test {
    @Test
    void answersAsPublished() {
        check(new int[] {0, 0, 0, 0}, new int[] {0, 0}, new int[] {0x6627e8d5, 0xe169c58d, 0xbc57ac4c, 0x9b00dbd8});
        check(new int[] {-1, -1, -1, -1}, new int[] {-1, -1}, new int[] {0x408f276d, 0x41c83b0e, 0xa20bc7c6, 0x6d5451fd
        });
        check(
                new int[] {0x243f6a88, 0x85a308d3, 0x13198a2e, 0x03707344},
                new int[] {0xa4093822, 0x299f31d0},
                new int[] {0xd16cfe09, 0x94fdcceb, 0x5001e420, 0x24126ea1});
    }

    private static void check(int[] counter, int[] key, int[] expected) {
        int[] image = new int[4];
        Philox4x32.block(counter[0], counter[1], counter[2], counter[3], key[0], key[1], image);
        assertArrayEquals(expected, image);
    }
}

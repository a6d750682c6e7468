package dev.nearlimit.codes.encoding;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class WordProgramTest {
    @Test
    void stepsRunInOrderAndMayReadTheirOwnTarget() {
        WordProgram program = new WordProgram.Builder()
                .set(2)
                .add(0, 1)
                .set(2)
                .add(2)
                .add(3)
                .set(0)
                .add()
                .set(3)
                .add(2, 0)
                .build();
        long[] words = {0b0011, 0b0101, -1, 0b1000, 77};
        program.run(words);
        assertArrayEquals(new long[] {0, 0b0101, 0b1110, 0b1110, 77}, words);
        assertEquals(4, program.steps());
        assertEquals(6, program.wordOperations());
        assertEquals(4, program.wordsNeeded());
    }

    @Test
    void longProgramsOutgrowTheirFirstArrays() {
        WordProgram.Builder builder = new WordProgram.Builder();
        int steps = 1000;
        for (int i = 1; i <= steps; i++) {
            builder.set(i).add(i - 1).add(new int[2 * i]);
        }
        // Word 0 named an even number of times adds nothing, so that word 0 is handed down unchanged.
        long[] words = new long[steps + 1];
        words[0] = 0x5A;
        builder.build().run(words);
        assertEquals(0x5A, words[steps]);
    }

    @Test
    void shortBuffersAreRefusedBeforeAnythingIsWritten() {
        WordProgram program =
                new WordProgram.Builder().set(0).add(1).set(4).add(0).build();
        long[] words = {1, 2, 3, 4};
        assertThrows(IllegalArgumentException.class, () -> program.run(words));
        assertArrayEquals(new long[] {1, 2, 3, 4}, words);
    }
}

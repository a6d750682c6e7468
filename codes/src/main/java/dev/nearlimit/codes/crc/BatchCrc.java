package dev.nearlimit.codes.crc;

import dev.nearlimit.codes.batch.FrameBatch;
import java.util.Objects;

/**
 * A cyclic redundancy check of 64 frames at once. The shift register of the division is r words, bit f of each belonging
 * to frame f; a message bit costs one XOR a term of the generator. Instead of shifting the words along, the place at which
 * the register begins moves round, so that nothing is copied.
 *
 * <p>Keeps its register between the steps of a call: one instance a thread. Calls allocate nothing.
 */
public final class BatchCrc {
    private final CrcDefinition definition;
    private final int r;
    private final int terms;
    /** For each place of the register's lowest power, where the generator's powers 1 .. r-1 stand, one after another. */
    private final int[] placeOfTerm;

    private final long[] register;

    public BatchCrc(CrcDefinition definition) {
        this.definition = definition;
        this.r = definition.bits();
        this.terms = definition.generator().weight() - 2;
        this.placeOfTerm = new int[r * terms];
        this.register = new long[r];
        int next = 0;
        for (int lowest = 0; lowest < r; lowest++) {
            for (int power = 1; power < r; power++) {
                if (definition.generator().coefficient(power)) {
                    placeOfTerm[next++] = (lowest + power) % r;
                }
            }
        }
    }

    public CrcDefinition definition() {
        return definition;
    }

    /**
     * Computes the check of a message and writes it behind the message.
     *
     * @param bits message in the first {@code messageBits} words, bit f of each belonging to frame f; the next r words
     *     receive the check, highest power first, or as octets whose bits are reflected like the message's
     * @param messageBits length of the message, at least 0; whole octets where the check is reflected
     */
    public void append(long[] bits, int messageBits) {
        requireRoom(bits, messageBits);
        int lowest = divide(bits, messageBits);
        for (int position = 0; position < r; position++) {
            bits[messageBits + position] = checkBit(lowest, position);
        }
    }

    /**
     * Finds the frames whose check does not fit their message.
     *
     * @param bits message and check as {@link #append} leaves them
     * @return a mask, bit f being 1 if the check of frame f fails
     */
    public long failedLanes(long[] bits, int messageBits) {
        requireRoom(bits, messageBits);
        int lowest = divide(bits, messageBits);
        long failed = 0;
        for (int position = 0; position < r; position++) {
            failed |= bits[messageBits + position] ^ checkBit(lowest, position);
        }
        return failed;
    }

    private void requireRoom(long[] bits, int messageBits) {
        if (definition.reflected() && (messageBits & 7) != 0) {
            throw new IllegalArgumentException(definition.name() + " takes whole octets, got " + messageBits + " bits");
        }
        Objects.checkFromIndexSize(0, messageBits, bits.length);
        Objects.checkFromIndexSize(messageBits, r, bits.length);
    }

    /** Divides and returns the place at which the remainder's lowest power stands. */
    private int divide(long[] bits, int messageBits) {
        for (int power = 0; power < r; power++) {
            register[power] = -(definition.initial() >>> power & 1);
        }
        int lowest = 0;
        int octetTurn = octetTurn();
        for (int i = 0; i < messageBits; i++) {
            // Multiplying by x makes the place of the highest power that of the lowest.
            lowest = lowest == 0 ? r - 1 : lowest - 1;
            long fed = register[lowest] ^ bits[i ^ octetTurn];
            register[lowest] = fed;
            int end = (lowest + 1) * terms;
            for (int t = lowest * terms; t < end; t++) {
                register[placeOfTerm[t]] ^= fed;
            }
        }
        return lowest;
    }

    private long checkBit(int lowest, int position) {
        int power = powerAt(position);
        int place = lowest + power;
        return register[place < r ? place : place - r] ^ -(definition.finalXor() >>> power & 1);
    }

    private int powerAt(int position) {
        return r - 1 - (position ^ octetTurn());
    }

    /** Turns the order of bits within octets when it is XORed to a position; 0 where they stay. */
    private int octetTurn() {
        return definition.reflected() ? 7 : 0;
    }

    /**
     * The check of one frame as the number that standards and libraries print: bit i stands for x^i, or for x^(r-1-i) where
     * the check is reflected.
     *
     * @param bits message and check as {@link #append} leaves them
     * @param frame frame of the batch, 0 .. 63
     */
    public long valueOf(long[] bits, int messageBits, int frame) {
        requireRoom(bits, messageBits);
        Objects.checkIndex(frame, FrameBatch.FRAMES);
        long value = 0;
        for (int position = 0; position < r; position++) {
            int power = powerAt(position);
            long bit = bits[messageBits + position] >>> frame & 1;
            value |= bit << (definition.reflected() ? r - 1 - power : power);
        }
        return value;
    }
}

package dev.nearlimit.simulation;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.util.Arrays;

/**
 * What became of a numbered block of frames, so that any stopping rule can be applied to it at any frame: which frames
 * failed and how, and each frame's iterations. Frames are numbered within the block. Arrays are not copied and not
 * changed.
 *
 * @param frames frames in the block
 * @param failed ascending numbers of the frames in error
 * @param bitErrors wrong information bits of each failed frame; 0 where only the decoder declared failure
 * @param undetected whether each failed frame went without a declared failure
 * @param iterations iterations of every frame, or empty for a decoder that does not iterate
 */
record Block(int frames, int[] failed, int[] bitErrors, boolean[] undetected, int[] iterations) {
    /** How blocks are written; part of a block's key, so that a block of another format is never found. */
    static final byte FORMAT = 1;

    /** Frame errors among the first so many frames. */
    int failedBefore(int limit) {
        int at = Arrays.binarySearch(failed, limit);
        return at < 0 ? -at - 1 : at;
    }

    /**
     * As bytes: format, frames, failed frames (each as its distance from the one before, bit errors and the undetected
     * flag in one number), then iterations as differences from the least, all of the width that the largest needs.
     */
    byte[] toBytes() {
        ByteBuffer out = ByteBuffer.allocate(32 + failed.length * 10 + iterations.length * Integer.BYTES);
        out.put(FORMAT);
        putNumber(out, frames);
        putNumber(out, failed.length);
        int before = 0;
        for (int i = 0; i < failed.length; i++) {
            putNumber(out, failed[i] - before);
            putNumber(out, bitErrors[i] << 1 | (undetected[i] ? 1 : 0));
            before = failed[i];
        }
        putNumber(out, iterations.length);
        if (iterations.length > 0) {
            putIterations(out);
        }
        return Arrays.copyOf(out.array(), out.position());
    }

    private void putIterations(ByteBuffer out) {
        int least = Arrays.stream(iterations).min().orElse(0);
        int most = Arrays.stream(iterations).max().orElse(0);
        int width = Integer.SIZE - Integer.numberOfLeadingZeros(most - least);
        putNumber(out, least);
        putNumber(out, width);
        long waiting = 0;
        int bits = 0;
        for (int count : iterations) {
            waiting |= (long) (count - least) << bits;
            for (bits += width; bits >= Byte.SIZE; bits -= Byte.SIZE) {
                out.put((byte) waiting);
                waiting >>>= Byte.SIZE;
            }
        }
        if (bits > 0) {
            out.put((byte) waiting);
        }
    }

    /**
     * Reads back what {@link #toBytes} wrote.
     *
     * @throws InvalidSimulationException if the bytes are damaged or of another format
     */
    static Block fromBytes(byte[] bytes) {
        ByteBuffer in = ByteBuffer.wrap(bytes);
        try {
            if (in.get() != FORMAT) {
                throw damaged("format " + bytes[0] + ", expected " + FORMAT);
            }
            int frames = getNumber(in);
            int count = getNumber(in);
            if (count > frames) {
                throw damaged(count + " failed of " + frames + " frames");
            }
            int[] failed = new int[count];
            int[] bitErrors = new int[count];
            boolean[] undetected = new boolean[count];
            int frame = 0;
            for (int i = 0; i < count; i++) {
                frame += getNumber(in);
                int errors = getNumber(in);
                failed[i] = frame;
                bitErrors[i] = errors >>> 1;
                undetected[i] = (errors & 1) != 0;
            }
            Block block = new Block(frames, failed, bitErrors, undetected, getIterations(in, frames));
            if (in.hasRemaining()) {
                throw damaged(in.remaining() + " bytes too many");
            }
            return block;
        } catch (BufferUnderflowException e) {
            throw damaged("cut short at " + bytes.length + " bytes");
        }
    }

    private static int[] getIterations(ByteBuffer in, int frames) {
        int count = getNumber(in);
        if (count == 0) {
            return new int[0];
        }
        if (count != frames) {
            throw damaged("iterations of " + count + " frames, expected " + frames);
        }
        int least = getNumber(in);
        int width = getNumber(in);
        if (width >= Integer.SIZE || (long) width * count > (long) in.remaining() * Byte.SIZE) {
            throw damaged("iterations of " + width + " bits in " + in.remaining() + " bytes");
        }
        int[] iterations = new int[count];
        long waiting = 0;
        int bits = 0;
        for (int f = 0; f < count; f++) {
            for (; bits < width; bits += Byte.SIZE) {
                waiting |= (in.get() & 0xFFL) << bits;
            }
            iterations[f] = least + (int) (waiting & ((1L << width) - 1));
            waiting >>>= width;
            bits -= width;
        }
        return iterations;
    }

    /** Seven bits a byte, least first, the top bit saying that more follow. */
    private static void putNumber(ByteBuffer out, int number) {
        int rest = number;
        for (; rest > 0x7F; rest >>>= 7) {
            out.put((byte) (rest | 0x80));
        }
        out.put((byte) rest);
    }

    private static int getNumber(ByteBuffer in) {
        long number = 0;
        for (int shift = 0; shift < 35; shift += 7) {
            byte next = in.get();
            number |= (next & 0x7FL) << shift;
            if (next >= 0) {
                if (number > Integer.MAX_VALUE) {
                    throw damaged("number " + number + " out of range");
                }
                return (int) number;
            }
        }
        throw damaged("a number has no end");
    }

    private static InvalidSimulationException damaged(String found) {
        return new InvalidSimulationException("a block kept in the journal is damaged: " + found);
    }
}

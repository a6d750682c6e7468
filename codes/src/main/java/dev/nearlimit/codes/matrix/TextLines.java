package dev.nearlimit.codes.matrix;

import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;

/**
 * The lines of a file, one at a time, with their numbers. Bytes are taken as characters one by one, which is all that
 * digits and separators need; lines end in LF, CR or both; a UTF-8 byte order mark at the start is skipped. Stops with a
 * message at the limits on bytes and on the length of a line.
 */
final class TextLines implements Closeable {
    private static final int BYTE_ORDER_MARK = 0xEFBBBF;

    private final String file;
    private final InputStream stream;
    private final long maxBytes;
    private final int maxLineLength;
    private final byte[] buffer = new byte[1 << 14];
    private int filled;
    private int next;
    private long bytesRead;
    private int line;
    private String peeked;

    TextLines(String file, InputStream stream, MatrixLimits limits) {
        this.file = file;
        this.stream = stream;
        this.maxBytes = limits.maxBytes();
        // An entry with its separator and blanks to line columns up; short limits still leave room for comments.
        this.maxLineLength = (int) Math.min(1024 + 16L * limits.maxColumns(), Integer.MAX_VALUE - 16);
    }

    /** Number of the line last returned, counted from 1. */
    int line() {
        return line;
    }

    /** The line that {@link #next} will return; null at the end. */
    String peek() throws IOException {
        if (peeked == null) {
            peeked = read();
        }
        return peeked;
    }

    /** The next line without its end; null at the end. */
    String next() throws IOException {
        String result = peek();
        peeked = null;
        if (result != null) {
            line++;
        }
        return result;
    }

    MatrixFormatException error(int column, String found, String expected) {
        return new MatrixFormatException(file, line, column, found, expected);
    }

    /** An error in an earlier line as a whole. */
    MatrixFormatException errorAt(int earlierLine, String found, String expected) {
        return new MatrixFormatException(file, earlierLine, 0, found, expected);
    }

    /** An error of the file as a whole, such as one that ends too early. */
    MatrixFormatException errorInFile(String found, String expected) {
        return new MatrixFormatException(file, 0, 0, found, expected);
    }

    private String read() throws IOException {
        int first = take();
        if (first < 0) {
            return null;
        }
        StringBuilder text = new StringBuilder();
        int taken = first;
        while (taken >= 0 && taken != '\n' && taken != '\r') {
            if (text.length() == maxLineLength) {
                throw new MatrixFormatException(
                        file, line + 1, 0, "a line of more than " + maxLineLength + " characters", "shorter lines");
            }
            text.append((char) taken);
            taken = take();
        }
        if (taken == '\r' && fill() && buffer[next] == '\n') {
            take();
        }
        if (line == 0 && startsWithByteOrderMark(text)) {
            text.delete(0, 3);
        }
        return text.toString();
    }

    private static boolean startsWithByteOrderMark(StringBuilder text) {
        return text.length() >= 3 && (text.charAt(0) << 16 | text.charAt(1) << 8 | text.charAt(2)) == BYTE_ORDER_MARK;
    }

    private int take() throws IOException {
        if (!fill()) {
            return -1;
        }
        if (++bytesRead > maxBytes) {
            throw new MatrixFormatException(
                    file, 0, 0, "more than " + maxBytes + " bytes", "a smaller file, or a raised limit");
        }
        return buffer[next++] & 0xFF;
    }

    private boolean fill() throws IOException {
        if (next == filled) {
            filled = Math.max(0, stream.read(buffer));
            next = 0;
        }
        return filled > 0;
    }

    @Override
    public void close() throws IOException {
        stream.close();
    }
}

package dev.nearlimit.codes.matrix;

/**
 * How much a reader takes before it refuses a file. A code of length n holds generator and checks as dense matrices, n x n
 * bits together, and an encoder of up to one byte for each; {@code maxEntries} bounds n x n for that reason.
 *
 * @param maxRows rows, at least 1
 * @param maxColumns columns, at least 1
 * @param maxEntries rows times columns, and for a code its length squared
 * @param maxOnes ones, and entries of a coordinate file
 * @param maxBytes length of the file in bytes
 */
public record MatrixLimits(int maxRows, int maxColumns, long maxEntries, int maxOnes, long maxBytes) {
    private static final MatrixLimits STANDARD = new MatrixLimits(1 << 16, 1 << 16, 1L << 27, 1 << 24, 1L << 28);

    public MatrixLimits {
        requirePositive(maxRows, "maxRows");
        requirePositive(maxColumns, "maxColumns");
        requirePositive(maxEntries, "maxEntries");
        requirePositive(maxOnes, "maxOnes");
        requirePositive(maxBytes, "maxBytes");
    }

    /** 65536 rows, 65536 columns, 2^27 entries, 2^24 ones, 256 MiB. */
    public static MatrixLimits standard() {
        return STANDARD;
    }

    /** These limits with every count multiplied, and none beyond what the readers can count. */
    public MatrixLimits times(int factor) {
        requirePositive(factor, "factor");
        return new MatrixLimits(
                scaled(maxRows, factor),
                scaled(maxColumns, factor),
                scaled(maxEntries, factor),
                scaled(maxOnes, factor),
                scaled(maxBytes, factor));
    }

    private static int scaled(int limit, int factor) {
        // Array lengths and line lengths stay below what the JVM allows.
        return (int) Math.min((long) limit * factor, 1 << 30);
    }

    private static long scaled(long limit, int factor) {
        return limit > Long.MAX_VALUE / factor ? Long.MAX_VALUE : limit * factor;
    }

    private static void requirePositive(long value, String name) {
        if (value < 1) {
            throw new IllegalArgumentException(name + " is " + value + ", must be at least 1");
        }
    }
}

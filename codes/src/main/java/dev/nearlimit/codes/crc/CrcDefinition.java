package dev.nearlimit.codes.crc;

import dev.nearlimit.codes.field.BinaryPolynomial;
import java.util.Objects;

/**
 * A cyclic redundancy check of r bits: the remainder of message(x) x^r modulo a generator polynomial, in the variations
 * that standards make of it. The message's first bit is the coefficient of its highest power. W. W. Peterson and
 * D. T. Brown, "Cyclic codes for error detection", Proc. IRE 49, 1961.
 *
 * @param name how reports and messages call it
 * @param generator polynomial of degree r = 1 .. 64 with constant term 1
 * @param initial the register before the first message bit; bit i stands for x^i
 * @param reflected whether positions are those of octets, highest bit first, of which each is fed lowest bit first, message
 *     and check alike (as Ethernet's octets are); both are then whole octets. Positions in the order in which bits are
 *     sent need no reflection
 * @param finalXor what is added to the remainder; bit i stands for x^i
 */
public record CrcDefinition(String name, BinaryPolynomial generator, long initial, boolean reflected, long finalXor) {
    public CrcDefinition {
        Objects.requireNonNull(name);
        int r = generator.degree();
        if (r < 1 || r > 64) {
            throw new IllegalArgumentException(name + ": degree of the generator is " + r + ", must be 1 .. 64");
        }
        if (!generator.coefficient(0)) {
            throw new IllegalArgumentException(
                    name + ": generator " + generator + " is a multiple of x, must have constant term 1");
        }
        if (reflected && r % 8 != 0) {
            throw new IllegalArgumentException(name + ": a reflected check is whole octets, got " + r + " bits");
        }
        requireWidth(name, "initial register", initial, r);
        requireWidth(name, "final XOR", finalXor, r);
    }

    private static void requireWidth(String name, String what, long value, int r) {
        if (r < 64 && value >>> r != 0) {
            throw new IllegalArgumentException(
                    name + ": " + what + " 0x" + Long.toHexString(value) + " has more than " + r + " bits");
        }
    }

    /** The plain remainder: register cleared at the start, first bit first, nothing added. */
    public static CrcDefinition plain(String name, BinaryPolynomial generator) {
        return new CrcDefinition(name, generator, 0, false, 0);
    }

    /** Check bits, r. */
    public int bits() {
        return generator.degree();
    }
}

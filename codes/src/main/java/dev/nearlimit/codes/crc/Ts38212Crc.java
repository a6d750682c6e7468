package dev.nearlimit.codes.crc;

import dev.nearlimit.codes.field.BinaryPolynomial;

/** The generator polynomials of 3GPP TS 38.212 clause 5.1, used there as plain remainders. */
public enum Ts38212Crc {
    CRC24A(24, 23, 18, 17, 14, 11, 10, 7, 6, 5, 4, 3, 1, 0),
    CRC24B(24, 23, 6, 5, 1, 0),
    CRC24C(24, 23, 21, 20, 17, 15, 13, 12, 8, 4, 2, 1, 0),
    CRC16(16, 12, 5, 0),
    CRC11(11, 10, 9, 5, 0),
    CRC6(6, 5, 0);

    private final CrcDefinition definition;

    Ts38212Crc(int... exponents) {
        this.definition = CrcDefinition.plain("TS 38.212 " + name(), BinaryPolynomial.ofExponents(exponents));
    }

    public CrcDefinition definition() {
        return definition;
    }
}

package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.ArrayList;
import java.util.List;

/**
 * Reed-Muller codes RM(r,m): position p carries the value of a polynomial of degree at most r in m binary variables at
 * the point whose i-th coordinate is bit i of p. Checks are the monomials of degree at most m-r-1, which span the dual
 * code RM(m-r-1,m) (MacWilliams and Sloane 1977, ch. 13 sec. 3). Information positions are as early as possible.
 */
public final class ReedMullerFamily implements CodeFamily {
    private static final int MAX_VARIABLES = 12;

    @Override
    public String name() {
        return "reed-muller";
    }

    @Override
    public String form() {
        return "reed-muller:r,m";
    }

    @Override
    public String title() {
        return "order r, length 2^m";
    }

    @Override
    public Code build(String parameters) {
        int[] values = Parameters.integers(this, parameters, "r", "m");
        int r = values[0];
        int m = values[1];
        if (m < 1 || m > MAX_VARIABLES) {
            throw Parameters.refuse(this, parameters, "m is " + m + ", expected 1 .. " + MAX_VARIABLES);
        }
        if (r >= m) {
            throw Parameters.refuse(
                    this, parameters, "order r is " + r + ", expected 0 .. " + (m - 1) + " (order m has no checks)");
        }
        return Code.ofGenerator(
                        "reed-muller:" + r + "," + m,
                        "D. E. Muller 1954; I. S. Reed, IRE Trans. Information Theory 4 (1954)",
                        monomials(r, m))
                .withParityCheck(SparseBitMatrix.of(monomials(m - r - 1, m)))
                .withKnownDistance(1 << (m - r), "2^(m-r), MacWilliams and Sloane 1977, ch. 13 th. 3");
    }

    /** One row a monomial of degree at most {@code maxDegree}: the points at which all its variables are 1. */
    private static BitMatrix monomials(int maxDegree, int m) {
        List<Integer> variableSets = new ArrayList<>();
        for (int degree = 0; degree <= maxDegree; degree++) {
            for (int variables = 0; variables < 1 << m; variables++) {
                if (Integer.bitCount(variables) == degree) {
                    variableSets.add(variables);
                }
            }
        }
        BitMatrix matrix = new BitMatrix(variableSets.size(), 1 << m);
        for (int row = 0; row < variableSets.size(); row++) {
            int variables = variableSets.get(row);
            for (int point = 0; point < 1 << m; point++) {
                matrix.set(row, point, (point & variables) == variables);
            }
        }
        return matrix;
    }

    @Override
    public List<String> listed() {
        List<String> listed = new ArrayList<>();
        for (int m = 3; m <= 7; m++) {
            for (int r = 1; r <= m - 2; r++) {
                listed.add("reed-muller:" + r + "," + m);
            }
        }
        return List.copyOf(listed);
    }
}

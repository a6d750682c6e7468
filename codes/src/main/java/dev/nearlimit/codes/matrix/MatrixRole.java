package dev.nearlimit.codes.matrix;

/** What a matrix in a file stands for. */
public enum MatrixRole {
    /** k x n, its rows span the code and are independent. */
    GENERATOR,
    /** m x n, words of the code satisfy all its rows; rows may depend on each other. */
    PARITY_CHECK
}

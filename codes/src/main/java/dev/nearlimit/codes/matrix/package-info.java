/**
 * Reading 0/1 matrices from files: Matrix Market and CSV. Readers trust nothing a file says about itself, stop at limits
 * before memory is taken, and name file, line, column, what was found and what was expected. What the matrix means is
 * decided by {@link dev.nearlimit.codes.matrix.MatrixRole}; designators and modifications belong to the catalogue.
 */
package dev.nearlimit.codes.matrix;

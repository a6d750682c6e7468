/**
 * What a code is: {@link dev.nearlimit.codes.Code} with its exact rate, its matrices, its information positions and its
 * encoder. The packages below hold GF(2) matrices, finite fields, code families, standards' tables and matrix readers.
 * Nothing here decodes, simulates or knows about noise.
 */
package dev.nearlimit.codes;
